import { computeTask } from '../compute/compute-task';
import type { TowerLayout } from '../towers/tower-layout';
import { blockFacts, type KeptMean } from './block-facts';
import { findingsOf } from './findings';
import { profileRow } from './profile-row';

/** A block that is to become a profile. */
export interface BlockToProfile {
  readonly towerId: number;
  readonly tEnd: number;
  readonly means: readonly KeptMean[];
  readonly pm25Hour: number | undefined;
}

/** Blocks with the layouts of their towers. */
export interface BlocksToProfile {
  readonly towers: readonly TowerLayout[];
  readonly blocks: readonly BlockToProfile[];
}

/** What a block came to: its row, undefined where it holds no reading; or why it could not be worked out. */
export type MadeProfile =
  { readonly row: ReturnType<typeof profileRow> | undefined } | { readonly fault: string };

/** Makes profiles of blocks, in their order. A block that cannot be worked out does not hold up the others. */
export function makeProfiles({ towers, blocks }: BlocksToProfile): MadeProfile[] {
  const layouts = new Map(towers.map((tower) => [tower.id, tower]));
  return blocks.map((block) => makeProfile(layouts.get(block.towerId)!, block));
}

/** Making profiles, for the compute thread. */
export const makeProfilesTask = computeTask(__filename, makeProfiles);

function makeProfile(tower: TowerLayout, { tEnd, means, pm25Hour }: BlockToProfile): MadeProfile {
  try {
    const facts = blockFacts(tower, tEnd, means, pm25Hour);
    return { row: facts && profileRow(facts, findingsOf(facts, tower)) };
  } catch (error) {
    return { fault: error instanceof Error ? (error.stack ?? error.message) : String(error) };
  }
}
