/** What screening made of a reading, from best to worst. Only *failed* and *missing* are left out of means. */
export type Quality = 'valid' | 'suspect' | 'failed' | 'missing';

/**
 * One temperature level of a tower as it is handed in.
 *
 * A level that the tower has but that gave no value is handed in with `temperatureC: null` (or NaN, or quality
 * *failed* or *missing*): it *cuts* what is read across it. Leave it out only if the tower has no such level.
 */
export interface Level {
  /** Height above ground, m. */
  readonly heightM: number;
  /** Mean air temperature of the block, °C; null where the level gave none. */
  readonly temperatureC: number | null;
  /** One standard deviation of the temperature, °C; leave out when not known. */
  readonly sigmaC?: number | null;
  /** Readings in the mean. */
  readonly n?: number;
  readonly quality?: Quality;
}

/** A level of an arranged profile: a value, or a declared level without one. */
export interface ProfileLevel {
  readonly heightM: number;
  readonly temperatureC: number | null;
  readonly sigmaC: number | null;
  readonly suspect: boolean;
}

/** A level that has its temperature. */
export type MeasuredLevel = ProfileLevel & { readonly temperatureC: number };

/** ΔT between two levels measured by a matched pair, whose uncertainty is smaller than the sensors' own. */
export interface MatchedPair {
  readonly lowerM: number;
  readonly upperM: number;
  /** One standard deviation of the difference, °C. */
  readonly sigmaC: number;
}

/** Relative humidity over water at one height of the tower. */
export interface HumidityLevel {
  readonly heightM: number;
  readonly relativeHumidityPercent: number | null;
  readonly sigmaPercent?: number | null;
}

/** What a profile needs besides its levels; all may be missing. */
export interface ProfileAir {
  /** Station pressure at the lowest level, hPa. */
  readonly pressureHPa?: number | null;
  /** Elevation of the ground above sea level, m: gives the standard atmosphere's pressure when none is measured. */
  readonly elevationM?: number | null;
  readonly matchedPairs?: readonly MatchedPair[];
  readonly humidity?: readonly HumidityLevel[];
}

/** One tower at one instant, arranged: levels ascending, one per height, missing ones kept. */
export interface Profile {
  readonly levels: readonly ProfileLevel[];
  readonly pressureHPa: number;
  /** True when the pressure is the standard atmosphere's and not measured. */
  readonly pressureAssumed: boolean;
  readonly matchedPairs: readonly MatchedPair[];
  readonly humidity: readonly HumidityLevel[];
  /** What was set aside or merged while arranging, in plain words. */
  readonly notes: readonly string[];
}

/**
 * Whether a level has its temperature.
 *
 * Units: none. Valid: any arranged level. Source: none (definition).
 */
export const isMeasured = (level: ProfileLevel): level is MeasuredLevel => level.temperatureC !== null;

/**
 * The levels that have their temperature, ascending.
 *
 * Units: none. Valid: any profile, also an empty one. Source: none (definition).
 */
export const measuredLevels = (profile: Profile): readonly MeasuredLevel[] =>
  profile.levels.filter(isMeasured);
