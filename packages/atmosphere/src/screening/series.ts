import { DEFAULT_LIMITS, NEIGHBOUR_IN_TIME_INTERVALS, type SensorLimits } from './settings';
import type { MeasuredQuantity, RawReading } from './reading';

/** One sensor of a tower with its readings, in any order. */
export interface SensorSeries {
  readonly sensorId: string;
  readonly quantity: MeasuredQuantity;
  readonly heightM: number;
  /** Interval of its readings, s. */
  readonly intervalS: number;
  /** One standard deviation of a reading; leave out when not known. */
  readonly sigma?: number | null;
  readonly limits?: Partial<SensorLimits>;
  readonly readings: readonly RawReading[];
}

/** A series made ready: ascending, one reading per instant, with its limits. NaN stands for a missing value. */
export interface Series {
  readonly sensorId: string;
  readonly quantity: MeasuredQuantity;
  readonly heightM: number;
  readonly intervalS: number;
  readonly sigma: number;
  readonly limits: SensorLimits;
  readonly readings: readonly RawReading[];
  readonly t: Float64Array;
  readonly value: Float64Array;
  /** 1 where the value may serve as evidence: present, within the physical range and no spike. */
  readonly evidence: Uint8Array;
  /** Where the last look-up ended: the checks go forward in time, so that the next one is close by. */
  readonly cursor: { at: number };
}

/**
 * Makes a series ready for the checks.
 *
 * Units: those of the sensor; UTC epoch seconds. Valid: readings in any order; the same reading twice counts once;
 * two different ones for one instant, or an interval that is not above 0, throw a `RangeError`.
 * Source: none (definition).
 */
export function seriesOf(sensor: SensorSeries): Series {
  if (!(sensor.intervalS > 0))
    throw new RangeError(`The interval of sensor ${sensor.sensorId} must be above 0 s.`);
  const readings = inOrder(sensor);
  const limits = { ...DEFAULT_LIMITS[sensor.quantity], ...sensor.limits };
  const { lowest, highest } = limits.physical;
  const n = readings.length;
  const [t, value, evidence] = [new Float64Array(n), new Float64Array(n), new Uint8Array(n)];
  for (let i = 0; i < n; i += 1) {
    const reading = readings[i]!;
    const v = Number.isFinite(reading.value) ? reading.value! : NaN;
    t[i] = reading.tEnd;
    value[i] = v;
    evidence[i] = v >= lowest && v <= highest ? 1 : 0;
  }
  return {
    sensorId: sensor.sensorId,
    quantity: sensor.quantity,
    heightM: sensor.heightM,
    intervalS: sensor.intervalS,
    sigma: sensor.sigma ?? 0,
    ...{ limits, readings, t, value, evidence },
    cursor: { at: 0 },
  };
}

/** Readings ascending, one per instant; mostly they come so. */
const inOrder = ({ sensorId, readings }: SensorSeries): readonly RawReading[] => {
  if (readings.every((r, i) => i === 0 || r.tEnd > readings[i - 1]!.tEnd)) return readings;
  const sorted = [...readings].sort((a, b) => a.tEnd - b.tEnd);
  refuseContradictions(sensorId, sorted);
  return sorted.filter((r, i) => i === 0 || r.tEnd !== sorted[i - 1]!.tEnd);
};

const refuseContradictions = (sensorId: string, sorted: readonly RawReading[]): void => {
  sorted.forEach((reading, i) => {
    const before = sorted[i - 1];
    if (before?.tEnd === reading.tEnd && !Object.is(before.value, reading.value)) {
      throw new RangeError(
        `Sensor ${sensorId} has two values for ${reading.tEnd} s: hand in only the one in force.`,
      );
    }
  });
};

/**
 * Index of the first reading at or after an instant; the length where there is none.
 *
 * Units: UTC epoch seconds. Valid: any instant. Source: none (definition).
 */
export function firstFrom(t: Float64Array, instant: number): number {
  let low = 0;
  let high = t.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (t[middle]! < instant) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** As `firstFrom`, looking first where the last look-up ended and one further. */
const firstFromCursor = ({ t, cursor }: Series, instant: number): number => {
  for (let at = cursor.at; at <= cursor.at + 1 && at <= t.length; at += 1) {
    if ((at === t.length || t[at]! >= instant) && (at === 0 || t[at - 1]! < instant)) return (cursor.at = at);
  }
  return (cursor.at = firstFrom(t, instant));
};

/**
 * The value that may serve as evidence nearest to an instant, within half an interval; NaN where there is none.
 *
 * Units: those of the sensor; UTC epoch seconds. Valid: any instant; of two equally near the earlier.
 * Source: none (definition).
 */
export function evidenceNear(series: Series, instant: number): number {
  const { t, value, evidence, intervalS } = series;
  const after = firstFromCursor(series, instant);
  const toAfter = after < t.length ? t[after]! - instant : Infinity;
  const toBefore = after > 0 ? instant - t[after - 1]! : Infinity;
  const nearest = toBefore <= toAfter ? after - 1 : after;
  if (Math.min(toBefore, toAfter) > intervalS / 2) return NaN;
  return evidence[nearest] === 1 ? value[nearest]! : NaN;
}

/**
 * Longest gap, s, over which two readings are still neighbours in time.
 *
 * Units: s. Valid: any series. Source: none (definition).
 */
export const longestGapS = (series: Pick<Series, 'intervalS'>): number =>
  NEIGHBOUR_IN_TIME_INTERVALS * series.intervalS;
