/**
 * Saturation vapour pressure over water, Bolton 1980.
 *
 * Units: °C in, hPa out. Valid: −30 to 35 °C within 0.1 %; used beyond as an extrapolation where stated.
 * Source: [Bolton1980] equation 10.
 */
export const saturationVapourPressureBoltonHPa = (temperatureC: number): number =>
  6.112 * Math.exp((17.67 * temperatureC) / (temperatureC + 243.5));

/**
 * Saturation vapour pressure over a plane surface of water, pure phase.
 *
 * Units: °C in, hPa out. Valid: −45 to 60 °C. Source: [WMO8] annex 4.B (after [Sonntag1990]).
 */
export const saturationVapourPressureWaterHPa = (temperatureC: number): number =>
  6.112 * Math.exp((17.62 * temperatureC) / (243.12 + temperatureC));

/**
 * Saturation vapour pressure over a plane surface of ice, pure phase.
 *
 * Units: °C in, hPa out. Valid: −65 to 0 °C. Source: [WMO8] annex 4.B (after [Sonntag1990]).
 */
export const saturationVapourPressureIceHPa = (temperatureC: number): number =>
  6.112 * Math.exp((22.46 * temperatureC) / (272.62 + temperatureC));

/**
 * Factor by which saturation vapour pressure in moist air exceeds that of pure water vapour.
 *
 * Units: hPa in, no unit out. Valid: 600 to 1,100 hPa. Source: [WMO8] annex 4.B.
 */
export const moistAirFactor = (pressureHPa: number): number =>
  1.0016 + 3.15e-6 * pressureHPa - 0.074 / pressureHPa;
