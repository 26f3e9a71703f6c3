/** Geopotential of the US Standard Atmosphere 1976 uses this Earth radius, m. */
const EARTH_RADIUS_M = 6356766;
const SEA_LEVEL_PRESSURE_HPA = 1013.25;
const SEA_LEVEL_TEMPERATURE_K = 288.15;
const LAPSE_RATE_K_PER_M = 0.0065;
/** Gas constant of the standard's air, J kg⁻¹ K⁻¹ (8314.32/28.9644), and g₀: the exponent is 5.25588. */
const EXPONENT = 9.80665 / ((8314.32 / 28.9644) * LAPSE_RATE_K_PER_M);
const LOWEST_M = -5000;
const TROPOPAUSE_M = 11000;

/** Air of the standard atmosphere at one elevation. */
export interface StandardAir {
  readonly temperatureK: number;
  readonly pressureHPa: number;
  readonly densityKgPerM3: number;
}

/**
 * Geopotential height from geometric height.
 *
 * Units: m in, m out. Valid: heights above −EARTH_RADIUS. Source: [USSA1976] equation 18.
 */
export const geopotentialHeightM = (geometricM: number): number =>
  (EARTH_RADIUS_M * geometricM) / (EARTH_RADIUS_M + geometricM);

/**
 * Temperature, pressure and density of the standard troposphere, for a station without a barometer.
 *
 * Units: geopotential m in; K, hPa, kg/m³ out (below 2 km geometric and geopotential height differ by less than
 * 1 m). Valid: −5,000 to 11,000 m; null outside. Source: [ICAO7488], [USSA1976].
 */
export function standardAtmosphere(heightM: number): StandardAir | null {
  if (!(heightM >= LOWEST_M && heightM <= TROPOPAUSE_M)) return null;
  const temperatureK = SEA_LEVEL_TEMPERATURE_K - LAPSE_RATE_K_PER_M * heightM;
  const pressureHPa = SEA_LEVEL_PRESSURE_HPA * Math.pow(temperatureK / SEA_LEVEL_TEMPERATURE_K, EXPONENT);
  const densityKgPerM3 = (100 * pressureHPa) / ((8314.32 / 28.9644) * temperatureK);
  return { temperatureK, pressureHPa, densityKgPerM3 };
}

/**
 * Pressure to assume where none is measured.
 *
 * Units: elevation in m above sea level, hPa out. Valid: −5,000 to 11,000 m; null outside.
 * Source: [ICAO7488], [USSA1976]. Mark what follows from it as assumed.
 */
export const standardPressureHPa = (elevationM: number): number | null =>
  standardAtmosphere(elevationM)?.pressureHPa ?? null;
