/** How the text service treats what it is asked for. */
export type TextMode = 'ok' | 'refuse' | 'error' | 'tooMany' | 'slow' | 'drop';

/** What becomes of texts to one number. */
export interface NumberOrder {
  /** Refused when asked for, with the provider's code, e.g. 21211 (not a number) or 21610 (opted out). */
  readonly refuseCode?: number;
  /** Taken, but ends so. */
  readonly end?: 'undelivered' | 'failed';
  /** The provider's code at that end, e.g. 30003 (unreachable). */
  readonly errorCode?: number;
}

/** The text service's orders; changed by POST /control/sms. */
export interface TextBehaviour {
  mode: TextMode;
  /** Pause before the answer in mode `slow`, ms. */
  delayMs: number;
  /** How many more requests the mode holds for; then `ok`. */
  times?: number;
  /** Orders per number (E.164). */
  numbers: Record<string, NumberOrder>;
  /** Share of the other texts that end as undelivered, 0 to 1. */
  undeliveredShare: number;
  /** Pause between two call-backs of one text, ms. */
  statusDelayMs: number;
}

/** How a text to this number ends. The share is taken by the number's digits: the same number always fares alike. */
export const endOf = (
  behaviour: TextBehaviour,
  to: string,
): { status: 'delivered' | 'undelivered' | 'failed'; errorCode: number | null } => {
  const order = behaviour.numbers[to];
  if (order?.end) return { status: order.end, errorCode: order.errorCode ?? 30003 };
  let mixed = 0;
  for (const digit of to) mixed = (Math.imul(mixed, 31) + digit.charCodeAt(0)) >>> 0;
  mixed = Math.imul(mixed ^ (mixed >>> 15), 2246822519) >>> 0;
  return mixed / 2 ** 32 < behaviour.undeliveredShare
    ? { status: 'undelivered', errorCode: 30005 }
    : { status: 'delivered', errorCode: null };
};
