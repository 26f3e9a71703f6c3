/** How deep groups may be nested; deeper no person reads with certainty. */
export const MOST_LEVELS = 6;

/** How many clauses one condition may have. */
export const MOST_CLAUSES = 40;

/** How many parts, clauses and groups together, one condition may have. */
export const MOST_PARTS = 100;

/** The longest a condition may be asked to hold: seven days, in minutes. */
export const LONGEST_HELD_MINUTES = 7 * 24 * 60;

/** The longest a notice may be valid without anyone extending it: seven days, in hours. */
export const LONGEST_VALIDITY_HOURS = 7 * 24;

/** The longest wait before proposing again: seven days, in minutes. */
export const LONGEST_REPROPOSAL_MINUTES = 7 * 24 * 60;
