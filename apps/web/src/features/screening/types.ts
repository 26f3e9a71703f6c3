import type { components } from '../../lib/api/schema';

type Shapes = components['schemas'];

export type Tower = Shapes['Tower'];
export type Sensor = Shapes['Sensor'];
export type SensorVersion = Shapes['SensorVersion'];
export type TowerCalendar = Shapes['TowerCalendar'];
export type CalendarDay = Shapes['CalendarDay'];
export type DayOfSensor = Shapes['DayOfSensor'];
export type SeenSensor = Shapes['SeenSensor'];
export type ReadingDetail = Shapes['ReadingDetail'];
export type ReadingOrigin = Shapes['ReadingOrigin'];
export type FlaggedSpan = Shapes['FlaggedSpan'];
export type Check = FlaggedSpan['check'];
export type Quality = FlaggedSpan['quality'];
export type RawReadings = Shapes['RawReadings'];
export type RawSeries = Shapes['RawSeries'];
export type RawReading = Shapes['RawReading'];
/** A span of a sensor that a person has set. */
export type SetSpan = Shapes['Override'];
export type SensorLimits = Shapes['SensorLimits'];
export type CheckLimits = Shapes['CheckLimits'];
export type LevelDifference = Shapes['LevelDifference'];
export type Rework = Shapes['Rework'];
export type ChangedFindings = Shapes['ChangedFindings'];
/** What a person may say of readings: *failed* sets them aside, *valid* sets them right. */
export type Said = SetSpan['quality'];
