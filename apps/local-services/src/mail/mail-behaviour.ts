/** How the mail server treats what it is offered. */
export type MailMode = 'ok' | 'refuse' | 'error' | 'slow' | 'drop';

/** The mail server's orders; changed by POST /control/mail. */
export interface MailBehaviour {
  mode: MailMode;
  /** Pause before a message is answered in mode `slow`, ms. */
  delayMs: number;
  /** How many more messages the mode holds for; then `ok`. Undefined: until told otherwise. */
  times?: number;
  /** SMTP reply code per recipient, e.g. `{ "gone@example.org": 550, "full@example.org": 452 }`. */
  recipients: Record<string, number>;
}

/** Fresh orders: everything is taken. */
export const takeEverything = (): MailBehaviour => ({ mode: 'ok', delayMs: 0, recipients: {} });

/** The mode for the next message; counts down `times`. */
export const nextMode = <M extends string>(behaviour: { mode: M | 'ok'; times?: number }): M | 'ok' => {
  const { mode } = behaviour;
  if (mode === 'ok' || behaviour.times === undefined) return mode;
  behaviour.times -= 1;
  if (behaviour.times <= 0) {
    behaviour.mode = 'ok';
    behaviour.times = undefined;
  }
  return mode;
};
