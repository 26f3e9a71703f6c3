import { ZERO_CELSIUS_K } from '../constants';

/**
 * Celsius to kelvin.
 *
 * Units: °C in, K out. Valid: any number; NaN stays NaN. Source: [WMO8] (0 °C = 273.15 K).
 */
export const kelvinFromCelsius = (temperatureC: number): number => temperatureC + ZERO_CELSIUS_K;

/**
 * Kelvin to Celsius.
 *
 * Units: K in, °C out. Valid: any number; NaN stays NaN. Source: [WMO8] (0 °C = 273.15 K).
 */
export const celsiusFromKelvin = (temperatureK: number): number => temperatureK - ZERO_CELSIUS_K;

/**
 * Fahrenheit to Celsius, for a temperature (not a difference).
 *
 * Units: °F in, °C out. Valid: any number; NaN stays NaN. Source: [NISTSP811] appendix B.
 */
export const celsiusFromFahrenheit = (temperatureF: number): number => ((temperatureF - 32) * 5) / 9;

/**
 * Celsius to Fahrenheit, for a temperature (not a difference).
 *
 * Units: °C in, °F out. Valid: any number; NaN stays NaN. Source: [NISTSP811] appendix B.
 */
export const fahrenheitFromCelsius = (temperatureC: number): number => (temperatureC * 9) / 5 + 32;

/**
 * A temperature difference from Celsius degrees to Fahrenheit degrees: 32 has no place in it.
 *
 * Units: °C (= K) in, °F out. Valid: any number; NaN stays NaN. Source: [NISTSP811] appendix B.
 */
export const fahrenheitDifferenceFromCelsius = (differenceC: number): number => (differenceC * 9) / 5;

/**
 * A temperature difference from Fahrenheit degrees to Celsius degrees.
 *
 * Units: °F in, °C (= K) out. Valid: any number; NaN stays NaN. Source: [NISTSP811] appendix B.
 */
export const celsiusDifferenceFromFahrenheit = (differenceF: number): number => (differenceF * 5) / 9;
