const FIRST_S = 20;
const LONGEST_S = 30 * 60;
const SPREAD = 0.2;

/**
 * How long to wait after the n-th failed attempt, seconds: 20, 40, 80 … at most half an hour, spread by ±20 % so that
 * messages which failed together do not come back together.
 *
 * @param attempts how many attempts were made, from 1
 * @param chance a number in [0, 1)
 */
export function backoffS(attempts: number, chance: number): number {
  const plain = Math.min(FIRST_S * 2 ** (attempts - 1), LONGEST_S);
  return Math.round(plain * (1 - SPREAD + 2 * SPREAD * chance));
}
