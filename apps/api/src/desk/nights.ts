const DAY_S = 86_400;
const RAD = Math.PI / 180;
/** Julian day of 2000-01-01 12:00 UTC and of the epoch. */
const J2000 = 2_451_545;
const JULIAN_EPOCH = 2_440_587.5;
/** Elevation of the sun's centre at sunrise: refraction and its half-width, degrees. */
const HORIZON_DEG = -0.833;
const OBLIQUITY_DEG = 23.4397;

/** From sunset to sunrise, UTC epoch seconds. */
export interface Night {
  readonly from: number;
  readonly to: number;
}

/**
 * Sunrise and sunset of the solar day whose noon is nearest to an instant, UTC epoch seconds, to about two minutes;
 * null where the sun does not rise or does not set. Source: the sunrise equation (Meeus, Astronomical Algorithms,
 * ch. 15 and 25, low accuracy).
 */
export function sunTimes(
  t: number,
  latitude: number,
  longitude: number,
): { rise: number; set: number } | null {
  const n = Math.round(t / DAY_S + JULIAN_EPOCH - J2000 + longitude / 360);
  const meanNoon = n - longitude / 360;
  const anomaly = (357.5291 + 0.98560028 * meanNoon) * RAD;
  const centre = 1.9148 * Math.sin(anomaly) + 0.02 * Math.sin(2 * anomaly) + 0.0003 * Math.sin(3 * anomaly);
  const ecliptic = anomaly + (centre + 180 + 102.9372) * RAD;
  const noon = J2000 + meanNoon + 0.0053 * Math.sin(anomaly) - 0.0069 * Math.sin(2 * ecliptic);
  const declination = Math.asin(Math.sin(ecliptic) * Math.sin(OBLIQUITY_DEG * RAD));
  const cosHour =
    (Math.sin(HORIZON_DEG * RAD) - Math.sin(latitude * RAD) * Math.sin(declination)) /
    (Math.cos(latitude * RAD) * Math.cos(declination));
  if (Math.abs(cosHour) > 1) return null;
  const half = Math.acos(cosHour) / (2 * Math.PI);
  const epoch = (julian: number): number => Math.round((julian - JULIAN_EPOCH) * DAY_S);
  return { rise: epoch(noon - half), set: epoch(noon + half) };
}

/** The nights that touch [from, to]; those without a sunset or a sunrise are left out. */
export function nightsBetween(from: number, to: number, latitude: number, longitude: number): Night[] {
  const nights: Night[] = [];
  for (let noon = from - DAY_S; noon < to + DAY_S; noon += DAY_S) {
    const today = sunTimes(noon, latitude, longitude);
    const tomorrow = sunTimes(noon + DAY_S, latitude, longitude);
    if (today && tomorrow && today.set < to && tomorrow.rise > from) {
      nights.push({ from: today.set, to: tomorrow.rise });
    }
  }
  return nights;
}
