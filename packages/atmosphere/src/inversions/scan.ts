import { sigmaBetween, type MatchedPair, type MeasuredLevel } from '../profile';
import type { InversionSettings } from './settings';

/** Indices of the base and top of an inversion within its run; `reachesEnd` when it goes to the run's last level. */
export interface Span {
  readonly base: number;
  readonly top: number;
  readonly reachesEnd: boolean;
}

type Decides = (upper: number, lower: number) => boolean;

/** Whether the decrease from level `from` up to level `to` is passed over instead of ending the inversion. */
const passedOver =
  (levels: readonly MeasuredLevel[], settings: InversionSettings, pairs: readonly MatchedPair[]): Decides =>
  (from, to) => {
    const below = levels[from]!;
    const above = levels[to]!;
    if (above.heightM - below.heightM < settings.embedDepthM) return true;
    if (settings.form === 'plain') return false;
    const sigma = sigmaBetween(below, above, pairs);
    return sigma !== null && below.temperatureC - above.temperatureC < settings.passOverSigmas * sigma;
  };

const rises = (levels: readonly MeasuredLevel[], i: number): boolean =>
  levels[i + 1]!.temperatureC > levels[i]!.temperatureC;

/** Upper end of the consecutive layers that all rise, or all do not, from level `from`. */
const endOfTrend = (levels: readonly MeasuredLevel[], from: number, rising: boolean): number => {
  let i = from;
  while (i < levels.length - 1 && rises(levels, i) === rising) i += 1;
  return i;
};

const spanFrom = (levels: readonly MeasuredLevel[], base: number, isPassedOver: Decides): Span => {
  const last = levels.length - 1;
  let top = endOfTrend(levels, base, true);
  while (top < last) {
    const resumed = endOfTrend(levels, top, false);
    if (!isPassedOver(top, resumed)) return { base, top, reachesEnd: false };
    top = endOfTrend(levels, resumed, true);
  }
  return { base, top, reachesEnd: true };
};

/**
 * Finds where the temperature rises within one run of levels, scanning upward: consecutive layers of decrease (or no
 * change) are merged first; an inversion begins at the bottom of the first layer that rises and ends at the bottom of
 * the first later decrease that is neither thinner than the embed depth nor (sensor-aware) smaller than 1.645 σ of
 * its difference. Passing over may not leave the top as cold as the base: then decreases that reach down to the
 * base's temperature end the inversion, so that its strength is always above 0.
 *
 * Units: m, °C. Valid: one run, ascending; fewer than two levels have none. In the plain form with embed depth 0 this
 * is the unbroken run of strictly rising temperature. Source: [Kahl1990], at tower scale.
 */
export function scanRun(
  levels: readonly MeasuredLevel[],
  settings: InversionSettings,
  pairs: readonly MatchedPair[],
): readonly Span[] {
  const spans: Span[] = [];
  const passes = passedOver(levels, settings, pairs);
  let i = 0;
  while (i < levels.length - 1) {
    if (!rises(levels, i)) {
      i += 1;
      continue;
    }
    const baseC = levels[i]!.temperatureC;
    let span = spanFrom(levels, i, passes);
    if (levels[span.top]!.temperatureC <= baseC) {
      span = spanFrom(levels, i, (from, to) => passes(from, to) && levels[to]!.temperatureC > baseC);
    }
    spans.push(span);
    i = span.top;
  }
  return spans;
}
