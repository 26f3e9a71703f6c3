import { Box, Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { Loaded } from '../../../components/states/loaded';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { Pager } from '../../../components/ui/pager';
import { PlainTable } from '../../../components/ui/plain-table';
import { useRefused } from '../api';

/** An import's refused rows with their reasons and the lines as they came. */
export function RefusedPart({ importId }: { importId: number }) {
  const [page, setPage] = useState(1);
  const refused = useRefused(importId, page);
  return (
    <Card padded>
      <PartTitle mb="2">Refused rows</PartTitle>
      <Loaded from={refused} what="the refused rows">
        {({ items, total, pageSize }) => (
          <Stack gap="3">
            <PlainTable
              caption="Refused rows"
              rows={items}
              keyOf={({ row, column, code }) => `${row} ${column} ${code}`}
              columns={[
                { head: 'Why, and the cure', cell: ({ text }) => text },
                {
                  head: 'The line as it came',
                  cell: ({ raw }) => (
                    <Box as="span" fontFamily="mono" fontSize="sm">
                      {raw}
                    </Box>
                  ),
                },
              ]}
            />
            <Pager {...{ page, pageSize, total }} what="refused row" onPage={setPage} />
          </Stack>
        )}
      </Loaded>
    </Card>
  );
}
