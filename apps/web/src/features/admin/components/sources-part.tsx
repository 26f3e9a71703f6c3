import { Box } from '@chakra-ui/react';
import { useState } from 'react';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { useMe } from '../../../lib/api/use-me';
import { useTowerZone } from '../../../lib/use-tower-zone';
import { useSources } from '../api';
import { SourceForm } from './source-form';
import { SourceRow } from './source-row';

/** Where a tower's readings come from: files in the loggers' folder or at an address, or what its site pushes. */
export function SourcesPart({ towerId }: { towerId: number }) {
  const sources = useSources(towerId);
  const zone = useTowerZone(towerId) ?? 'UTC';
  const mayUseHttp = useMe().me?.role === 'administrator';
  const [adding, setAdding] = useState(false);
  const renew = () => void sources.mutate();
  return (
    <Card padded>
      <PartTitle mb="3">Sources</PartTitle>
      <Loaded from={sources} what="the sources">
        {(rows) =>
          rows.length === 0 ? (
            <Empty title="No source yet">
              Add the folder its logger writes into, the address of its file, or let its site push.
            </Empty>
          ) : (
            <Box as="ul" listStyleType="none" m="0" p="0">
              {rows.map((source) => (
                <SourceRow
                  key={source.id}
                  source={source}
                  zone={zone}
                  mayUseHttp={mayUseHttp}
                  onChanged={renew}
                />
              ))}
            </Box>
          )
        }
      </Loaded>
      <Box mt="4" pt="4" borderTopWidth="1px" borderColor="line">
        {adding ? (
          <SourceForm
            towerId={towerId}
            mayUseHttp={mayUseHttp}
            onDone={() => {
              renew();
              setAdding(false);
            }}
            onCancel={() => setAdding(false)}
          />
        ) : (
          <Button onClick={() => setAdding(true)}>Add a source</Button>
        )}
      </Box>
    </Card>
  );
}
