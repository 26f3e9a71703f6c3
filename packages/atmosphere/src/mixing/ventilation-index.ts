import { between, multiply, narrow, type Quantity } from '../bounds';

/** One band of a district's ventilation index: it holds from `fromM2PerS` up to the next band. */
export interface VentilationBand {
  readonly name: string;
  readonly fromM2PerS: number;
}

/**
 * Ventilation index: mixing height times transport wind.
 *
 * Units: m and m/s in; m²/s out. Valid: neither is negative, so of a factor that is not known it is only known that it
 * is not below 0. Source: [Ferguson2003] ventilation index; bounds differ by service and are the district's settings.
 */
export function ventilationIndexM2PerS(mixingHeightM: Quantity, transportWindMPerS: Quantity): Quantity {
  const notNegative = between(0, Infinity);
  return multiply(narrow(mixingHeightM, notNegative), narrow(transportWindMPerS, notNegative));
}

/**
 * The bands a ventilation index may lie in: one when it is known well enough, several when it is a range.
 *
 * Units: m²/s. Valid: bands in any order, each from its lower bound (which belongs to it); below the lowest, none.
 * Source: [Ferguson2003]; the bounds are the district's settings.
 */
export function ventilationBands(index: Quantity, bands: readonly VentilationBand[]): readonly string[] {
  const ascending = [...bands].sort((a, b) => a.fromM2PerS - b.fromM2PerS);
  return ascending
    .filter((band, i) => {
      const next = ascending[i + 1]?.fromM2PerS ?? Infinity;
      return index.hi >= band.fromM2PerS && index.lo < next;
    })
    .map((band) => band.name);
}
