import type { Comparison } from '@lidwatch/atmosphere';
import { MEASURES, type MeasureName } from '../measures/catalogue';

/** The values still possible for one measure: an interval whose ends may be left out. */
export interface Region {
  readonly lo: number;
  readonly loOpen: boolean;
  readonly hi: number;
  readonly hiOpen: boolean;
}

/**
 * All values a measure can have.
 *
 * Units: the measure's. Valid: any measure. Source: the catalogue.
 */
export function wholeRegion(measure: MeasureName): Region {
  const { lo, hi } = MEASURES[measure].possible;
  return { lo, loOpen: false, hi, hiOpen: false };
}

/**
 * The part of a region that satisfies a comparison, or null when none does. For whole-number measures open ends are
 * moved to the next whole number, so that "above 1 and below 2" is seen to be empty.
 *
 * Units: the measure's. Valid: a finite value. Source: none (interval arithmetic).
 */
export function narrowed(region: Region, measure: MeasureName, op: Comparison, value: number): Region | null {
  let { lo, loOpen, hi, hiOpen } = region;
  const atLo = op === '>=' || op === '>' || op === '=';
  const atHi = op === '<=' || op === '<' || op === '=';
  if (atLo && (value > lo || (value === lo && op === '>'))) [lo, loOpen] = [value, op === '>'];
  if (atHi && (value < hi || (value === hi && op === '<'))) [hi, hiOpen] = [value, op === '<'];
  if (MEASURES[measure].whole) {
    lo = loOpen ? Math.floor(lo) + 1 : Math.ceil(lo);
    hi = hiOpen ? Math.ceil(hi) - 1 : Math.floor(hi);
    loOpen = hiOpen = false;
  }
  return lo < hi || (lo === hi && !loOpen && !hiOpen) ? { lo, loOpen, hi, hiOpen } : null;
}

/**
 * One value within a region, the plainest there is: an end that belongs to it, else its middle.
 *
 * Units: those of the region. Valid: a region that is not empty. Source: none (definition).
 */
export function exampleOf({ lo, loOpen, hi, hiOpen }: Region): number {
  if (!loOpen) return lo;
  return hiOpen ? (lo + hi) / 2 : hi;
}
