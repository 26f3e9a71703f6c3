const K_PER_KM_IN_C_PER_100_M = 10;

/**
 * The temperature gradient +dT/dz of regulatory tables from a lapse rate Γ = −dT/dz.
 *
 * Units: K/km in, °C/100 m out, of opposite sign. Valid: any number; NaN stays NaN.
 * Source: [AMSGlossary] lapse rate.
 */
export const gradientCPer100MFromLapseRate = (lapseRateKPerKm: number): number =>
  0 - lapseRateKPerKm / K_PER_KM_IN_C_PER_100_M;

/**
 * The lapse rate Γ = −dT/dz from a gradient +dT/dz.
 *
 * Units: °C/100 m in, K/km out, of opposite sign. Valid: any number; NaN stays NaN.
 * Source: [AMSGlossary] lapse rate.
 */
export const lapseRateKPerKmFromGradient = (gradientCPer100M: number): number =>
  0 - gradientCPer100M * K_PER_KM_IN_C_PER_100_M;
