import { ChecksEntry, ChoiceEntry, EntryForm, EntryGrid, TextEntry } from '../../../components/form';
import { useEntryForm } from '../../../lib/use-entry-form';
import { invite, type Invitation } from '../api';
import type { District } from '../types';
import { ROLE_CHOICES } from './role-choices';
import type { MadeLink } from './users-view';

const EMPTY: Invitation = { email: '', name: '', role: 'analyst', districtIds: [] };

interface InviteFormProps {
  districts: readonly District[];
  onMade: (link: MadeLink) => void;
}

/** Invites somebody: the service makes a one-time link that the administrator hands over. */
export function InviteForm({ districts, onMade }: InviteFormProps) {
  const entries = useEntryForm({
    entries: EMPTY,
    perform: invite,
    onDone: ({ user, invitationUrl }, form) => {
      form.reset(EMPTY);
      onMade({ name: user.name, url: invitationUrl });
    },
  });
  const role = entries.form.watch('role');
  return (
    <EntryForm entries={entries} act="Make the invitation">
      <EntryGrid>
        <TextEntry name="name" label="Name" required />
        <TextEntry name="email" label="E-mail" type="email" required />
      </EntryGrid>
      <ChoiceEntry name="role" label="Role" choices={ROLE_CHOICES} />
      {role === 'officer' && (
        <ChecksEntry
          name="districtIds"
          label="Their districts"
          choices={districts.map(({ id, name }) => ({ value: id, label: name }))}
          help="An officer can act only in these."
        />
      )}
    </EntryForm>
  );
}
