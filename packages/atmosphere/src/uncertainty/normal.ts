const TAIL_STARTS_AT = 7.07106781186547;
const NOTHING_BEYOND = 37;
const NUMERATOR = [
  3.52624965998911e-2, 0.700383064443688, 6.37396220353165, 33.912866078383, 112.079291497871,
  221.213596169931, 220.206867912376,
];
const DENOMINATOR = [
  8.83883476483184e-2, 1.75566716318264, 16.064177579207, 86.7807322029461, 296.564248779674,
  637.333633378831, 793.826512519948, 440.413735824752,
];

const polynomial = (coefficients: readonly number[], x: number): number => {
  let sum = 0;
  for (const c of coefficients) sum = sum * x + c;
  return sum;
};

const tail = (x: number): number => {
  const fraction = x + 1 / (x + 2 / (x + 3 / (x + 4 / (x + 0.65))));
  return Math.exp((-x * x) / 2) / fraction / Math.sqrt(2 * Math.PI);
};

/**
 * Standard normal distribution function Φ(x) = P(X ≤ x).
 *
 * Units: none. Valid: any number, within about 1e-14; infinities give 0 or 1, NaN stays NaN.
 * Source: [West2005] after [Hart1968] algorithm 5666.
 */
export function normalProbabilityBelow(x: number): number {
  const distance = Math.abs(x);
  if (distance > NOTHING_BEYOND) return x > 0 ? 1 : 0;
  const upper =
    distance < TAIL_STARTS_AT
      ? (Math.exp((-x * x) / 2) * polynomial(NUMERATOR, distance)) / polynomial(DENOMINATOR, distance)
      : tail(distance);
  return x > 0 ? 1 - upper : upper;
}
