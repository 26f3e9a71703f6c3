/** Classes of Regulatory Guide 1.23, from the most unstable to the most stable. */
export const DELTA_T_CLASSES = ['A', 'B', 'C', 'D', 'E', 'F', 'G'] as const;
/** One class of Regulatory Guide 1.23. */
export type DeltaTClass = (typeof DELTA_T_CLASSES)[number];

/** Names of the classes. Source: [RG1.23] table 1, from memory. */
export const DELTA_T_CLASS_NAMES: Readonly<Record<DeltaTClass, string>> = {
  A: 'extremely unstable',
  B: 'moderately unstable',
  C: 'slightly unstable',
  D: 'neutral',
  E: 'slightly stable',
  F: 'moderately stable',
  G: 'extremely stable',
};

/** Upper bound of classes A to F, °C/100 m, each belonging to its class. Source: [RG1.23] table 1, from memory. */
export const DELTA_T_CLASS_UPPER_BOUNDS_C_PER_100_M = [-1.9, -1.7, -1.5, -0.5, 1.5, 4] as const;

/** A gradient this close to a bound, °C/100 m, is on it: it covers only the rounding of ΔT/Δz. */
const ROUNDING = 1e-9;

/**
 * ΔT/Δz class of US NRC Regulatory Guide 1.23 Rev. 1.
 *
 * Units: +dT/dz in °C/100 m. Valid: any finite gradient; null for NaN. A bound belongs to the more unstable class.
 * Source: [RG1.23] table 1, from memory.
 */
export function deltaTClass(gradientCPer100M: number): DeltaTClass | null {
  if (Number.isNaN(gradientCPer100M)) return null;
  const index = DELTA_T_CLASS_UPPER_BOUNDS_C_PER_100_M.findIndex(
    (bound) => gradientCPer100M <= bound + ROUNDING,
  );
  return index < 0 ? 'G' : DELTA_T_CLASSES[index]!;
}

/** The class of a tower's declared pair, and which others its sensors cannot tell from it. */
export interface DeltaTFinding {
  readonly gradientCPer100M: number;
  readonly class: DeltaTClass;
  /** Every class within ±1.645 σ: A, B and C are only 0.2 °C/100 m wide. Null when σ is not known. */
  readonly possible: readonly DeltaTClass[] | null;
}

/**
 * ΔT/Δz class between the tower's declared pair of levels, with the classes the sensors cannot tell apart.
 *
 * Units: m, °C. Valid: upper above lower and both temperatures known; else null.
 * Source: [RG1.23] table 1, from memory; [GUM] for the spread.
 */
export function deltaTFinding(
  lower: { readonly heightM: number; readonly temperatureC: number | null },
  upper: { readonly heightM: number; readonly temperatureC: number | null },
  sigmaDifferenceC: number | null,
): DeltaTFinding | null {
  const separationM = upper.heightM - lower.heightM;
  if (!(separationM > 0) || lower.temperatureC === null || upper.temperatureC === null) return null;
  const gradientCPer100M = (100 * (upper.temperatureC - lower.temperatureC)) / separationM;
  const found = deltaTClass(gradientCPer100M);
  if (found === null) return null;
  if (sigmaDifferenceC === null) return { gradientCPer100M, class: found, possible: null };
  const reach = (164.5 * sigmaDifferenceC) / separationM;
  const lowest = DELTA_T_CLASSES.indexOf(deltaTClass(gradientCPer100M - reach)!);
  const highest = DELTA_T_CLASSES.indexOf(deltaTClass(gradientCPer100M + reach)!);
  return { gradientCPer100M, class: found, possible: DELTA_T_CLASSES.slice(lowest, highest + 1) };
}
