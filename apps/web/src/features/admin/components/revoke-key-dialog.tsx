import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { useAct } from '../../../lib/use-act';
import { revokeKey } from '../api';
import type { IngestKey } from '../types';

interface RevokeKeyDialogProps {
  ingestKey: IngestKey;
  onClose: () => void;
  onRevoked: () => Promise<unknown>;
}

/** Says what revoking a key means before it is done. */
export function RevokeKeyDialog({ ingestKey: { id, name }, onClose, onRevoked }: RevokeKeyDialogProps) {
  const { run, busy, problem } = useAct(async () => {
    await revokeKey(id);
    await onRevoked();
    onClose();
  });
  return (
    <Dialog
      open
      grave
      onClose={onClose}
      title={`Revoke the key “${name}”?`}
      footer={
        <>
          <Button kind="stop" busy={busy} onClick={() => void run(undefined)}>
            Revoke
          </Button>
          <Button onClick={onClose}>Back</Button>
        </>
      }
    >
      <p>
        From now on nothing is taken with it: whatever sends with this key is refused until it has another
        one. This cannot be undone.
      </p>
      <Refusal problem={problem} />
    </Dialog>
  );
}
