import type { components } from '../../lib/api/schema';

type Shapes = components['schemas'];

/** Somebody who signs in, as the administrator sees them. */
export type User = Shapes['UserView'];
export type Sensor = Shapes['Sensor'];
export type Tower = Shapes['Tower'];
/** Something that was changed about a tower. */
export type TowerChange = Shapes['TowerChange'];
/** The towers whose readings are looked at when a tower's are screened. */
export type Neighbours = Shapes['Neighbours'];
export type Source = Shapes['Source'];
/** A file that staff sent, with the layout it was read by. */
export type Upload = Shapes['Upload'];
export type IngestKey = Shapes['IngestKey'];
export type District = Shapes['District'];
/** A version of a district's rule, as data and in plain lines. */
export type Rule = Shapes['RuleRow'];
/** Something a rule may ask about. */
export type Measure = Shapes['Measure'];
/** The office that signs the notices. */
export type Office = Shapes['Office'];

/** What a sensor measures. */
export const QUANTITIES = [
  'air temperature',
  'relative humidity',
  'dew point',
  'wet bulb',
  'wind speed',
  'wind direction',
  'station pressure',
  'pm2.5',
] as const satisfies readonly Sensor['quantity'][];
