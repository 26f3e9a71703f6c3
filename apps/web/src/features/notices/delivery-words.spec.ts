import type { NoticeDetail } from '../../lib/api/types';
import { underWayWords } from './delivery-words';

type Delivery = NoticeDetail['delivery'];

it.each<[string, Delivery, RegExp]>([
  ['nobody to send to', [], /Nobody is subscribed/],
  [
    'messages that wait',
    [
      { channel: 'email', state: 'queued', count: 2 },
      { channel: 'sms', state: 'delivered', count: 1 },
    ],
    /on their way/,
  ],
  [
    'texts without a receipt',
    [
      { channel: 'email', state: 'accepted', count: 2 },
      { channel: 'sms', state: 'accepted', count: 3 },
    ],
    /receipts of 3 texts/,
  ],
  [
    'all settled',
    [
      { channel: 'email', state: 'accepted', count: 2 },
      { channel: 'sms', state: 'failed', count: 3 },
    ],
    /Everything is sent; below/,
  ],
])('of a notice with %s it says so', (_, delivery, words) => {
  expect(underWayWords(delivery)).toMatch(words);
});
