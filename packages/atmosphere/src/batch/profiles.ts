import { ACCEPTED_PRESSURE_HPA, ACCEPTED_TEMPERATURE_C } from '../profile';

/** Stability classes as numbers, in the order of `STABILITY_CLASSES`; 255 where a layer has none. */
export const NO_CLASS = 255;
/** How a surface finding is coded: absent, present, not known. */
export const SURFACE_CODES = { absent: 0, present: 1, 'not known': 2 } as const;
/** How an open end is coded: no, at the top, cut by a missing level. */
export const OPEN_CODES = { no: 0, 'at the top': 1, 'cut by a missing level': 2 } as const;

/**
 * Many profiles of one tower, row after row: temperature of profile i at level j is `temperatureC[i * levels + j]`, NaN
 * where the level gave nothing.
 */
export interface ProfileBatch {
  /** Heights above ground, m, strictly ascending, at least 2. */
  readonly heightsM: readonly number[];
  readonly temperatureC: Float64Array;
  /** Pressure at the lowest level of each profile, hPa; NaN takes `assumedPressureHPa`. */
  readonly pressureHPa: Float64Array;
  readonly assumedPressureHPa: number;
  readonly isothermalHalfWidthKPerKm: number;
}

/** What the batch path finds, row after row as in the batch; layers have one entry fewer than levels. */
export interface BatchResult {
  /** Γ of each layer, K/km; NaN where either level is missing. */
  readonly lapseRateKPerKm: Float64Array;
  readonly stabilityClass: Uint8Array;
  /** Plain form, embed depth 0. */
  readonly surface: Uint8Array;
  readonly open: Uint8Array;
  /** Top of the surface inversion, m; NaN without one. */
  readonly topM: Float64Array;
  /** Strength within the tower, °C; 0 when absent, NaN when not known. */
  readonly strengthC: Float64Array;
  /** Heat deficit to the tower's top, J/m², of the part that is known; NaN when not known. */
  readonly heatDeficitJPerM2: Float64Array;
  /** 1 where strength and heat deficit are "at least". */
  readonly heatAtLeast: Uint8Array;
}

/**
 * Room for the results of so many profiles, to be used again and again.
 *
 * Units: counts. Valid: whole numbers of 0 and above. Source: none (definition).
 */
export function batchResult(profiles: number, levels: number): BatchResult {
  const layers = profiles * (levels - 1);
  return {
    lapseRateKPerKm: new Float64Array(layers),
    stabilityClass: new Uint8Array(layers),
    surface: new Uint8Array(profiles),
    open: new Uint8Array(profiles),
    topM: new Float64Array(profiles),
    strengthC: new Float64Array(profiles),
    heatDeficitJPerM2: new Float64Array(profiles),
    heatAtLeast: new Uint8Array(profiles),
  };
}

const { lowest: COLDEST_C, highest: WARMEST_C } = ACCEPTED_TEMPERATURE_C;
const { lowest: LOWEST_HPA, highest: HIGHEST_HPA } = ACCEPTED_PRESSURE_HPA;

/**
 * Whether a temperature counts as given: neither NaN nor beyond what a profile accepts.
 *
 * Units: °C. Valid: any number. Source: [WMOExtremes] bounds of `ACCEPTED_TEMPERATURE_C`.
 */
export const isGiven = (temperatureC: number): boolean =>
  temperatureC >= COLDEST_C && temperatureC <= WARMEST_C;

/**
 * Pressure of a row: measured where it is acceptable, else the assumed one.
 *
 * Units: hPa. Valid: any row of the batch. Source: [ICAO7488] by way of the caller's assumed pressure.
 */
export const pressureOf = (batch: ProfileBatch, row: number): number => {
  const measured = batch.pressureHPa[row]!;
  return measured >= LOWEST_HPA && measured <= HIGHEST_HPA ? measured : batch.assumedPressureHPa;
};
