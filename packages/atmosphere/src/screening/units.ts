import type { MeasuredQuantity } from './reading';

/** Units of the sensors' values, for the reasons that people read. */
export const UNIT_OF: Readonly<Record<MeasuredQuantity, string>> = {
  'air temperature': '°C',
  'relative humidity': '%',
  'dew point': '°C',
  'wet bulb': '°C',
  'wind speed': 'm/s',
  'wind direction': '°',
  pressure: 'hPa',
  pm25: 'µg/m³',
};

/**
 * A number for a reason that a person reads.
 *
 * Units: unchanged. Valid: any finite number; at most two decimals. Source: none (definition).
 */
export const said = (value: number): string => String(Math.round(value * 100) / 100);
