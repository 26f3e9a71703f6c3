import { sigmaOfDifference } from '../uncertainty';
import type { MatchedPair, MeasuredLevel } from './level';

/**
 * Standard deviation of the temperature difference between two levels: that of the matched pair declared for just
 * these heights, else the root of the sum of squares.
 *
 * Units: °C. Valid: any two levels; null where an uncertainty is not known. Source: [GUM] 5.1.2.
 */
export function sigmaBetween(
  lower: Pick<MeasuredLevel, 'heightM' | 'sigmaC'>,
  upper: Pick<MeasuredLevel, 'heightM' | 'sigmaC'>,
  pairs: readonly MatchedPair[],
): number | null {
  const pair = pairs.find((p) => p.lowerM === lower.heightM && p.upperM === upper.heightM);
  if (pair !== undefined && pair.sigmaC >= 0 && Number.isFinite(pair.sigmaC)) return pair.sigmaC;
  return sigmaOfDifference(lower.sigmaC, upper.sigmaC);
}
