import type { EvaluatedNode, Profile, RangeValue, Truth } from '../../lib/api/types';
import { clausesOf, measuredText } from './measured';

/** A number a decision rests on, with what it is. */
export interface HeadlineNumber {
  value: string;
  what: string;
}

const NAMES: readonly [measure: string, what: string][] = [
  ['pm25Running24h', 'PM2.5, 24 hours'],
  ['pm25NowCast', 'PM2.5, NowCast'],
  ['pm25Hour', 'PM2.5, last hour'],
  ['floorToBenchC', 'bench warmer than floor'],
  ['windSpeedMPerS', 'wind'],
];

const sure = (truth: Truth | undefined) =>
  truth === 'true' ? ', sure' : truth === 'false' ? ', not sure' : '';

/** The two or three numbers an officer reads first: the inversion, then smoke or what else the rule asked about. */
export function headlineNumbers(tree: EvaluatedNode, profile: Profile | null): HeadlineNumber[] {
  const clauses = clausesOf(tree);
  const found = (measure: string): RangeValue | undefined =>
    clauses.find((clause) => clause.measure === measure)?.measured;
  const strength = found('inversionStrengthC') ?? profile?.inversion?.strengthC;
  const certain = profile?.inversion ? (profile.inversion.sure ? 'true' : 'false') : undefined;
  const inversion: HeadlineNumber =
    strength === undefined
      ? { value: profile?.surface === 'absent' ? 'none' : 'not known', what: 'surface inversion' }
      : { value: measuredText('inversionStrengthC', strength), what: `surface inversion${sure(certain)}` };
  const others = NAMES.flatMap(([measure, what]) => {
    const measured = found(measure);
    return measured === undefined ? [] : [{ value: measuredText(measure, measured), what }];
  });
  return [inversion, ...others].slice(0, 3);
}
