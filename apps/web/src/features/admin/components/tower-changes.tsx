import { Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { Pager } from '../../../components/ui/pager';
import { PlainTable } from '../../../components/ui/plain-table';
import { dateAndTime } from '../../../lib/format/time';
import { useTowerChanges } from '../api';

/** What was ever changed about a tower, the newest first. */
export function TowerChanges({ towerId, zone }: { towerId: number; zone: string }) {
  const [page, setPage] = useState(1);
  const changes = useTowerChanges(towerId, page);
  return (
    <Card padded>
      <PartTitle mb="3">What was changed</PartTitle>
      <Loaded from={changes} what="what was changed">
        {({ items, total, pageSize }) =>
          total === 0 ? (
            <Empty title="Nothing yet" />
          ) : (
            <Stack gap="3">
              <PlainTable
                caption="What was changed"
                rows={items}
                keyOf={({ id }) => id}
                columns={[
                  { head: 'When', cell: ({ at }) => dateAndTime(at, zone) },
                  { head: 'Who', cell: ({ by }) => by },
                  { head: 'What', cell: ({ act, what }) => (what ? `${act}: ${what}` : act) },
                ]}
              />
              <Pager {...{ page, pageSize, total }} what="change" onPage={setPage} />
            </Stack>
          )
        }
      </Loaded>
    </Card>
  );
}
