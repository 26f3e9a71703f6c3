import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { useAct } from '../../../lib/use-act';
import { retireUser } from '../api';
import type { User } from '../types';

interface RetireDialogProps {
  user: User;
  onClose: () => void;
  onRetired: () => void;
}

/** Says what retiring means before it is done: it cannot be undone. */
export function RetireDialog({ user, onClose, onRetired }: RetireDialogProps) {
  const { run, busy, problem } = useAct(async (id: number) => {
    await retireUser(id);
    onRetired();
    onClose();
  });
  return (
    <Dialog
      open
      grave
      onClose={onClose}
      title={`Retire ${user.name}?`}
      footer={
        <>
          <Button kind="stop" busy={busy} onClick={() => void run(user.id)}>
            Retire
          </Button>
          <Button onClick={onClose}>Back</Button>
        </>
      }
    >
      <p>
        {user.name} is signed out and cannot sign in any more. What they did stays on the record under their
        name. This cannot be undone.
      </p>
      <Refusal problem={problem} />
    </Dialog>
  );
}
