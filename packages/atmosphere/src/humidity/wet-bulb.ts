import { exactly, isKnown, notKnown, type Quantity } from '../bounds';
import { vapourPressureFromWetBulbHPa } from './vapour-pressure';

const LOWEST_WET_BULB_C = -65;
/** Halving a bracket of some 100 °C so often leaves less than 1e-10 °C. */
const HALVINGS = 45;

/** Vapour pressure the psychrometer formula gives for a wet bulb; far below nought where no vapour would be left. */
const vapourOf = (temperatureC: number, wetBulbC: number, pressureHPa: number): number => {
  const vapour = vapourPressureFromWetBulbHPa(temperatureC, wetBulbC, pressureHPa);
  return isKnown(vapour) ? vapour.lo : -Infinity;
};

/**
 * Wet-bulb temperature an aspirated psychrometer would show, found by halving on the psychrometer formula: a water
 * bulb at 0 °C and above, an ice bulb below.
 *
 * Units: °C and hPa in; °C out. Valid: −45 to 60 °C, pressure above 0, vapour pressure above 0 and at most saturation
 * in moist air at the air's temperature; else not known. Near 0 °C the two bulbs leave a small step.
 * Source: [WMO8] annex 4.B, psychrometer coefficients from memory.
 */
export function wetBulbC(temperatureC: number, vapourPressureHPa: number, pressureHPa: number): Quantity {
  if (!(temperatureC >= -45 && temperatureC <= 60)) return notKnown('the air is outside −45 to 60 °C');
  if (!(vapourPressureHPa > 0) || !(pressureHPa > 0))
    return notKnown('vapour pressure or pressure is not known');
  if (vapourPressureHPa > vapourOf(temperatureC, temperatureC, pressureHPa)) {
    return notKnown('the air is more than saturated');
  }
  let low = LOWEST_WET_BULB_C;
  let high = temperatureC;
  for (let i = 0; i < HALVINGS; i += 1) {
    const middle = (low + high) / 2;
    if (vapourOf(temperatureC, middle, pressureHPa) < vapourPressureHPa) low = middle;
    else high = middle;
  }
  return exactly(high);
}

/**
 * Wet-bulb temperature by Stull's empirical formula, for quick use near sea level.
 *
 * Units: °C and % in; °C out. Valid: −20 to 50 °C and 5 to 99 % near 1013 hPa (error −1 to +0.65 °C); else not known.
 * Source: [Stull2011] equation 1.
 */
export function wetBulbStullC(temperatureC: number, overWaterPercent: number): Quantity {
  const [t, rh] = [temperatureC, overWaterPercent];
  if (!(t >= -20 && t <= 50 && rh >= 5 && rh <= 99)) return notKnown('outside −20 to 50 °C or 5 to 99 %');
  const first = t * Math.atan(0.151977 * Math.sqrt(rh + 8.313659));
  const second = Math.atan(t + rh) - Math.atan(rh - 1.676331);
  return exactly(first + second + 0.00391838 * rh ** 1.5 * Math.atan(0.023101 * rh) - 4.686035);
}
