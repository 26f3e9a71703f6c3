import { exactly, notKnown, type Quantity } from '../bounds';
import { truncatedToTenth } from './truncate';

/** Hours in a NowCast. Source: [EPANowCast]. */
export const NOWCAST_HOURS = 12;
const LEAST_WEIGHT = 0.5;
const NEWEST_HOURS = 3;
const NEEDED_OF_NEWEST = 2;

/** What the reader must be told about a NowCast. */
export type NowCastNote = 'negative hours entered as 0' | 'every hour was 0';

/** A NowCast with the weight that made it. */
export interface NowCast {
  /** Truncated to 0.1 µg/m³, as reported. */
  readonly reportedUgM3: Quantity;
  /** Before truncation. */
  readonly valueUgM3: Quantity;
  readonly weight: number | null;
  readonly notes: readonly NowCastNote[];
}

/**
 * NowCast of PM2.5: a mean of the last 12 hourly means weighted towards the newest, the more so the more they vary.
 *
 * Units: µg/m³, newest hour first; null where an hour is missing (its exponent is kept). Valid: 2 of the newest 3 hours
 * must be there, else not known. Hours after the twelfth are passed over. Negative hours enter as 0; hours that are all
 * 0 give 0. Source: [EPANowCast]: w = 1 − (max − min)/max, at least 0.5.
 */
export function nowCast(hoursNewestFirst: readonly (number | null)[]): NowCast {
  const hours = hoursNewestFirst
    .slice(0, NOWCAST_HOURS)
    .map((hour, ago) => ({ ago, value: Number.isFinite(hour) ? hour! : null }))
    .filter((hour): hour is { ago: number; value: number } => hour.value !== null);
  const newest = hours.filter((hour) => hour.ago < NEWEST_HOURS).length;
  if (newest < NEEDED_OF_NEWEST) {
    const missing = notKnown(
      `${newest} of the newest ${NEWEST_HOURS} hours are there, ${NEEDED_OF_NEWEST} are needed`,
    );
    return { reportedUgM3: missing, valueUgM3: missing, weight: null, notes: [] };
  }
  const values = hours.map((hour) => Math.max(0, hour.value));
  const [highest, lowest] = [Math.max(...values), Math.min(...values)];
  const weight = highest === 0 ? 1 : Math.max(LEAST_WEIGHT, lowest / highest);
  const weights = hours.map((hour) => weight ** hour.ago);
  const sum = values.reduce((total, value, i) => total + value * weights[i]!, 0);
  const value = sum / weights.reduce((total, w) => total + w, 0);
  const notes: NowCastNote[] = hours.some((hour) => hour.value < 0) ? ['negative hours entered as 0'] : [];
  if (highest === 0) notes.push('every hour was 0');
  return { reportedUgM3: exactly(truncatedToTenth(value)), valueUgM3: exactly(value), weight, notes };
}
