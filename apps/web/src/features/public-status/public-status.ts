import type { RangeValue } from '../../lib/api/types';

/** What holds in a district, as residents are told. */
export type PublicState = 'no restriction' | 'advisory' | 'burn ban' | 'not known';

/** A kind of burning that a notice speaks of. */
export type BurningKind = 'uncertified' | 'certified' | 'pellet' | 'fireplace' | 'open burning';

/** What a notice, or its absence, says to residents in one language; times are written in the district's zone. */
export interface PublicText {
  headline: string;
  untilText: string;
  whatToDo: string[];
  stoves: { kind: BurningKind; name: string; text: string }[];
  why: string;
  exemptions: string;
  cautions: string[];
}

/** A district's public answer. */
export interface PublicStatus {
  slug: string;
  name: string;
  timeZone: string;
  state: PublicState;
  texts: { en: PublicText; es: PublicText };
  /** PM2.5 by NowCast, µg/m³; absent where the district has no monitor. */
  smoke?: { pm25: RangeValue | number; at: string };
  levels?: { heightM: number; temperatureC: number | null }[];
  inversion?: {
    surface: 'present' | 'absent' | 'not known';
    topM: number | null;
    open: 'no' | 'at the top' | 'cut by a missing level';
  };
  at?: string | null;
  checkedAt: string;
  contactPhone: string;
  ordinanceRef: string;
  officeName?: string;
}
