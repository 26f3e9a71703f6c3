import type { MeasuredQuantity } from '@lidwatch/atmosphere';
import type { SensorQuantity } from '../towers/quantities';

/** What screening calls each quantity. */
export const measuredQuantity: Readonly<Record<SensorQuantity, MeasuredQuantity>> = {
  'air temperature': 'air temperature',
  'relative humidity': 'relative humidity',
  'dew point': 'dew point',
  'wet bulb': 'wet bulb',
  'wind speed': 'wind speed',
  'wind direction': 'wind direction',
  'station pressure': 'pressure',
  'pm2.5': 'pm25',
};
