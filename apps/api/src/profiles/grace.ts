const LEAST_GRACE_S = 120;

/** How long after a block's end late readings are waited for, s, before the block counts as closed. */
export const graceS = (intervalS: number): number => Math.max(LEAST_GRACE_S, intervalS / 2);
