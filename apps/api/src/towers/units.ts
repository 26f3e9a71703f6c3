import type { SensorQuantity } from './quantities';

interface Conversion {
  readonly quantities: readonly SensorQuantity[];
  readonly toOwn: (value: number) => number;
}

const temperatures: readonly SensorQuantity[] = ['air temperature', 'dew point', 'wet bulb'];
const MM_HG_IN_HPA = 1.333_223_87;

/**
 * Units that are not a sensor's own and what makes them so. Exact by definition: °F and K (SI brochure), mph (0.44704
 * m/s), knot (1852 m an hour), inch of mercury by 25.4 conventional mm; mmHg 133.322387 Pa (NIST SP 811, App. B).
 */
export const foreignUnits = {
  '°F': { quantities: temperatures, toOwn: (value) => ((value - 32) * 5) / 9 },
  K: { quantities: temperatures, toOwn: (value) => value - 273.15 },
  '0–1': { quantities: ['relative humidity'], toOwn: (value) => value * 100 },
  mph: { quantities: ['wind speed'], toOwn: (value) => value * 0.447_04 },
  'km/h': { quantities: ['wind speed'], toOwn: (value) => value / 3.6 },
  kn: { quantities: ['wind speed'], toOwn: (value) => (value * 1852) / 3600 },
  Pa: { quantities: ['station pressure'], toOwn: (value) => value / 100 },
  kPa: { quantities: ['station pressure'], toOwn: (value) => value * 10 },
  mmHg: { quantities: ['station pressure'], toOwn: (value) => value * MM_HG_IN_HPA },
  inHg: { quantities: ['station pressure'], toOwn: (value) => value * 25.4 * MM_HG_IN_HPA },
  'mg/m³': { quantities: ['pm2.5'], toOwn: (value) => value * 1000 },
} as const satisfies Record<string, Conversion>;

/** A unit that is converted while reading. */
export type ForeignUnit = keyof typeof foreignUnits;

/** Every unit that is converted while reading. */
export const foreignUnitNames = Object.keys(foreignUnits) as ForeignUnit[];

/** A value in its sensor's own unit. */
export const inOwnUnit = (value: number, unit: ForeignUnit | undefined): number =>
  unit === undefined ? value : foreignUnits[unit].toOwn(value);

/** Whether values in a unit can be of a quantity. */
export const suits = (unit: ForeignUnit, quantity: SensorQuantity): boolean =>
  (foreignUnits[unit].quantities as readonly SensorQuantity[]).includes(quantity);
