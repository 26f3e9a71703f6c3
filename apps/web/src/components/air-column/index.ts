export { AirColumn } from './air-column';
export { lidFromLevels, sharedScale } from './column-data';
export type { ColumnLevel, ColumnLid, TemperatureScale } from './column-data';
