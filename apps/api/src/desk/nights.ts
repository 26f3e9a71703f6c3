import { getTimes } from 'suncalc';

const DAY_S = 86_400;

/** From sunset to sunrise, UTC epoch seconds. */
export interface Night {
  readonly from: number;
  readonly to: number;
}

/**
 * Sunrise and sunset of the solar day whose noon is nearest to an instant, UTC epoch seconds; null where the sun does
 * not rise or does not set. Source: the package suncalc.
 */
export function sunTimes(
  t: number,
  latitude: number,
  longitude: number,
): { rise: number; set: number } | null {
  const { sunrise, sunset } = getTimes(new Date(t * 1000), latitude, longitude);
  const [rise, set] = [sunrise.getTime(), sunset.getTime()].map((ms) => Math.round(ms / 1000));
  return Number.isNaN(rise) || Number.isNaN(set) ? null : { rise: rise!, set: set! };
}

/** The nights that touch [from, to]; those without a sunset or a sunrise are left out. */
export function nightsBetween(from: number, to: number, latitude: number, longitude: number): Night[] {
  const nights: Night[] = [];
  let tomorrow = sunTimes(from - DAY_S, latitude, longitude);
  for (let noon = from - DAY_S; noon < to + DAY_S; noon += DAY_S) {
    const today = tomorrow;
    tomorrow = sunTimes(noon + DAY_S, latitude, longitude);
    if (today && tomorrow && today.set < to && tomorrow.rise > from) {
      nights.push({ from: today.set, to: tomorrow.rise });
    }
  }
  return nights;
}
