const J_PER_MJ = 1e6;

/**
 * Heat per area from joule to megajoule.
 *
 * Units: J/m² in, MJ/m² out. Valid: any number; NaN stays NaN. Source: [NISTSP811] SI prefixes.
 */
export const mjPerM2FromJPerM2 = (heatJPerM2: number): number => heatJPerM2 / J_PER_MJ;

/**
 * Heat per area from megajoule to joule.
 *
 * Units: MJ/m² in, J/m² out. Valid: any number; NaN stays NaN. Source: [NISTSP811] SI prefixes.
 */
export const jPerM2FromMjPerM2 = (heatMjPerM2: number): number => heatMjPerM2 * J_PER_MJ;
