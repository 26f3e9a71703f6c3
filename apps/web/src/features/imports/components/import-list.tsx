import { Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { paths } from '../../../app/paths';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Pager } from '../../../components/ui/pager';
import { PlainTable } from '../../../components/ui/plain-table';
import { TextLink } from '../../../components/ui/text-link';
import { AgoText } from '../../../components/ui/time-text';
import { count } from '../../../lib/format/number';
import { useImports } from '../api';
import { ORIGIN_WORDS, STATE_WORDS } from '../words';

/** What came in, the newest first. */
export function ImportList({ zone }: { zone: string }) {
  const [page, setPage] = useState(1);
  const imports = useImports(page);
  return (
    <Loaded from={imports} what="the imports">
      {({ items, total, pageSize }) =>
        total === 0 ? (
          <Empty title="Nothing has come in yet">
            Import a file, or set up a source for a tower under Administration.
          </Empty>
        ) : (
          <Stack gap="3">
            <PlainTable
              caption="Imports"
              rows={items}
              keyOf={({ id }) => id}
              columns={[
                { head: 'When', cell: ({ receivedAt }) => <AgoText at={receivedAt} zone={zone} /> },
                { head: 'Tower', cell: ({ towerName }) => towerName },
                {
                  head: 'What',
                  cell: ({ id, name, origin }) => (
                    <TextLink to={paths.importResult(id)}>
                      {name} ({ORIGIN_WORDS[origin]})
                    </TextLink>
                  ),
                },
                { head: 'State', cell: ({ state }) => STATE_WORDS[state] },
                { head: 'New', cell: (row) => count(row.new), numeric: true },
                { head: 'Known', cell: ({ repeated }) => count(repeated), numeric: true },
                { head: 'Corrected', cell: ({ corrected }) => count(corrected), numeric: true },
                { head: 'Refused', cell: ({ refused }) => count(refused), numeric: true },
              ]}
            />
            <Pager {...{ page, pageSize, total }} what="import" onPage={setPage} />
          </Stack>
        )
      }
    </Loaded>
  );
}
