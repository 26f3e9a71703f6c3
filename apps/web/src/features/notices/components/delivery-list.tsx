import { Box, Flex, Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Field } from '../../../components/ui/field';
import { Select } from '../../../components/ui/input';
import { Pager } from '../../../components/ui/pager';
import type { Delivery } from '../../../lib/api/types';
import { counted } from '../../../lib/format/number';
import { dayAndTime } from '../../../lib/format/time';
import { useDeliveries } from '../api';
import { CHANNEL_NAME, DELIVERY_STATES, deliveryWords } from '../delivery-words';

/** Every message of a notice, addresses masked, narrowed by channel and state. */
export function DeliveryList({ noticeId, zone }: { noticeId: number; zone: string }) {
  const [channel, setChannel] = useState('');
  const [state, setState] = useState('');
  const [page, setPage] = useState(1);
  const deliveries = useDeliveries(noticeId, { channel, state, page });
  const narrow = (set: (value: string) => void) => (event: { target: { value: string } }) => {
    set(event.target.value);
    setPage(1);
  };
  return (
    <Stack gap="3">
      <Flex gap="3">
        <Field label="Channel">
          <Select value={channel} onChange={narrow(setChannel)}>
            <option value="">both</option>
            <option value="sms">texts</option>
            <option value="email">mail</option>
          </Select>
        </Field>
        <Field label="State">
          <Select value={state} onChange={narrow(setState)}>
            <option value="">any</option>
            {DELIVERY_STATES.map((each) => (
              <option key={each}>{each}</option>
            ))}
          </Select>
        </Field>
      </Flex>
      <Loaded from={deliveries} what="the messages">
        {({ items, total, pageSize }) =>
          items.length === 0 ? (
            <Empty title="No message" />
          ) : (
            <>
              <Box as="ul" listStyleType="none" m="0" p="0">
                {items.map((delivery) => (
                  <DeliveryLine key={delivery.id} delivery={delivery} zone={zone} />
                ))}
              </Box>
              <Pager page={page} pageSize={pageSize} total={total} what="message" onPage={setPage} />
            </>
          )
        }
      </Loaded>
    </Stack>
  );
}

function DeliveryLine({
  delivery: { channel, to, state, attempts, lastAt, detail },
  zone,
}: {
  delivery: Delivery;
  zone: string;
}) {
  return (
    <Box as="li" py="1.5" borderTopWidth="1px" borderColor="line">
      <Flex justify="space-between" gap="3" wrap="wrap">
        <span>
          {CHANNEL_NAME[channel]} to {to}
        </span>
        <Box color={state === 'failed' ? 'ban' : 'ink'} fontWeight="600">
          {deliveryWords(channel, state)}
        </Box>
      </Flex>
      <Box color="mute" fontSize="sm">
        {counted(attempts, 'attempt')}
        {lastAt && `, last ${dayAndTime(lastAt, zone)}`}
        {detail && ` · ${detail}`}
      </Box>
    </Box>
  );
}
