import { TZDate } from '@date-fns/tz';
import type { DistrictHistory } from '../../lib/api/types';
import type { StrengthPoint } from './strength-series';

/** A night from noon to noon: its strongest inversion in °C, null when nothing of it is known. Instants in epoch ms. */
export interface Night {
  from: number;
  to: number;
  strongest: StrengthPoint | null;
}

const NIGHTLY_FROM_DAYS = 20;

/** Whether a span is drawn a bar each night: over that long a line would only be a thicket. */
export const isNightly = ({ from, to }: Pick<DistrictHistory, 'from' | 'to'>): boolean =>
  new Date(to).getTime() - new Date(from).getTime() > NIGHTLY_FROM_DAYS * 86_400_000;

/** The local noon at or before an instant. */
function noonBefore(ms: number, zone: string): TZDate {
  const local = new TZDate(ms, zone);
  const noon = new TZDate(local.getFullYear(), local.getMonth(), local.getDate(), 12, 0, 0, zone);
  if (noon.getTime() > ms) noon.setDate(noon.getDate() - 1);
  return noon;
}

/** The strongest of each night (noon to noon in the district's zone, so that a night is not cut at midnight). */
export function nightly(points: readonly StrengthPoint[], zone: string): Night[] {
  const nights: Night[] = [];
  for (const point of points) {
    let night = nights.at(-1);
    if (!night || point.at >= night.to) {
      const from = noonBefore(point.at, zone);
      const to = new TZDate(from.getTime(), zone);
      to.setDate(to.getDate() + 1);
      night = { from: from.getTime(), to: to.getTime(), strongest: null };
      nights.push(night);
    }
    if (point.y !== null && point.y > (night.strongest?.y ?? -1)) night.strongest = point;
  }
  return nights;
}
