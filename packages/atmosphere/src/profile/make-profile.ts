import { standardPressureHPa } from '../temperature';
import type { Level, Profile, ProfileAir, ProfileLevel } from './level';

/** Coldest and warmest air a profile accepts, °C: beyond every record at the ground (−89.2, 56.7 °C; [WMOExtremes]). */
export const ACCEPTED_TEMPERATURE_C = { lowest: -100, highest: 70 } as const;
/** Lowest and highest station pressure a profile accepts, hPa. */
export const ACCEPTED_PRESSURE_HPA = { lowest: 400, highest: 1100 } as const;

const within = (value: number, range: { readonly lowest: number; readonly highest: number }): boolean =>
  value >= range.lowest && value <= range.highest;

const arranged = (level: Level, notes: string[]): ProfileLevel => {
  const { heightM, temperatureC, sigmaC, quality } = level;
  const blank = { heightM, temperatureC: null, sigmaC: null, suspect: false };
  if (temperatureC === null || !Number.isFinite(temperatureC)) return blank;
  if (quality === 'failed' || quality === 'missing') return blank;
  if (!within(temperatureC, ACCEPTED_TEMPERATURE_C)) {
    notes.push(`${temperatureC} °C at ${heightM} m is no temperature of air and was set aside`);
    return blank;
  }
  const sigma = typeof sigmaC === 'number' && sigmaC >= 0 && Number.isFinite(sigmaC) ? sigmaC : null;
  return { heightM, temperatureC, sigmaC: sigma, suspect: quality === 'suspect' };
};

/** Several values at one height become their mean, whatever their order; a missing one among them is passed over. */
const merged = (same: readonly ProfileLevel[], notes: string[]): ProfileLevel => {
  const given = same.filter((l) => l.temperatureC !== null);
  if (same.length === 1 || given.length <= 1) return given[0] ?? same[0]!;
  const heightM = same[0]!.heightM;
  notes.push(`${given.length} values at ${heightM} m were averaged`);
  const sorted = given.map((l) => l.temperatureC!).sort((a, b) => a - b);
  const sigmas = given.map((l) => l.sigmaC);
  return {
    heightM,
    temperatureC: sorted.reduce((sum, t) => sum + t, 0) / sorted.length,
    sigmaC: sigmas.includes(null)
      ? null
      : Math.hypot(...sigmas.map((s) => s!).sort((a, b) => a - b)) / sigmas.length,
    suspect: given.some((l) => l.suspect),
  };
};

const pressureOf = (air: ProfileAir, notes: string[]): { pressureHPa: number; pressureAssumed: boolean } => {
  const measured = air.pressureHPa;
  if (typeof measured === 'number' && within(measured, ACCEPTED_PRESSURE_HPA)) {
    return { pressureHPa: measured, pressureAssumed: false };
  }
  if (typeof measured === 'number') notes.push(`${measured} hPa is no station pressure and was set aside`);
  const elevationM =
    typeof air.elevationM === 'number' && Number.isFinite(air.elevationM) ? air.elevationM : 0;
  const assumed = standardPressureHPa(elevationM);
  const usable =
    assumed !== null && within(assumed, ACCEPTED_PRESSURE_HPA) ? assumed : standardPressureHPa(0)!;
  return { pressureHPa: usable, pressureAssumed: true };
};

/**
 * Arranges levels handed in in any order into a profile.
 *
 * Heights that are no number are set aside with a note; values that are null, NaN, failed or beyond
 * `ACCEPTED_TEMPERATURE_C` leave their level *missing* (it then cuts); values at one height are averaged. Pressure
 * missing or beyond `ACCEPTED_PRESSURE_HPA` is taken from the standard atmosphere at the elevation (sea level when
 * that is missing too) and marked assumed.
 *
 * Units: m above ground, °C, hPa. Valid: any levels, also none: the result does not depend on their order.
 * Source: [WMO8] (one value per height); [ICAO7488] for assumed pressure.
 */
export function makeProfile(levels: readonly Level[], air: ProfileAir = {}): Profile {
  const notes: string[] = [];
  const arrangedLevels = isAscending(levels)
    ? levels.map((level) => arranged(level, notes))
    : byHeight(levels, notes);
  return {
    levels: arrangedLevels,
    ...pressureOf(air, notes),
    matchedPairs: air.matchedPairs ?? [],
    humidity: air.humidity ?? [],
    notes: notes.sort(),
  };
}

/** Whether the heights are numbers and each above the one before, as they mostly come. */
const isAscending = (levels: readonly Level[]): boolean =>
  levels.every(({ heightM }, i) => Number.isFinite(heightM) && (i === 0 || heightM > levels[i - 1]!.heightM));

const byHeight = (levels: readonly Level[], notes: string[]): ProfileLevel[] => {
  const atHeight = new Map<number, ProfileLevel[]>();
  for (const level of levels) {
    if (!Number.isFinite(level.heightM)) {
      notes.push('a level without a height was set aside');
      continue;
    }
    const same = atHeight.get(level.heightM) ?? [];
    same.push(arranged(level, notes));
    atHeight.set(level.heightM, same);
  }
  const heights = [...atHeight.keys()].sort((a, b) => a - b);
  return heights.map((heightM) => merged(atHeight.get(heightM)!, notes));
};
