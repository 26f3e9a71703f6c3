import type { Quality } from '../profile';
import { checkClock, type WrongClock } from './clock';
import type { FlagList } from './flag-list';
import { checkInternal } from './internal';
import { checkNeighbours } from './neighbours';
import { overrideAt } from './overrides';
import { checkPersistence, checkStuck } from './persistence';
import { checkRange } from './range';
import { CHECKS, type Flag, type Override, type ScreenedReading } from './reading';
import { seriesOf, type SensorSeries, type Series } from './series';
import { DEFAULT_VERTICAL_LIMITS, type VerticalLimits } from './settings';
import { checkSpike } from './spike';
import { checkStep } from './step';
import { checkVertical, pairsOf, type SunElevationDeg } from './vertical';

/** *in force*: a failed reading is left out of means; *report only*: failed counts as suspect, though it is said. */
export type ScreeningMode = 'in force' | 'report only';

/** What screening a span of one tower is given; all series with `screeningContext` before and after the span. */
export interface ScreeningInput {
  readonly sensors: readonly SensorSeries[];
  /** Sensors of each neighbouring tower: used to withdraw flags, and for the neighbour check; not screened. */
  readonly neighbours?: readonly (readonly SensorSeries[])[];
  /** The span (from, to], UTC epoch seconds. */
  readonly from: number;
  readonly to: number;
  readonly overrides?: readonly Override[];
  readonly wrongClocks?: readonly WrongClock[];
  readonly sunElevationDeg?: SunElevationDeg;
  readonly verticalLimits?: Partial<VerticalLimits>;
  readonly mode?: ScreeningMode;
}

const NONE: readonly Flag[] = [];
const byCheck = (a: Flag, b: Flag): number =>
  CHECKS.indexOf(a.check) - CHECKS.indexOf(b.check) || (a.verdict < b.verdict ? -1 : 1);
const byHeight = (a: Series, b: Series): number =>
  a.heightM - b.heightM || (a.sensorId < b.sensorId ? -1 : 1);

/** The worst that counts: flags that were withdrawn do not. */
const worst = (value: number, flags: readonly Flag[], mode: ScreeningMode): Quality => {
  if (Number.isNaN(value)) return 'missing';
  const counting = flags.filter((flag) => flag.withdrawn === undefined);
  if (counting.length === 0) return 'valid';
  return mode === 'in force' && counting.some((flag) => flag.verdict === 'failed') ? 'failed' : 'suspect';
};

const screened = (series: Series, flags: FlagList, input: ScreeningInput): readonly ScreenedReading[] => {
  const overrides = (input.overrides ?? []).filter((o) => o.sensorId === series.sensorId);
  const result: ScreenedReading[] = [];
  for (let i = 0; i < series.t.length; i += 1) {
    const tEnd = series.t[i]!;
    if (tEnd <= input.from || tEnd > input.to) continue;
    const value = series.value[i]!;
    const said = flags[i]?.sort(byCheck) ?? NONE;
    const override = overrides.length === 0 ? null : overrideAt(overrides, series.sensorId, tEnd);
    const judged = worst(value, said, input.mode ?? 'in force');
    const quality = override === null || judged === 'missing' ? judged : override.quality;
    result.push({ tEnd, value: Number.isNaN(value) ? null : value, quality, flags: said, override });
  }
  return result;
};

/**
 * Screens a span of one tower, in the order: clock, range, spike, step, stuck, persistence, internal, vertical and
 * neighbour checks. Each reading gets the worst of *valid / suspect / failed / missing* with the flags that said so; a
 * person's override wins, save that a missing value stays missing. Nothing is deleted.
 *
 * *Failed* needs a value outside the physical range, a single spike, the very same value for hours while another
 * level moves, or a clock proved wrong; everything else is *suspect* at most, and withdrawn when a neighbouring level
 * or tower moves the same way.
 *
 * Units: those of the sensors; UTC epoch seconds. Valid: readings and sensors in any order give the same result; two
 * values for one instant throw a `RangeError`. The result for the span equals that of the whole record when the
 * context is handed in. Source: [EPA454] §8.6, tables 8-3 and 8-4; [WMO1993]; [Zahumensky2004].
 */
export function screenTower(input: ScreeningInput): ReadonlyMap<string, readonly ScreenedReading[]> {
  const tower = input.sensors.map(seriesOf).sort(byHeight);
  const nearby = (input.neighbours ?? []).map((sensors) => sensors.map(seriesOf).sort(byHeight));
  const flags = new Map<Series, FlagList>([...tower, ...nearby.flat()].map((series) => [series, []]));
  const flagsOf = (series: Series): FlagList => flags.get(series)!;
  const kin = (series: Series, among: readonly Series[]) =>
    among.filter((other) => other !== series && other.quantity === series.quantity);
  const allOf = (series: Series) => [...kin(series, tower), ...kin(series, nearby.flat())];

  for (const series of tower) {
    checkClock(series, input.wrongClocks ?? [], flagsOf(series));
    checkRange(series, flagsOf(series));
  }
  const spikes = tower.map((series) => checkSpike(series, allOf(series), flagsOf(series)));
  tower.forEach((series, i) => spikes[i]!.forEach((at) => (series.evidence[at] = 0)));
  for (const series of tower) {
    checkStep(series, allOf(series), flagsOf(series));
    checkStuck(series, kin(series, tower), flagsOf(series));
    checkPersistence(series, allOf(series), flagsOf(series));
    checkInternal(series, tower, flagsOf(series));
    checkNeighbours(series, kin(series, nearby.flat()), flagsOf(series));
  }
  const pairs = pairsOf(tower);
  const pairsNearby = nearby.flatMap(pairsOf);
  const limits = { ...DEFAULT_VERTICAL_LIMITS, ...input.verticalLimits };
  for (const pair of pairs) {
    const others = [...pairs.filter((p) => p !== pair), ...pairsNearby];
    checkVertical(pair, others, limits, input.sunElevationDeg, flagsOf);
  }
  return new Map(tower.map((series) => [series.sensorId, screened(series, flagsOf(series), input)]));
}
