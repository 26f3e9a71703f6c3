import { AUTOCONVECTIVE_LAPSE_RATE_K_PER_KM, DRY_ADIABATIC_LAPSE_RATE_K_PER_KM } from '../constants';
import { addFlag, type FlagList } from './flag-list';
import type { Flag } from './reading';
import { evidenceNear, type Series } from './series';
import { DAY_FROM_SUN_DEG, type VerticalLimits } from './settings';
import { said } from './units';

/** Elevation of the sun in degrees at an instant (UTC epoch seconds); null where it is not known. */
export type SunElevationDeg = (tEnd: number) => number | null;

/** Two neighbouring temperature levels of one tower. */
export interface Pair {
  readonly lower: Series;
  readonly upper: Series;
}

/** T(upper) − T(lower) at an instant, °C; NaN where either is missing. */
const differenceAt = ({ lower, upper }: Pair, t: number): number =>
  evidenceNear(upper, t) - evidenceNear(lower, t);
const thicknessOf = ({ lower, upper }: Pair): number => upper.heightM - lower.heightM;

/**
 * The neighbouring temperature levels of a tower, from the ground up.
 *
 * Units: m. Valid: any sensors; two at one height make no pair. Source: none (definition).
 */
export function pairsOf(tower: readonly Series[]): readonly Pair[] {
  const levels = tower
    .filter((s) => s.quantity === 'air temperature')
    .sort((a, b) => a.heightM - b.heightM || (a.sensorId < b.sensorId ? -1 : 1));
  return levels
    .slice(1)
    .map((upper, i) => ({ lower: levels[i]!, upper }))
    .filter((pair) => thicknessOf(pair) > 0);
}

/** What is unusual about a difference, with the way it goes; undefined when nothing is. */
const unusual = (
  differenceC: number,
  thicknessM: number,
  sunDeg: () => number | null,
  limits: VerticalLimits,
): { reason: string; rises: boolean } | undefined => {
  const perMetre = differenceC / thicknessM;
  const because = (why: string, rises: boolean) => ({
    reason: `${said(differenceC)} °C over ${said(thicknessM)} m ${why}`,
    rises,
  });
  if (differenceC > limits.riseC) return because(`exceeds +${limits.riseC} °C`, true);
  if (differenceC < -limits.fallC) return because(`exceeds −${limits.fallC} °C`, false);
  // The sun is asked only where it decides: its elevation takes longer to find than all the rest.
  if (perMetre > limits.risePerMetreByDayC && (sunDeg() ?? -90) >= DAY_FROM_SUN_DEG) {
    return because(`exceeds +${limits.risePerMetreByDayC} °C/m by day`, true);
  }
  if (perMetre < -limits.fallPerMetreAtNightC && (sunDeg() ?? 90) <= 0) {
    return because(`exceeds −${limits.fallPerMetreAtNightC} °C/m at night`, false);
  }
  if (-1000 * perMetre > AUTOCONVECTIVE_LAPSE_RATE_K_PER_KM) {
    return because('is beyond the autoconvective lapse rate', false);
  }
  return undefined;
};

/** Another pair goes the same way when it rises too, or cools upward faster than dry air that rises. */
const goesTheSameWay = (pair: Pair, t: number, rises: boolean): boolean => {
  const lapseRate = (-1000 * differenceAt(pair, t)) / thicknessOf(pair);
  return rises ? lapseRate < 0 : lapseRate > DRY_ADIABATIC_LAPSE_RATE_K_PER_KM;
};

/**
 * Vertical consistency: an unusual difference between two neighbouring levels makes both readings *suspect*, never
 * failed: strong inversions and sunlit ground are real. It is withdrawn when another pair of the tower, or of a
 * neighbouring tower, goes the same way. The limits are those of the upper sensor; those for day and night apply only
 * where the sun's elevation is given.
 *
 * Units: °C, m, degrees. Valid: readings of both levels within half an interval of one another.
 * Source: [EPA454] tables 8-3 and 8-4; [AMSGlossary] autoconvective lapse rate.
 */
export function checkVertical(
  pair: Pair,
  otherPairs: readonly Pair[],
  sun: SunElevationDeg | undefined,
  flagsOf: (series: Series) => FlagList,
): void {
  const limits = pair.upper.limits.levelDifference;
  if (limits === null) return;
  const check = (series: Series) => {
    for (let i = 0; i < series.t.length; i += 1) {
      if (series.evidence[i] === 0) continue;
      const t = series.t[i]!;
      const sunDeg = () => sun?.(t) ?? null;
      const found = unusual(differenceAt(pair, t), thicknessOf(pair), sunDeg, limits);
      if (found === undefined) continue;
      const same = otherPairs.find((other) => goesTheSameWay(other, t, found.rises));
      const withdrawn = same === undefined ? {} : { withdrawn: `${same.upper.sensorId} goes the same way` };
      const flag: Flag = { check: 'vertical', verdict: 'suspect', reason: found.reason, ...withdrawn };
      addFlag(flagsOf(series), i, flag);
    }
  };
  check(pair.lower);
  check(pair.upper);
}
