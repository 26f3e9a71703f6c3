/** Up to this |x| (ln(p/p₀) over some 350 m of cold air) the series is exact to 1e-12. */
const SERIES_UP_TO = 0.06;

/**
 * e to the power of x: its series to the sixth power where x is small, as over a mast, else the library's.
 *
 * Units: none. Valid: any number, within 1e-12 of the exact value. Source: none (Taylor series).
 */
export const shortExp = (x: number): number =>
  x > -SERIES_UP_TO && x < SERIES_UP_TO
    ? 1 + x * (1 + x * (1 / 2 + x * (1 / 6 + x * (1 / 24 + x * (1 / 120 + x / 720)))))
    : Math.exp(x);
