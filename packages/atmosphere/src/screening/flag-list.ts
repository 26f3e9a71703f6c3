import type { Flag } from './reading';

/** The flags of each reading of a series; most readings have none. */
export type FlagList = (Flag[] | undefined)[];

/**
 * Adds a flag to the reading at an index. Of two flags of one check and verdict the one that counts stays.
 *
 * Units: none. Valid: an index of the series. Source: none (definition).
 */
export function addFlag(list: FlagList, index: number, flag: Flag): void {
  const flags = (list[index] ??= []);
  const same = flags.findIndex((f) => f.check === flag.check && f.verdict === flag.verdict);
  if (same < 0) flags.push(flag);
  else if (flags[same]!.withdrawn !== undefined && flag.withdrawn === undefined) flags[same] = flag;
}
