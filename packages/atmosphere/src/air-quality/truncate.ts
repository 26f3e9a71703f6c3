/** Covers only the rounding of a decimal number in binary: 9.1 is not 9.0999…. */
const ROUNDING = 1e-9;

/**
 * A concentration cut off to one decimal, as the index and the NowCast require.
 *
 * Units: µg/m³ in and out. Valid: any finite number, towards minus infinity; NaN stays NaN.
 * Source: [40CFR58G] section II (truncation to 0.1 µg/m³).
 */
export const truncatedToTenth = (concentrationUgM3: number): number =>
  Math.floor(concentrationUgM3 * 10 + ROUNDING) / 10;
