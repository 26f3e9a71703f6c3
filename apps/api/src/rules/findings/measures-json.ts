import { between, notKnown, type Quantity } from '@lidwatch/atmosphere';
import type { MeasuredValues, MeasureName } from '@lidwatch/rules';

/** Bounds as they are kept: null for an open end, both null for not known, with the reason where there is one. */
type StoredQuantity = [number | null, number | null, string?];

const NO_REASON = 'nothing was measured';
/** Nine significant digits: far finer than any sensor, and without the tails that arithmetic leaves. */
const DIGITS = 9;
const end = (value: number): number | null =>
  Number.isFinite(value) ? Number(value.toPrecision(DIGITS)) : null;

/** A quantity from two stored ends. Both null is not known, for `reason`. */
export function quantityOf(lo: number | null, hi: number | null, reason = NO_REASON): Quantity {
  if (lo === null && hi === null) return notKnown(reason);
  return lo === hi ? { lo: lo!, hi: hi! } : between(lo ?? -Infinity, hi ?? Infinity, reason);
}

const NO_FORECAST = notKnown('no forecast has been entered');

/** What needs a day's forecast, where none was entered. It is left out of what is kept, for it is the usual case. */
export const WITHOUT_FORECAST: MeasuredValues = {
  forecastLowC: NO_FORECAST,
  forecastHighC: NO_FORECAST,
  forecastWindMPerS: NO_FORECAST,
  forecastMixingHeightM: NO_FORECAST,
  mixingHeightM: NO_FORECAST,
  ventilationIndexM2PerS: NO_FORECAST,
};

/** Measured values as the JSON text that keeps them. A measure of which nothing is known is kept with its reason. */
export function measuresToJson(values: MeasuredValues): string {
  const stored: Record<string, StoredQuantity> = {};
  for (const [name, { lo, hi, reason }] of Object.entries(values)) {
    if (reason === NO_FORECAST.reason) continue;
    stored[name] = reason === undefined ? [end(lo), end(hi)] : [end(lo), end(hi), reason];
  }
  return JSON.stringify(stored);
}

/** The measured values that `measuresToJson` wrote. */
export function measuresFromJson(text: string): MeasuredValues {
  const stored = JSON.parse(text) as Partial<Record<MeasureName, StoredQuantity>>;
  const values: { [Name in MeasureName]?: Quantity } = { ...WITHOUT_FORECAST };
  for (const name in stored) values[name as MeasureName] = quantityOf(...stored[name as MeasureName]!);
  return values;
}
