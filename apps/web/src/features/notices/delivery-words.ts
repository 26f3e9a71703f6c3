import { counted } from '../../lib/format/number';
import type { Channel, DeliveryState, NoticeDetail } from '../../lib/api/types';

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

/** How far a notice's messages are, after it was issued or ended: a text is under way until its receipt is back. */
export function underWayWords(delivery: NoticeDetail['delivery']): string {
  const sum = (fits: (each: NoticeDetail['delivery'][number]) => boolean): number =>
    delivery.filter(fits).reduce((all, { count }) => all + count, 0);
  if (sum(() => true) === 0) return 'Nobody is subscribed to it, so nothing was sent.';
  const leaving = sum(({ state }) => state === 'queued' || state === 'sending');
  if (leaving > 0) return 'Mail and texts are on their way; below you see them go.';
  const awaited = sum(({ channel, state }) => channel === 'sms' && state === 'accepted');
  if (awaited > 0)
    return `Everything is sent; the receipts of ${counted(awaited, 'text')} are still to come.`;
  return 'Everything is sent; below you see what arrived.';
}
