const PA_PER_HPA = 100;
const HPA_PER_INCH_OF_MERCURY = 33.86389;

/**
 * Pascal to hectopascal (= millibar).
 *
 * Units: Pa in, hPa out. Valid: any number; NaN stays NaN. Source: [NISTSP811] appendix B.
 */
export const hPaFromPa = (pressurePa: number): number => pressurePa / PA_PER_HPA;

/**
 * Hectopascal (= millibar) to pascal.
 *
 * Units: hPa in, Pa out. Valid: any number; NaN stays NaN. Source: [NISTSP811] appendix B.
 */
export const paFromHPa = (pressureHPa: number): number => pressureHPa * PA_PER_HPA;

/**
 * Inches of mercury (at 0 °C) to hectopascal.
 *
 * Units: inHg in, hPa out. Valid: any number; NaN stays NaN. Source: [NISTSP811] appendix B, 3.386389 kPa.
 */
export const hPaFromInchesOfMercury = (pressureInHg: number): number =>
  pressureInHg * HPA_PER_INCH_OF_MERCURY;
