import { ChecksEntry, ChoiceEntry, EntryForm } from '../../../components/form';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { useEntryForm } from '../../../lib/use-entry-form';
import { changeUser } from '../api';
import type { District, User } from '../types';
import { ROLE_CHOICES } from './role-choices';

interface UserDialogProps {
  user: User;
  districts: readonly District[];
  onClose: () => void;
  onChanged: () => void;
}

/** Changes somebody's role and districts; it holds from their next request on. */
export function UserDialog({ user, districts, onClose, onChanged }: UserDialogProps) {
  const entries = useEntryForm({
    entries: { role: user.role, districtIds: user.districtIds },
    perform: (change) => changeUser(user.id, change),
    onDone: () => {
      onChanged();
      onClose();
    },
  });
  return (
    <Dialog
      open
      onClose={onClose}
      title={`Change ${user.name}`}
      footer={<Button onClick={onClose}>Back</Button>}
    >
      <EntryForm entries={entries} act="Save">
        <ChoiceEntry name="role" label="Role" choices={ROLE_CHOICES} />
        {entries.form.watch('role') === 'officer' && (
          <ChecksEntry
            name="districtIds"
            label="Their districts"
            choices={districts.map(({ id, name }) => ({ value: id, label: name }))}
          />
        )}
      </EntryForm>
    </Dialog>
  );
}
