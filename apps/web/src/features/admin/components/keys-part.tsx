import { Box } from '@chakra-ui/react';
import { useState } from 'react';
import { EntryForm, TextEntry } from '../../../components/form';
import { Loaded } from '../../../components/states/loaded';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { PlainTable } from '../../../components/ui/plain-table';
import { ShownOnce } from '../../../components/ui/shown-once';
import { dateAndTime } from '../../../lib/format/time';
import { useAct } from '../../../lib/use-act';
import { useEntryForm } from '../../../lib/use-entry-form';
import { makeKey, revokeKey, useKeys } from '../api';
import type { IngestKey } from '../types';
import { curlExample } from './curl-example';

interface KeysPartProps {
  towerId: number;
  /** The name of one of the tower's sensors, for the example. */
  sensor: string | undefined;
  mayMakeKeys: boolean;
}

/** The keys with which a site pushes readings. A new one is shown once, with a command to try it. */
export function KeysPart({ towerId, sensor, mayMakeKeys }: KeysPartProps) {
  const keys = useKeys(towerId);
  const [made, setMade] = useState<string>();
  const revoke = useAct(async (id: number) => {
    await revokeKey(id);
    await keys.mutate();
  });
  const entries = useEntryForm({
    entries: { name: '' },
    perform: ({ name }: { name: string }) => makeKey(towerId, name),
    onDone: async ({ key }, form) => {
      setMade(key);
      form.reset({ name: '' });
      await keys.mutate();
    },
  });
  const state = ({ id, name, revokedAt }: IngestKey) => {
    if (revokedAt) return `revoked ${dateAndTime(revokedAt, 'UTC')}`;
    if (!mayMakeKeys) return 'in use';
    return (
      <Button size="sm" onClick={() => void revoke.run(id)} aria-label={`Revoke ${name}`}>
        Revoke
      </Button>
    );
  };
  return (
    <Card padded>
      <PartTitle mb="3">Keys</PartTitle>
      {made && (
        <ShownOnce title="Keep this key now: it is not shown again" secret={made}>
          <p>To try it:</p>
          <Box as="pre" fontSize="sm" whiteSpace="pre-wrap" overflowWrap="anywhere" m="0">
            {curlExample(window.location.origin, made, sensor)}
          </Box>
        </ShownOnce>
      )}
      <Refusal problem={revoke.problem} />
      <Loaded from={keys} what="the keys">
        {(rows) => (
          <PlainTable
            caption="Keys"
            rows={rows}
            keyOf={({ id }) => id}
            columns={[
              { head: 'Key', cell: ({ name }) => <strong>{name}</strong> },
              { head: 'Made', cell: ({ createdAt }) => dateAndTime(createdAt, 'UTC') },
              {
                head: 'Last used',
                cell: ({ lastUsedAt }) => (lastUsedAt ? dateAndTime(lastUsedAt, 'UTC') : 'never'),
              },
              { head: 'State', cell: state },
            ]}
          />
        )}
      </Loaded>
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
