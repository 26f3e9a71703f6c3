/** What a sensor may measure, and the unit its readings come in. */
export const unitsByQuantity = {
  'air temperature': '°C',
  'relative humidity': '%',
  'dew point': '°C',
  'wet bulb': '°C',
  'wind speed': 'm/s',
  'wind direction': '°',
  'station pressure': 'hPa',
  'pm2.5': 'µg/m³',
} as const;

/** A measured quantity by name. */
export type SensorQuantity = keyof typeof unitsByQuantity;

/** Every quantity, in the order of the table. */
export const sensorQuantities = Object.keys(unitsByQuantity) as SensorQuantity[];
