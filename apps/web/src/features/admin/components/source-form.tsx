import { Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { ChoiceEntry, EntryForm, EntryGrid, TextEntry } from '../../../components/form';
import { Button } from '../../../components/ui/button';
import { useEntryForm } from '../../../lib/use-entry-form';
import { addSource, changeSource } from '../api';
import type { Source } from '../types';
import { CredentialEntries } from './credential-entries';
import { intervalChoices } from './interval-choices';
import { KnownLayout } from './known-layout';
import { LayoutEntries } from './layout-entries';
import { entriesOf, layoutEntriesOf, toSource, type SourceEntries } from './source-entries';

interface SourceFormProps {
  towerId: number;
  /** The source to change; a new one without. */
  source?: Source;
  /** Sources over HTTP are the administrator's alone. */
  mayUseHttp: boolean;
  onDone: () => void;
  onCancel: () => void;
}

const KINDS = [
  { value: 'folder', label: 'files in the loggers’ folder' },
  { value: 'http', label: 'a file at an address (HTTP)' },
  { value: 'push', label: 'the site pushes with a key' },
];

/** Adds or changes a source: where the readings come from, how often, and how they are laid out. */
export function SourceForm({ towerId, source, mayUseHttp, onDone, onCancel }: SourceFormProps) {
  const [layout, setLayout] = useState(source?.mapping);
  const entries = useEntryForm<SourceEntries, Source>({
    entries: entriesOf(source),
    perform: (typed) => {
      const sent = toSource(typed, source, layout);
      return source ? changeSource(source.id, sent) : addSource(towerId, sent);
    },
    onDone,
  });
  const takeLayout = (known: Source['mapping']) => {
    setLayout(known);
    entries.form.reset(
      { ...entries.form.getValues(), ...layoutEntriesOf(known) },
      { keepDefaultValues: true },
    );
  };
  const kind = entries.form.watch('kind');
  const intervalS = Number(entries.form.watch('intervalSeconds'));
  const kinds = mayUseHttp ? KINDS : KINDS.filter(({ value }) => value !== 'http');
  return (
    <Stack gap="2">
      <EntryForm entries={entries} act={source ? 'Keep the change' : 'Add the source'}>
        {!source && <ChoiceEntry name="kind" label="How do the readings come?" choices={kinds} />}
        {kind === 'http' && <CredentialEntries source={source} />}
        <EntryGrid>
          {kind === 'folder' && (
            <TextEntry name="path" label="File or folder" help="Beneath the loggers’ folder" required />
          )}
          {kind !== 'push' && (
            <ChoiceEntry name="intervalSeconds" label="Look" choices={intervalChoices(kind, intervalS)} />
          )}
        </EntryGrid>
        <KnownLayout towerId={towerId} onTake={takeLayout} />
        <LayoutEntries severalTimeColumns={layout?.timeColumns !== undefined} />
        {source && (
          <p>
            With a change the files are read anew from their beginnings. Readings that are known already stay
            as they are.
          </p>
        )}
      </EntryForm>
      <Button kind="quiet" onClick={onCancel} alignSelf="flex-start">
        {source ? 'Leave it as it is' : 'Add none'}
      </Button>
    </Stack>
  );
}
