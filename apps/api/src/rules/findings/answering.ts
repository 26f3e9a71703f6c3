import {
  combineTowers,
  isFresh,
  isKnown,
  notKnown,
  type Combination,
  type Quantity,
} from '@lidwatch/atmosphere';
import { MEASURES, type MeasuredValues, type MeasureName } from '@lidwatch/rules';
import type { DistrictPlan, PlanTower } from './district-plan';
import type { TowerBlock, TowerBlocks } from './tower-blocks';
import { speaks, towerValues } from './tower-values';

/** What the towers asked say together at one block end. */
export interface Answer {
  /** Names the towers that share this series: when it changes, held-for starts anew. Null when none is fresh. */
  readonly spoke: string | null;
  /** The first fresh tower, for showing. */
  readonly speaker: PlanTower | null;
  readonly values: MeasuredValues;
}

/** The measures of the air's layers, which several towers answer together; the rest is the first fresh tower's. */
const SHARED: readonly MeasureName[] = [
  'inversionStrengthC',
  'strengthWithinTowerC',
  'gradientCPer100m',
  'depthM',
  'inversionSure',
  'stableDepthM',
  'elevatedLid',
  'elevatedLidStrengthC',
];

const COMBINATIONS: Readonly<Record<DistrictPlan['combine'], Combination>> = {
  'first-fresh': 'first that is fresh',
  any: 'any',
  all: 'all',
  median: 'median',
};

const NOTHING = notKnown('the tower gave nothing for this block');

/** The block of a tower that stands for the district's block ending at t. */
export function blockAt(
  tower: PlanTower,
  blocks: TowerBlocks,
  t: number,
  blockS: number,
): TowerBlock | undefined {
  return blocks.newest(tower.id, t - Math.max(blockS, tower.blockS), t);
}

/** End of the newest block of a tower by t that says anything of the layers; null when there is none within reach. */
export const newestValidEnd = (tower: PlanTower, blocks: TowerBlocks, t: number): number | null =>
  blocks.newest(tower.id, -Infinity, t, speaks)?.tEnd ?? null;

/** A yes or no whose bounds leave both open is not known; those that leave one are it. */
function asYesOrNo({ lo, hi, reason }: Quantity): Quantity {
  const [low, high] = [Math.max(lo, 0), Math.min(hi, 1)];
  return low === high ? { lo: low, hi: high } : notKnown(reason ?? 'a tower could not tell');
}

/**
 * What a district's towers say together at one block end. *First fresh* keeps asking the first tower that spoke lately,
 * so that a block it missed is not known rather than another tower's; the others combine the towers, and each that is
 * silent widens the answer.
 */
export function answerOf(
  plan: DistrictPlan,
  asked: readonly PlanTower[],
  blocks: TowerBlocks,
  t: number,
): Answer {
  const said = asked.map((tower) => {
    const newestBlockEnd = newestValidEnd(tower, blocks, t);
    const fresh = isFresh(newestBlockEnd, tower.intervalS, t, tower.staleLimitS);
    const block = fresh ? blockAt(tower, blocks, t, plan.blockS) : undefined;
    return { tower, newestBlockEnd, fresh, values: block ? towerValues(block) : {} };
  });
  const first = said.find(({ fresh }) => fresh);
  if (!first) return { spoke: null, speaker: null, values: {} };
  const { tower: speaker, values } = first;
  if (plan.combine === 'first-fresh') return { spoke: String(speaker.id), speaker, values };
  const shared = SHARED.map((name): [MeasureName, Quantity] => {
    const answers = said.map(({ tower, newestBlockEnd, values: own }) => ({
      ...{ towerId: tower.name, newestBlockEnd, intervalS: tower.intervalS },
      value: own[name] ?? NOTHING,
    }));
    const { value } = combineTowers(answers, COMBINATIONS[plan.combine], t, speaker.staleLimitS);
    return [name, MEASURES[name].kind === 'yes-no' && !isKnown(value) ? asYesOrNo(value) : value];
  });
  const together = said.flatMap(({ tower, fresh }) => (fresh ? [tower.id] : [])).sort((a, b) => a - b);
  return {
    ...{ speaker, spoke: `${plan.combine}:${together.join(',')}` },
    values: { ...values, ...Object.fromEntries(shared) },
  };
}
