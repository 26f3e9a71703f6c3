import { floorToBench, notKnown, type Quantity } from '@lidwatch/atmosphere';
import { blockAt } from './answering';
import type { DistrictPlan } from './district-plan';
import type { TowerBlocks } from './tower-blocks';

/** How much warmer the bench tower is than the valley-floor tower, at the lowest height both measure. */
export function floorToBenchC(
  { floor, bench, blockS }: DistrictPlan,
  blocks: TowerBlocks,
  t: number,
): Quantity {
  if (!floor || !bench) return notKnown('the district names no floor and bench tower');
  const below = blockAt(floor, blocks, t, blockS);
  const above = blockAt(bench, blocks, t, blockS);
  if (!below) return notKnown('the floor tower gave nothing');
  if (!above) return notKnown('the bench tower gave nothing');
  const pair = below.levels.flatMap((low) => {
    const high = above.levels.find(([heightM]) => heightM === low[0]);
    return high ? [{ low, high }] : [];
  })[0];
  if (!pair) return notKnown('floor and bench tower measure at no common height');
  const { low, high } = pair;
  const found = floorToBench(
    {
      elevationM: floor.elevationM,
      heightM: low[0],
      temperatureC: low[1],
      sigmaC: low[2],
      pressureHPa: below.pressureHPa,
    },
    { elevationM: bench.elevationM, heightM: high[0], temperatureC: high[1], sigmaC: high[2] },
  );
  return found.differenceC;
}
