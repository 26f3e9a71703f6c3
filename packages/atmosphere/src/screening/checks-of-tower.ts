import { checkClock, type WrongClock } from './clock';
import type { FlagList } from './flag-list';
import { checkInternal } from './internal';
import { checkNeighbours } from './neighbours';
import { WORD, type Words } from './overrides';
import { checkPersistence, checkStuck } from './persistence';
import { checkRange } from './range';
import type { Series } from './series';
import { checkSpike } from './spike';
import { checkStep } from './step';
import { checkVertical, pairsOf, type SunElevationDeg } from './vertical';

/** What the checks of a tower are given besides its series. */
export interface ChecksInput {
  readonly wrongClocks?: readonly WrongClock[];
  readonly sunElevationDeg?: SunElevationDeg;
}

/** From here on these readings are no evidence, except where a person says that they are valid. */
function discount(series: Series, found: readonly number[], words: Words | null): void {
  for (const at of found) if (words?.[at] !== WORD.valid) series.evidence[at] = 0;
}

/**
 * Makes every check of a tower in their order and gives the flags of each series, in the order of the tower. A spike,
 * and then what is stuck, is no evidence for the checks that follow: a broken level must not make its neighbours
 * suspect.
 *
 * Units: those of the sensors. Valid: series ascending by height; `words` of each, in the same order; the evidence of
 * the series is used up. Source: [EPA454] §8.6.
 */
export function checksOfTower(
  tower: readonly Series[],
  nearby: readonly (readonly Series[])[],
  words: readonly (Words | null)[],
  input: ChecksInput,
): FlagList[] {
  const flags = new Map<Series, FlagList>(tower.map((series) => [series, []]));
  const flagsOf = (series: Series): FlagList => flags.get(series)!;
  const kin = (series: Series, among: readonly Series[]) =>
    among.filter((other) => other !== series && other.quantity === series.quantity);
  const allOf = (series: Series) => [...kin(series, tower), ...kin(series, nearby.flat())];

  for (const series of tower) {
    checkClock(series, input.wrongClocks ?? [], flagsOf(series));
    checkRange(series, flagsOf(series));
  }
  const spikes = tower.map((series) => checkSpike(series, allOf(series), flagsOf(series)));
  tower.forEach((series, k) => discount(series, spikes[k]!, words[k]!));
  const stuck = tower.map((series) => {
    checkStep(series, allOf(series), flagsOf(series));
    const found = checkStuck(series, kin(series, tower), flagsOf(series));
    checkPersistence(series, allOf(series), flagsOf(series));
    return found;
  });
  tower.forEach((series, k) => discount(series, stuck[k]!, words[k]!));
  for (const series of tower) {
    checkInternal(series, tower, flagsOf(series));
    checkNeighbours(series, kin(series, nearby.flat()), flagsOf(series));
  }
  const pairs = pairsOf(tower);
  const pairsNearby = nearby.flatMap(pairsOf);
  for (const pair of pairs) {
    const others = [...pairs.filter((p) => p !== pair), ...pairsNearby];
    checkVertical(pair, others, input.sunElevationDeg, flagsOf);
  }
  return tower.map(flagsOf);
}
