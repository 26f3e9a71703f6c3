/** What came in at once from a tower's logger. Instants are UTC epoch seconds. */
export interface Arrival {
  readonly receivedAt: number;
  /** End of the newest reading in it. */
  readonly newestT: number;
}

/** From when on a logger's stamps are an hour away from where they were. */
export interface ClockShift {
  /** Arrival of the first that is shifted. */
  readonly at: number;
  /** +1: the stamps are an hour ahead of before, −1: an hour behind. */
  readonly hours: 1 | -1;
}

const HOUR_S = 3600;
/** So many arrivals before and after must agree among themselves. */
const BEFORE = 6;
const AFTER = 3;
const LEAST_TOLERANCE_S = 120;
const MOST_TOLERANCE_S = 900;

const median = (numbers: readonly number[]): number => {
  const sorted = [...numbers].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 === 1 ? sorted[middle]! : (sorted[middle - 1]! + sorted[middle]!) / 2;
};
const agree = (numbers: readonly number[], toleranceS: number): boolean =>
  numbers.every((each) => Math.abs(each - median(numbers)) <= toleranceS);

/**
 * Where a logger's clock was shifted by exactly an hour, newest shift first found last; as after a change to daylight
 * saving time or a visit to the logger. The time from a stamp to its arrival is steady for a logger that sends as it
 * measures; it jumps by an hour when the clock is shifted, while the arrivals themselves go on at their usual pace. A
 * link that begins to delay, or that comes back with what it had kept, makes the same jump but leaves a pause of that
 * hour between two arrivals, and so is not taken for a shift. Nothing later than the third arrival after the shift is
 * needed.
 *
 * @param arrivals oldest first, only such as came by themselves (no files that a person brought)
 * @param intervalS the logger's interval, s
 */
export function clockShifts(arrivals: readonly Arrival[], intervalS: number): ClockShift[] {
  const toleranceS = Math.min(MOST_TOLERANCE_S, Math.max(LEAST_TOLERANCE_S, intervalS));
  const lags = arrivals.map(({ receivedAt, newestT }) => receivedAt - newestT);
  const pauses = arrivals.map(
    ({ receivedAt }, i) => receivedAt - (arrivals[i - 1]?.receivedAt ?? receivedAt),
  );
  const found: ClockShift[] = [];
  let first = 0;
  for (let k = BEFORE; k + AFTER <= arrivals.length; k++) {
    const before = lags.slice(k - BEFORE, k);
    const after = lags.slice(k, k + AFTER);
    if (k - BEFORE < first || !agree(before, toleranceS) || !agree(after, toleranceS)) continue;
    const usualPauseS = median(pauses.slice(k - BEFORE + 1, k));
    if (pauses[k]! > 1.5 * usualPauseS + 300) continue;
    const jumpS = median(after) - median(before);
    if (Math.abs(Math.abs(jumpS) - HOUR_S) > toleranceS) continue;
    found.push({ at: arrivals[k]!.receivedAt, hours: jumpS > 0 ? -1 : 1 });
    first = k;
  }
  return found;
}
