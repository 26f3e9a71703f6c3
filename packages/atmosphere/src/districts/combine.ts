import { maximum, median, minimum, notKnown, type Quantity } from '../bounds';

/** How the towers of a district answer together. */
export type Combination = 'first that is fresh' | 'any' | 'all' | 'median';

/** What one tower says, in the order of the district's list. */
export interface TowerAnswer {
  readonly towerId: string;
  /** UTC epoch seconds of the END of its newest valid block; null when it has none. */
  readonly newestBlockEnd: number | null;
  /** Interval of the tower's readings, s. */
  readonly intervalS: number;
  readonly value: Quantity;
}

/** The district's value, and which towers gave it. */
export interface DistrictAnswer {
  readonly value: Quantity;
  readonly spoke: readonly string[];
  readonly silent: readonly string[];
}

/** A tower is fresh for at least so long after its newest valid block, s; a setting. */
export const FRESH_FOR_S = 45 * 60;
const FRESH_FOR_INTERVALS = 2.5;

/**
 * Whether a tower is fresh: its newest valid block ended less than max(45 min, 2.5 intervals) before `t`.
 *
 * Units: UTC epoch seconds, s. Valid: a tower without a block, or whose block ends after `t`, is not fresh.
 * Source: common practice; the time is a setting.
 */
export function isFresh(
  newestBlockEnd: number | null,
  intervalS: number,
  t: number,
  forS: number = FRESH_FOR_S,
): boolean {
  if (newestBlockEnd === null || newestBlockEnd > t) return false;
  return t - newestBlockEnd < Math.max(forS, FRESH_FOR_INTERVALS * intervalS);
}

const combined: Readonly<
  Record<Exclude<Combination, 'first that is fresh'>, (...q: Quantity[]) => Quantity>
> = {
  any: maximum,
  all: minimum,
  median,
};

/**
 * What the towers of a district say together of one measure. A tower that is not fresh is silent, and its value is not
 * known: *any* is the maximum, *all* the minimum, *median* the median, all of them bounded where a tower is silent.
 *
 * Units: those of the measure; UTC epoch seconds. Valid: towers in the district's order; with none fresh the *first
 * that is fresh* is not known. Source: none (definition); bounds [IEEE1788].
 */
export function combineTowers(
  towers: readonly TowerAnswer[],
  combination: Combination,
  t: number,
  freshForS: number = FRESH_FOR_S,
): DistrictAnswer {
  const fresh = towers.filter((tower) => isFresh(tower.newestBlockEnd, tower.intervalS, t, freshForS));
  const silent = towers.filter((tower) => !fresh.includes(tower)).map((tower) => tower.towerId);
  if (combination === 'first that is fresh') {
    const first = fresh[0];
    if (first === undefined)
      return { value: notKnown('no tower of the district is fresh'), spoke: [], silent };
    return { value: first.value, spoke: [first.towerId], silent };
  }
  const values = towers.map((tower) =>
    fresh.includes(tower) ? tower.value : notKnown(`${tower.towerId} is silent`),
  );
  return { value: combined[combination](...values), spoke: fresh.map((tower) => tower.towerId), silent };
}
