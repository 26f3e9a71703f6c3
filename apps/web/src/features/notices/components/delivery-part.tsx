import { Box, chakra } from '@chakra-ui/react';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import type { Channel, NoticeDetail } from '../../../lib/api/types';
import { count } from '../../../lib/format/number';
import { DELIVERY_STATES, deliveryWords } from '../delivery-words';
import { DeliveryList } from './delivery-list';

const Cell = chakra('td', { base: { py: '1', textAlign: 'end', fontWeight: '600', ps: '4' } });

/** Where the messages are: counts for each channel, and each message with its address masked. */
export function DeliveryPart({ notice, zone }: { notice: NoticeDetail; zone: string }) {
  return (
    <Card padded>
      <PartTitle mb="2">Delivery</PartTitle>
      <chakra.table width="100%" borderCollapse="collapse">
        <tbody>
          {(['sms', 'email'] as const).map((channel) => (
            <ChannelRows
              key={channel}
              channel={channel}
              counts={notice.delivery.filter((each) => each.channel === channel)}
            />
          ))}
        </tbody>
      </chakra.table>
      <Box mt="3" data-screen-only>
        <DeliveryList noticeId={notice.id} zone={zone} />
      </Box>
    </Card>
  );
}

const TITLES: Record<Channel, string> = { sms: 'Texts', email: 'Mail' };

function ChannelRows({ channel, counts }: { channel: Channel; counts: NoticeDetail['delivery'] }) {
  const shown = counts.toSorted(
    (a, b) => DELIVERY_STATES.indexOf(a.state) - DELIVERY_STATES.indexOf(b.state),
  );
  return (
    <>
      <tr>
        <chakra.th textAlign="start" pt="2" colSpan={2}>
          {TITLES[channel]}
        </chakra.th>
      </tr>
      {shown.length === 0 && (
        <tr>
          <chakra.td color="mute" colSpan={2}>
            nobody to send to
          </chakra.td>
        </tr>
      )}
      {shown.map(({ state, count: messages }) => (
        <chakra.tr key={state} borderTopWidth="1px" borderColor="line">
          <td>{deliveryWords(channel, state)}</td>
          <Cell>{count(messages)}</Cell>
        </chakra.tr>
      ))}
    </>
  );
}
