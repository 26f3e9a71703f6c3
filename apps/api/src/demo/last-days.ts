/**
 * What is left undone at the first start, so that everybody finds something waiting: from two and a half days before
 * now, one district's ban proposal is left to its officer, and another's stays open at the desk.
 */
export interface LastDays {
  /** From this instant on nobody decides on what is listed here, UTC epoch seconds. */
  readonly from: number;
  /** The first start, UTC epoch seconds. */
  readonly now: number;
}

const LEFT_S = 60 * 3600;

/** Address part of the district whose proposal waits confirmed for its officer, and of the one whose stays open. */
export const LEFT_TO_THE_OFFICER = 'northgate';
export const LEFT_OPEN = 'quarry-bench';

/** The last days before a first start. */
export function lastDays(now: number): LastDays {
  return { from: now - LEFT_S, now };
}

/** How long before the first start the desk declines for now, so that what is open was proposed lately, s. */
export const HELD_BEFORE_S = 4 * 3600;

/** How long before the first start the proposal for the officer was confirmed, s. */
export const CONFIRMED_BEFORE_S = 40 * 60;
