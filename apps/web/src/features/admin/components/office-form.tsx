import { EntryForm, EntryGrid, TextEntry } from '../../../components/form';
import { useEntryForm } from '../../../lib/use-entry-form';
import { setOffice } from '../api';
import type { Office } from '../types';

/** Who signs the notices, and where residents may call. */
export function OfficeForm({ office, onSaved }: { office: Office; onSaved: () => void }) {
  const entries = useEntryForm({ entries: office, perform: setOffice, onDone: onSaved });
  return (
    <EntryForm entries={entries} act="Save the office">
      <EntryGrid>
        <TextEntry name="name" label="Name" required />
        <TextEntry name="phone" label="Telephone" help="Stands in every notice" />
      </EntryGrid>
    </EntryForm>
  );
}
