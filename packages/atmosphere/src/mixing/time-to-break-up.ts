import { atLeast, between, divide, exactly, isNotKnown, notKnown, type Quantity } from '../bounds';

const S_PER_HOUR = 3600;

/** Heat deficit of one tower at one instant. */
export interface HeatDeficitAt {
  /** UTC epoch seconds. */
  readonly tEnd: number;
  readonly heatDeficitJPerM2: Quantity;
}

/**
 * Rate at which a column was being heated: the fall of its heat deficit between observations, as the range from the
 * slowest to the fastest of the intervals.
 *
 * Units: J/m² and s in; W/m² out, positive when it is being heated. Valid: two or more observations to the same
 * height, in any order; the part within the tower is used where a deficit is "at least". Not known with fewer.
 * Source: [Whiteman2014] (the deficit's change is the net heating).
 */
export function heatingRateWPerM2(observations: readonly HeatDeficitAt[]): Quantity {
  const seen = observations
    .filter((o) => Number.isFinite(o.heatDeficitJPerM2.lo))
    .sort((a, b) => a.tEnd - b.tEnd)
    .filter((o, i, all) => i === 0 || o.tEnd > all[i - 1]!.tEnd);
  if (seen.length < 2) return notKnown('fewer than two heat deficits were seen');
  const rates = seen.slice(1).map((o, i) => {
    const before = seen[i]!;
    return (before.heatDeficitJPerM2.lo - o.heatDeficitJPerM2.lo) / (o.tEnd - before.tEnd);
  });
  const [slowest, fastest] = [Math.min(...rates), Math.max(...rates)];
  return slowest === fastest ? exactly(slowest) : between(slowest, fastest);
}

/**
 * Time until the heat deficit is used up at a heating rate, simple and as a range: heat lost to the ground, advection
 * and a lid above the tower are not in it.
 *
 * Units: J/m² and W/m² in; hours out. Valid: a deficit that is not negative; a rate that may be nought or below leaves
 * the upper end open; one that is nowhere above nought gives not known. Source: [Whiteman2014]; heat over heating rate.
 */
export function timeToBreakUpHours(heatDeficitJPerM2: Quantity, heatingRate: Quantity): Quantity {
  if (isNotKnown(heatDeficitJPerM2))
    return notKnown(heatDeficitJPerM2.reason ?? 'the heat deficit is not known');
  if (isNotKnown(heatingRate)) return notKnown(heatingRate.reason ?? 'the heating rate is not known');
  if (heatingRate.hi <= 0) return notKnown('the column is not being heated');
  if (heatDeficitJPerM2.hi <= 0) return exactly(0);
  const fastest = heatingRate.hi === Infinity ? 0 : Math.max(heatDeficitJPerM2.lo, 0) / heatingRate.hi;
  const slowest = heatingRate.lo > 0 ? heatDeficitJPerM2.hi / heatingRate.lo : Infinity;
  const [lo, hi] = [fastest / S_PER_HOUR, slowest / S_PER_HOUR];
  if (lo === hi) return exactly(lo);
  return hi === Infinity
    ? atLeast(lo, 'the heating may cease, or the lid is above the tower')
    : between(lo, hi);
}

/**
 * Net radiation a sunlit column would need to lose its deficit by a given hour.
 *
 * Units: J/m² and hours in; W/m² out. Valid: hours above 0; else not known. Source: none (heat over time).
 */
export function heatingNeededWPerM2(heatDeficitJPerM2: Quantity, hours: number): Quantity {
  if (!(hours > 0)) return notKnown('no time is left');
  return divide(heatDeficitJPerM2, hours * S_PER_HOUR);
}
