import { atLeast, exactly, notKnown, type Quantity } from '../bounds';
import { truncatedToTenth } from './truncate';

/** A mean over one hour, labelled by its END, UTC epoch seconds. */
export interface HourlyMean {
  readonly tEnd: number;
  readonly valueUgM3: number | null;
}

/** A 24-h mean with the hours that made it. */
export interface DayMean {
  /** UTC epoch seconds of its END. */
  readonly tEnd: number;
  /** "At least" when too few hours are there but they alone, with 0 for the rest, exceed the standard. */
  readonly meanUgM3: Quantity;
  readonly hours: number;
}

const S_PER_HOUR = 3600;
const HOURS = 24;
const S_PER_DAY = HOURS * S_PER_HOUR;
/** Hours that a valid day needs: 75 %. Source: [40CFR50N] 3.0. */
export const HOURS_NEEDED_OF_24 = 18;
/** Level of the 24-h standard, µg/m³; a setting. Source: [40CFR50N], 40 CFR 50.18. */
export const STANDARD_24_H_UG_M3 = 35;

const mean24 = (hours: readonly HourlyMean[], tEnd: number, standardUgM3: number): DayMean => {
  const byEnd = new Map<number, number>();
  for (const { tEnd: end, valueUgM3 } of hours) {
    const inside = end > tEnd - S_PER_DAY && end <= tEnd;
    if (inside && Number.isFinite(valueUgM3))
      byEnd.set(end, Math.min(valueUgM3!, byEnd.get(end) ?? Infinity));
  }
  const n = byEnd.size;
  const sum = [...byEnd.keys()].sort((a, b) => a - b).reduce((total, end) => total + byEnd.get(end)!, 0);
  if (n >= HOURS_NEEDED_OF_24) return { tEnd, meanUgM3: exactly(sum / n), hours: n };
  const why = `${n} of ${HOURS} hours are there, ${HOURS_NEEDED_OF_24} are needed`;
  const least = truncatedToTenth(sum / HOURS);
  return { tEnd, meanUgM3: least > standardUgM3 ? atLeast(sum / HOURS, why) : notKnown(why), hours: n };
};

/**
 * The regulatory 24-h mean: from midnight to midnight of local standard time, of at least 18 hours, over the hours
 * that are there.
 *
 * Units: µg/m³, UTC epoch seconds, s. Valid: `tEnd` is any instant of the day (start, end]; the offset is the one of
 * standard time all year. With fewer hours it is not known, save that it is "at least" the mean with 0 for the missing
 * hours where that exceeds the standard. Of two values for one hour the smaller counts.
 * Source: [40CFR50N] 3.0 (the rule on missing hours from memory).
 */
export function regulatoryDayMean(
  hours: readonly HourlyMean[],
  tEnd: number,
  standardTimeOffsetS: number,
  standardUgM3: number = STANDARD_24_H_UG_M3,
): DayMean {
  const midnight = Math.ceil((tEnd + standardTimeOffsetS) / S_PER_DAY) * S_PER_DAY - standardTimeOffsetS;
  return mean24(hours, midnight, standardUgM3);
}

/**
 * The running 24-h mean of the 24 hours that end at `tEnd`: another number than the regulatory one, and never called so.
 *
 * Units: µg/m³, UTC epoch seconds. Valid: as the regulatory mean. Source: none (a running form of [40CFR50N] 3.0).
 */
export function runningDayMean(
  hours: readonly HourlyMean[],
  tEnd: number,
  standardUgM3: number = STANDARD_24_H_UG_M3,
): DayMean {
  return mean24(hours, tEnd, standardUgM3);
}
