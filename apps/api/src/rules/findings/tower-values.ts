import {
  deltaTFinding,
  DELTA_T_CLASSES,
  exactly,
  fromMeasured,
  notKnown,
  type Quantity,
} from '@lidwatch/atmosphere';
import type { MeasuredValues } from '@lidwatch/rules';
import type { StoredLevel } from '../../profiles/block-facts';
import { quantityOf } from './measures-json';
import type { TowerBlock } from './tower-blocks';

/** Heights of the pair that Regulatory Guide 1.23 asks for; the levels nearest to them stand for it, m. */
const DELTA_T_PAIR_M = [10, 60] as const;

const TOP_REASON = 'it reaches the top of the tower';
const NO_LEVEL = 'the lowest level gave nothing';
const YES = exactly(1);
const NO = exactly(0);

/** Whether a block says anything of the layers: a profile needs two levels. */
export const speaks = (block: TowerBlock): boolean =>
  block.levels.filter(([, temperatureC]) => temperatureC !== null).length >= 2;

const bounds = ([lo, hi]: readonly [number | null, number | null], reason: string): Quantity =>
  quantityOf(lo, hi, lo === null && hi === null ? reason : TOP_REASON);

/** An inversion that is there and beyond what the sensors could mistake. */
function sureOf({ surface, sure }: TowerBlock, reason: string): Quantity {
  if (surface === 'absent') return NO;
  if (surface === 'not known' || sure === null) return notKnown(reason);
  return sure === 1 ? YES : NO;
}

/** No lid is strength 0 and no base. */
function lidOf({ lidStrength }: TowerBlock, reason: string): Quantity {
  const [lo, hi] = lidStrength;
  if (lo === null && hi === null) return notKnown(reason);
  return (lo ?? 0) > 0 || hi === null ? YES : NO;
}

const nearest = (levels: readonly StoredLevel[], heightM: number): StoredLevel | undefined =>
  [...levels].sort((a, b) => Math.abs(a[0] - heightM) - Math.abs(b[0] - heightM))[0];

function deltaTClassOf(levels: readonly StoredLevel[]): Quantity {
  const [lower, upper] = DELTA_T_PAIR_M.map((heightM) => nearest(levels, heightM));
  if (!lower || !upper) return notKnown('the tower has no levels');
  const [low, high] = [lower, upper].map(([heightM, temperatureC]) => ({ heightM, temperatureC }));
  const found = deltaTFinding(low!, high!, null);
  if (found === null) return notKnown('the pair of levels gave no difference');
  return exactly(DELTA_T_CLASSES.indexOf(found.class) + 1);
}

/** What one block of one tower says of every measure a tower can answer. */
export function towerValues(block: TowerBlock): MeasuredValues {
  const reason = block.reason ?? 'the tower could not tell';
  return {
    inversionStrengthC: bounds(block.strength, reason),
    strengthWithinTowerC: fromMeasured(block.withinC, reason),
    gradientCPer100m: fromMeasured(block.gradient, reason),
    depthM: bounds(block.depth, reason),
    inversionSure: sureOf(block, reason),
    stableDepthM: bounds(block.stable, reason),
    elevatedLid: lidOf(block, reason),
    elevatedLidBaseM: fromMeasured(block.lidBaseM, 'the tower shows no lid'),
    elevatedLidStrengthC: bounds(block.lidStrength, reason),
    deltaTClass: deltaTClassOf(block.levels),
    heatDeficitMJPerM2: bounds(block.heat, reason),
    surfaceTemperatureC: fromMeasured(block.levels[0]?.[1], NO_LEVEL),
    relativeHumidityPct: fromMeasured(block.other.relativeHumidityPct, 'no humidity was measured'),
    windSpeedMPerS: fromMeasured(block.other.windSpeedMPerS, 'no wind was measured'),
  };
}
