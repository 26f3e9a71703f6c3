import { Box } from '@chakra-ui/react';
import { useState } from 'react';
import { ChecksEntry, EntryForm } from '../../../components/form';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Card } from '../../../components/ui/card';
import { Muted, PartTitle } from '../../../components/ui/heading';
import { Message } from '../../../components/ui/message';
import { useEntryForm } from '../../../lib/use-entry-form';
import { setNeighbours, useNeighbours, useTowers } from '../api';
import type { Neighbours, Tower } from '../types';

/** The towers whose readings speak for and against this one's. */
export function NeighboursPart({ tower }: { tower: Tower }) {
  const neighbours = useNeighbours(tower.id);
  const towers = useTowers();
  const [saved, setSaved] = useState(false);
  return (
    <Card padded>
      <PartTitle mb="2">Neighbouring towers</PartTitle>
      <Muted display="block" mb="3">
        When this tower’s readings are screened, a fast change or an unusual difference is let pass if a
        neighbour goes the same way. How far a reading may be from theirs is set with its limits, on the
        readings page.
      </Muted>
      <Loaded from={neighbours} what="the neighbouring towers">
        {(set) => (
          <Loaded from={towers} what="the towers">
            {(all) => (
              <NeighboursForm
                key={set.towerIds.join()}
                towerId={tower.id}
                set={set}
                others={all.filter(
                  ({ id, retired }) => id !== tower.id && (!retired || set.towerIds.includes(id)),
                )}
                onSaved={() => {
                  setSaved(true);
                  void neighbours.mutate();
                }}
              />
            )}
          </Loaded>
        )}
      </Loaded>
      {saved && (
        <Box mt="3">
          <Message>
            Set. The whole record is screened anew; the readings page says what that changes in the findings.
          </Message>
        </Box>
      )}
    </Card>
  );
}

interface NeighboursFormProps {
  towerId: number;
  set: Neighbours;
  others: readonly Tower[];
  onSaved: () => void;
}

function NeighboursForm({ towerId, set, others, onSaved }: NeighboursFormProps) {
  const entries = useEntryForm<Neighbours, Neighbours>({
    entries: { towerIds: set.towerIds },
    perform: (typed) => setNeighbours(towerId, typed),
    onDone: onSaved,
  });
  if (others.length === 0) return <Empty title="No other tower yet" />;
  return (
    <EntryForm entries={entries} act="Set the neighbours">
      <ChecksEntry
        name="towerIds"
        label="Look at the readings of"
        choices={others.map(({ id, name, elevationM }) => ({
          value: id,
          label: `${name} (${elevationM} m)`,
        }))}
      />
    </EntryForm>
  );
}
