import { between, exactly, isKnown, isNotKnown, notKnown, type Quantity } from '../bounds';
import { isMeasured, measuredLevels, type MeasuredLevel, type Profile } from '../profile';
import { dryAdiabatTemperatureC } from '../temperature';

/** Colder than its surroundings by more than this, °C, the parcel stops: it covers only rounding. */
const ROUNDING_C = 1e-9;

/** How much warmer the lifted parcel is than the air at a level, °C. */
const excessC = (surfaceC: number, surfaceM: number, level: MeasuredLevel): number =>
  dryAdiabatTemperatureC(surfaceC, level.heightM - surfaceM) - level.temperatureC;

const missingBetween = (profile: Profile, lowerM: number, upperM: number): boolean =>
  profile.levels.some((level) => !isMeasured(level) && level.heightM >= lowerM && level.heightM < upperM);

/** The lowest crossing for one surface temperature; missing levels widen it to where it may lie. */
const crossing = (profile: Profile, levels: readonly MeasuredLevel[], surfaceC: number): [number, number] => {
  const surfaceM = profile.levels[0]!.heightM;
  const first = levels[0]!;
  const leavesGround = first.heightM === surfaceM && excessC(surfaceC, surfaceM, first) > ROUNDING_C;
  const atGround = leavesGround ? surfaceM : 0;
  const aboveGround = (heightM: number) => (heightM === surfaceM ? atGround : heightM);
  let earliestM = Infinity;
  let below = { heightM: surfaceM, excess: 0 };
  for (const level of levels) {
    const excess = excessC(surfaceC, surfaceM, level);
    const across = missingBetween(profile, below.heightM, level.heightM);
    if (across) earliestM = Math.min(earliestM, below.heightM);
    if (excess < -ROUNDING_C) {
      if (across) return [aboveGround(earliestM), level.heightM];
      const share = Math.max(below.excess, 0) / (Math.max(below.excess, 0) - excess);
      const found = aboveGround(below.heightM + share * (level.heightM - below.heightM));
      return [Math.min(aboveGround(earliestM), found), found];
    }
    below = { heightM: level.heightM, excess };
  }
  return [Math.min(aboveGround(earliestM), below.heightM), Infinity];
};

/**
 * Mixing height by the parcel method: the lowest height at which air from the ground, lifted along the dry adiabat
 * from a given surface temperature, is colder than the air around it.
 *
 * Units: °C in; m above ground out. Valid: surface temperature at the height of the lowest level, a number or a range
 * (by custom the day's forecast maximum; with the present temperature it is 0 by construction under a surface
 * inversion). 0 when the parcel is stopped at once; beyond the tower [top, ∞); a missing level widens it to where the
 * crossing may lie; not known without a temperature. Source: [Holzworth1967]; [Seidel2010] parcel method.
 */
export function mixingHeightM(profile: Profile, surfaceTemperatureC: Quantity | number): Quantity {
  const surface =
    typeof surfaceTemperatureC === 'number' ? exactly(surfaceTemperatureC) : surfaceTemperatureC;
  if (isNotKnown(surface)) return notKnown(surface.reason ?? 'the surface temperature is not known');
  const levels = measuredLevels(profile);
  if (levels.length < 2) return notKnown('a profile needs two levels or more');
  const lo = surface.lo === -Infinity ? 0 : crossing(profile, levels, surface.lo)[0];
  const hi = surface.hi === Infinity ? Infinity : crossing(profile, levels, surface.hi)[1];
  if (lo === hi) return exactly(lo);
  if (hi === Infinity) return between(lo, hi, 'the lid is above the tower');
  return between(lo, hi, isKnown(surface) ? 'a level on the way gave nothing' : surface.reason);
}
