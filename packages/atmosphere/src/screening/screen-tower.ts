import type { Quality } from '../profile';
import { checksOfTower, type ChecksInput } from './checks-of-tower';
import type { FlagList } from './flag-list';
import { overrideAt, WORD, wordsOver, type Words } from './overrides';
import { CHECKS, type Flag, type Override, type ScreenedReading } from './reading';
import { seriesOf, type SensorSeries, type Series } from './series';

/** *in force*: a failed reading is left out of means; *report only*: failed counts as suspect, though it is said. */
export type ScreeningMode = 'in force' | 'report only';

/** What screening a span of one tower is given; all series with `screeningContext` before and after the span. */
export interface ScreeningInput extends ChecksInput {
  readonly sensors: readonly SensorSeries[];
  /** Sensors of each neighbouring tower: used to withdraw flags, and for the neighbour check; not screened. */
  readonly neighbours?: readonly (readonly SensorSeries[])[];
  /** The span (from, to], UTC epoch seconds. */
  readonly from: number;
  readonly to: number;
  readonly overrides?: readonly Override[];
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

/** A series in which what a person has set aside is no evidence; the same series where nothing is set aside. */
const withoutSetAside = (series: Series, words: Words | null): Series => {
  if (!words?.includes(WORD.failed)) return series;
  const evidence = series.evidence.map((is, i) => (words[i] === WORD.failed ? 0 : is));
  return { ...series, evidence };
};

/**
 * Screens a span of one tower, in the order: clock, range, spike, step, stuck, persistence, internal, vertical and
 * neighbour checks. Each reading gets the worst of *valid / suspect / failed / missing* with the flags that said so; a
 * person's override wins, save that a missing value stays missing. Nothing is deleted.
 *
 * *Failed* needs a value outside the physical range, a single spike, the very same value for hours while another
 * level moves, or a clock proved wrong; everything else is *suspect* at most, and withdrawn when a neighbouring level
 * or tower moves the same way. What is set aside is no evidence against others; what the checks say of itself is kept
 * beside the person's word.
 *
 * Units: those of the sensors; UTC epoch seconds. Valid: readings and sensors in any order give the same result; two
 * values for one instant throw a `RangeError`. The result for the span equals that of the whole record when the
 * context is handed in. Source: [EPA454] §8.6, tables 8-3 and 8-4; [WMO1993]; [Zahumensky2004].
 */
export function screenTower(input: ScreeningInput): ReadonlyMap<string, readonly ScreenedReading[]> {
  const tower = input.sensors.map(seriesOf).sort(byHeight);
  const nearby = (input.neighbours ?? []).map((sensors) => sensors.map(seriesOf).sort(byHeight));
  const words = tower.map((series) => wordsOver(series, input.overrides ?? []));
  const believed = tower.map((series, k) => withoutSetAside(series, words[k]!));
  const flags = checksOfTower(believed, nearby, words, input);
  if (believed.some((series, k) => series !== tower[k])) {
    const alone = checksOfTower(tower, nearby, words, input);
    words.forEach((said, k) =>
      said?.forEach((word, i) => {
        if (word === WORD.failed) flags[k]![i] = alone[k]![i];
      }),
    );
  }
  return new Map(tower.map((series, k) => [series.sensorId, screened(series, flags[k]!, input)]));
}
