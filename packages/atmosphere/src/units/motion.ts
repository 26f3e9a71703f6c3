const M_PER_FOOT = 0.3048;
const M_PER_S_PER_KNOT = 1852 / 3600;
const M_PER_S_PER_MILE_PER_HOUR = 1609.344 / 3600;

/**
 * International feet to metres.
 *
 * Units: ft in, m out. Valid: any number; NaN stays NaN. Source: [NISTSP811] appendix B (exact).
 */
export const metresFromFeet = (lengthFt: number): number => lengthFt * M_PER_FOOT;

/**
 * Metres to international feet.
 *
 * Units: m in, ft out. Valid: any number; NaN stays NaN. Source: [NISTSP811] appendix B (exact).
 */
export const feetFromMetres = (lengthM: number): number => lengthM / M_PER_FOOT;

/**
 * Knots to metres a second.
 *
 * Units: kt in, m/s out. Valid: any number; NaN stays NaN. Source: [NISTSP811] appendix B (1 nmi = 1852 m).
 */
export const metresPerSecondFromKnots = (speedKt: number): number => speedKt * M_PER_S_PER_KNOT;

/**
 * Metres a second to knots.
 *
 * Units: m/s in, kt out. Valid: any number; NaN stays NaN. Source: [NISTSP811] appendix B (1 nmi = 1852 m).
 */
export const knotsFromMetresPerSecond = (speedMPerS: number): number => speedMPerS / M_PER_S_PER_KNOT;

/**
 * Miles an hour to metres a second.
 *
 * Units: mph in, m/s out. Valid: any number; NaN stays NaN. Source: [NISTSP811] appendix B (exact).
 */
export const metresPerSecondFromMilesPerHour = (speedMph: number): number =>
  speedMph * M_PER_S_PER_MILE_PER_HOUR;

/**
 * Metres a second to miles an hour.
 *
 * Units: m/s in, mph out. Valid: any number; NaN stays NaN. Source: [NISTSP811] appendix B (exact).
 */
export const milesPerHourFromMetresPerSecond = (speedMPerS: number): number =>
  speedMPerS / M_PER_S_PER_MILE_PER_HOUR;

/**
 * Kilometres an hour to metres a second.
 *
 * Units: km/h in, m/s out. Valid: any number; NaN stays NaN. Source: [NISTSP811] appendix B (exact).
 */
export const metresPerSecondFromKilometresPerHour = (speedKmh: number): number => speedKmh / 3.6;

/**
 * A ventilation index from m²/s to knot-feet, the unit of United States smoke forecasts.
 *
 * Units: m²/s in, kt·ft out (1 m²/s = 6.3774 kt·ft). Valid: any number; NaN stays NaN.
 * Source: [NISTSP811] appendix B, derived.
 */
export const knotFeetFromM2PerS = (ventilationM2PerS: number): number =>
  ventilationM2PerS / (M_PER_S_PER_KNOT * M_PER_FOOT);
