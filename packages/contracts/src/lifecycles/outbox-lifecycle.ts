import type { Lifecycle } from './lifecycle';

/**
 * Where one message to one address stands. `accepted`: the carrier took it; `delivered` only by a signed call-back;
 * `suppressed`: the person left before it went; `expired`: its notice was over before it went.
 */
export type OutboxState =
  'queued' | 'sending' | 'accepted' | 'delivered' | 'failed' | 'suppressed' | 'expired';

/** What happens to a message. */
export type OutboxAct = 'take' | 'accept' | 'retry' | 'deliver' | 'fail' | 'suppress' | 'expire';

/** A message's lifecycle. */
export const outboxLifecycle = {
  first: 'queued',
  transitions: [
    { from: 'queued', act: 'take', to: 'sending' },
    { from: 'queued', act: 'suppress', to: 'suppressed' },
    { from: 'queued', act: 'expire', to: 'expired' },
    { from: 'sending', act: 'accept', to: 'accepted' },
    { from: 'sending', act: 'retry', to: 'queued' },
    { from: 'sending', act: 'fail', to: 'failed' },
    { from: 'sending', act: 'deliver', to: 'delivered' },
    { from: 'sending', act: 'suppress', to: 'suppressed' },
    { from: 'sending', act: 'expire', to: 'expired' },
    { from: 'accepted', act: 'deliver', to: 'delivered' },
    { from: 'accepted', act: 'fail', to: 'failed' },
  ],
} as const satisfies Lifecycle<OutboxState, OutboxAct>;
