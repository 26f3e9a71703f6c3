import { Box } from '@chakra-ui/react';
import { ChoiceEntry, EntryForm, EntryGrid, NumberEntry, TextEntry } from '../../../components/form';
import { Loaded } from '../../../components/states/loaded';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { PlainTable } from '../../../components/ui/plain-table';
import { dateAndTime } from '../../../lib/format/time';
import { useEntryForm } from '../../../lib/use-entry-form';
import { addSource, useSources } from '../api';

interface SourceEntries {
  kind: 'folder' | 'push';
  path: string;
  format: string;
  separator: string;
  timeColumn: string;
  missing: string;
  intervalSeconds: number;
}

const EMPTY: SourceEntries = {
  kind: 'folder',
  path: '',
  format: 'wide',
  separator: ',',
  timeColumn: 'time',
  missing: 'NaN',
  intervalSeconds: 60,
};

/** Where a tower's readings come from: files in the loggers' folder, or what its site pushes. */
export function SourcesPart({ towerId }: { towerId: number }) {
  const sources = useSources(towerId);
  const entries = useEntryForm({
    entries: EMPTY,
    perform: (typed: SourceEntries) => addSource(towerId, toSource(typed)),
    onDone: () => void sources.mutate(),
  });
  const kind = entries.form.watch('kind');
  return (
    <Card padded>
      <PartTitle mb="3">Sources</PartTitle>
      <Loaded from={sources} what="the sources">
        {(rows) => (
          <PlainTable
            caption="Sources"
            rows={rows}
            keyOf={({ id }) => id}
            columns={[
              { head: 'Kind', cell: (source) => source.kind },
              { head: 'Path', cell: ({ path }) => path ?? 'by key' },
              {
                head: 'Last looked at',
                cell: ({ lastAt }) => (lastAt ? dateAndTime(lastAt, 'UTC') : 'never'),
              },
              { head: 'What it gave', cell: ({ lastResult }) => lastResult ?? '–' },
            ]}
          />
        )}
      </Loaded>
      <Box mt="4">
        <EntryForm entries={entries} act="Add the source">
          <EntryGrid>
            <ChoiceEntry
              name="kind"
              label="Kind"
              choices={[
                { value: 'folder', label: 'files in the loggers’ folder' },
                { value: 'push', label: 'the site pushes with a key' },
              ]}
            />
            {kind === 'folder' && (
              <TextEntry name="path" label="File or folder" help="Beneath the loggers’ folder" required />
            )}
            <ChoiceEntry
              name="format"
              label="Layout"
              choices={[
                { value: 'wide', label: 'wide: a column per sensor' },
                { value: 'long', label: 'long: time, sensor, value' },
              ]}
            />
            <TextEntry name="separator" label="Separator" help="One character, or blank" required />
            <TextEntry name="timeColumn" label="Column with the time" required />
            <TextEntry name="missing" label="Written for no reading" help="Several: with blanks between" />
            {kind === 'folder' && <NumberEntry name="intervalSeconds" label="Look every, s" required />}
          </EntryGrid>
        </EntryForm>
      </Box>
    </Card>
  );
}

function toSource({ kind, path, missing, intervalSeconds, ...mapping }: SourceEntries) {
  return {
    kind,
    mapping: { ...mapping, missing: missing.split(/\s+/).filter(Boolean) },
    ...(kind === 'folder' && { path, intervalSeconds }),
  };
}
