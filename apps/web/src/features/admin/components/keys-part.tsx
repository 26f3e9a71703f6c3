import { Box } from '@chakra-ui/react';
import { useState } from 'react';
import { EntryForm, TextEntry } from '../../../components/form';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { PlainTable } from '../../../components/ui/plain-table';
import { ShownOnce } from '../../../components/ui/shown-once';
import { AgoText } from '../../../components/ui/time-text';
import { dateAndTime } from '../../../lib/format/time';
import { useEntryForm } from '../../../lib/use-entry-form';
import { useTowerZone } from '../../../lib/use-tower-zone';
import { makeKey, useKeys } from '../api';
import type { IngestKey } from '../types';
import { PushExamples } from './push-examples';
import { RevokeKeyDialog } from './revoke-key-dialog';

interface KeysPartProps {
  towerId: number;
  /** The name of one of the tower's sensors, for the example. */
  sensor: string | undefined;
  mayMakeKeys: boolean;
}

/** The keys with which a site pushes readings. A new one is shown once, with commands to try it. */
export function KeysPart({ towerId, sensor, mayMakeKeys }: KeysPartProps) {
  const keys = useKeys(towerId);
  const zone = useTowerZone(towerId) ?? 'UTC';
  const [made, setMade] = useState<string>();
  const [revoking, setRevoking] = useState<IngestKey>();
  const entries = useEntryForm({
    entries: { name: '' },
    perform: ({ name }: { name: string }) => makeKey(towerId, name),
    onDone: async ({ key }, form) => {
      setMade(key);
      form.reset({ name: '' });
      await keys.mutate();
    },
  });
  const state = (key: IngestKey) => {
    if (key.revokedAt) return `revoked ${dateAndTime(key.revokedAt, zone)}`;
    if (!mayMakeKeys) return 'in use';
    return (
      <Button size="sm" onClick={() => setRevoking(key)} aria-label={`Revoke ${key.name}`}>
        Revoke
      </Button>
    );
  };
  return (
    <Card padded>
      <PartTitle mb="3">Keys</PartTitle>
      {made && (
        <ShownOnce title="Keep this key now: it is not shown again" secret={made}>
          <Box mt="3">
            <PushExamples apiKey={made} sensor={sensor} />
          </Box>
        </ShownOnce>
      )}
      <Loaded from={keys} what="the keys">
        {(rows) =>
          rows.length === 0 ? (
            <Empty title="No key yet">A key is needed where the site sends its readings itself.</Empty>
          ) : (
            <PlainTable
              caption="Keys"
              rows={rows}
              keyOf={({ id }) => id}
              columns={[
                { head: 'Key', cell: ({ name }) => <strong>{name}</strong> },
                { head: 'Made', cell: ({ createdAt }) => dateAndTime(createdAt, zone) },
                {
                  head: 'Last used',
                  cell: ({ lastUsedAt }) => (lastUsedAt ? <AgoText at={lastUsedAt} zone={zone} /> : 'never'),
                },
                { head: 'State', cell: state },
              ]}
            />
          )
        }
      </Loaded>
      {revoking && (
        <RevokeKeyDialog
          ingestKey={revoking}
          onClose={() => setRevoking(undefined)}
          onRevoked={() => keys.mutate()}
        />
      )}
      {!made && (
        <Box as="details" mt="4">
          <Box as="summary" cursor="pointer" fontWeight="600">
            How a site pushes
          </Box>
          <Box mt="2">
            <PushExamples apiKey="YOUR-KEY" sensor={sensor} />
          </Box>
        </Box>
      )}
      {mayMakeKeys && (
        <Box mt="4">
          <EntryForm entries={entries} act="Make a key">
            <TextEntry name="name" label="What is the key for?" help="Such as “mast logger”" required />
          </EntryForm>
        </Box>
      )}
    </Card>
  );
}
