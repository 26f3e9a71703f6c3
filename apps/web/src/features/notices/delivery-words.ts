import type { Channel, DeliveryState } from '../../lib/api/types';

/** The channels in words. */
export const CHANNEL_NAME: Record<Channel, string> = { email: 'Mail', sms: 'Text' };

/** The states in the order of a message's life. */
export const DELIVERY_STATES: readonly DeliveryState[] = [
  'queued',
  'sending',
  'accepted',
  'delivered',
  'failed',
  'suppressed',
  'expired',
];

const WORDS: Record<DeliveryState, string> = {
  queued: 'waiting to be sent',
  sending: 'being sent',
  accepted: 'accepted',
  delivered: 'delivered',
  failed: 'failed',
  suppressed: 'not sent: the person left or the address is bad',
  expired: 'not sent: the notice was over before it could be',
};

/**
 * What is known of a message, honestly: a mail server's yes is not a letter read, and only the carrier's own receipt
 * makes a text delivered.
 */
export function deliveryWords(channel: Channel, state: DeliveryState): string {
  if (state === 'accepted')
    return channel === 'email' ? 'accepted by the mail server' : 'accepted by the carrier';
  if (state === 'delivered' && channel === 'sms') return 'delivered, by the carrier’s receipt';
  return WORDS[state];
}
