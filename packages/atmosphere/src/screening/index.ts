export * from './reading';
export * from './settings';
export type { SensorSeries } from './series';
export type { WrongClock } from './clock';
export type { SunElevationDeg } from './vertical';
export { overrideAt } from './overrides';
export * from './context';
export * from './screen-tower';
