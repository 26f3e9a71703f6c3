import { atLeast, exactly, truthOf, type Quantity, type Truth } from '../bounds';
import { probabilityBelow, sigmaBetween, type MatchedPair } from '../profile';
import type { Run } from './runs';
import type { Span } from './scan';

/** Whether the top of an inversion is seen. */
export type OpenEnd = 'no' | 'at the top' | 'cut by a missing level';

/** A layer, or several, through which the temperature rises with height. */
export interface Inversion {
  readonly kind: 'surface-based' | 'elevated';
  readonly baseM: number;
  /** Lowest level at which its top can lie, m: its top, unless `open`. */
  readonly topM: number;
  readonly open: OpenEnd;
  readonly baseTemperatureC: number;
  readonly topTemperatureC: number;
  /** True when a missing level lies just below: "base at or below". */
  readonly baseAtOrBelow: boolean;
  readonly depthM: Quantity;
  readonly depthWithinTowerM: number;
  /** T(top) − T(base), °C; "at least" when an end is not seen. */
  readonly strengthC: Quantity;
  /** The part of the strength that the tower sees, °C. */
  readonly strengthWithinTowerC: number;
  readonly gradientCPer100M: number;
  readonly steepest: { readonly baseM: number; readonly topM: number; readonly gradientCPer100M: number };
  /** One standard deviation of the strength within the tower, from its two end sensors, °C. */
  readonly sigmaC: number | null;
  /** P(strength > 0). */
  readonly probability: number | null;
  readonly sure: Truth;
  readonly suspect: boolean;
}

const steepestOf = (levels: Run['levels']): Inversion['steepest'] => {
  const gradients = levels.slice(1).map((upper, i) => {
    const lower = levels[i]!;
    const rise = upper.temperatureC - lower.temperatureC;
    const thickness = upper.heightM - lower.heightM;
    return { baseM: lower.heightM, topM: upper.heightM, gradientCPer100M: (100 * rise) / thickness };
  });
  return gradients.reduce((best, g) => (g.gradientCPer100M > best.gradientCPer100M ? g : best));
};

const openEnd = (span: Span, run: Run): OpenEnd => {
  if (!span.reachesEnd) return 'no';
  return run.cutAbove ? 'cut by a missing level' : 'at the top';
};

/**
 * Describes one inversion that a scan has found.
 *
 * Units: m, °C, °C/100 m. Valid: a span of two or more levels of its run. Strength and depth are "at least" when the
 * top is open or the base may lie lower; without sensor uncertainties the probability is null and `sure` not known;
 * a suspect level makes it not sure. Source: [Kahl1990] for base, top, depth, strength; [GUM] for σ.
 */
export function describeInversion(
  span: Span,
  run: Run,
  lowestRun: boolean,
  pairs: readonly MatchedPair[],
  sureFromProbability: number,
): Inversion {
  const base = run.levels[span.base]!;
  const top = run.levels[span.top]!;
  const within = run.levels.slice(span.base, span.top + 1);
  const open = openEnd(span, run);
  const baseAtOrBelow = span.base === 0 && run.cutBelow;
  const depth = top.heightM - base.heightM;
  const strength = top.temperatureC - base.temperatureC;
  const sigmaC = sigmaBetween(base, top, pairs);
  const probability = sigmaC === null ? null : 1 - probabilityBelow(strength, sigmaC, 0);
  const suspect = within.some((level) => level.suspect);
  const why = [
    ...(open === 'no'
      ? []
      : [`the top is not seen: ${open === 'at the top' ? 'it reaches the highest level' : open}`]),
    ...(baseAtOrBelow ? ['the base is not seen: the level below it gave nothing'] : []),
  ].join('; ');
  const bounded = (value: number): Quantity => (why === '' ? exactly(value) : atLeast(value, why));
  return {
    kind: lowestRun && span.base === 0 ? 'surface-based' : 'elevated',
    baseM: base.heightM,
    topM: top.heightM,
    open,
    baseTemperatureC: base.temperatureC,
    topTemperatureC: top.temperatureC,
    baseAtOrBelow,
    depthM: bounded(depth),
    depthWithinTowerM: depth,
    strengthC: bounded(strength),
    strengthWithinTowerC: strength,
    gradientCPer100M: (100 * strength) / depth,
    steepest: steepestOf(within),
    sigmaC,
    probability,
    sure: suspect ? 'false' : truthOf(probability === null ? null : probability >= sureFromProbability),
    suspect,
  };
}
