import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { useAct } from '../../../lib/use-act';
import { retireSource } from '../api';
import type { Source } from '../types';
import { placeOf } from './source-state';

interface RetireSourceDialogProps {
  source: Source;
  onClose: () => void;
  onRetired: () => void;
}

/** Says what retiring a source means before it is done. */
export function RetireSourceDialog({ source, onClose, onRetired }: RetireSourceDialogProps) {
  const { run, busy, problem } = useAct(async (id: number) => {
    await retireSource(id);
    onRetired();
    onClose();
  });
  const meaning =
    source.kind === 'push'
      ? 'What the site pushes is read by the usual layout from now on. Keys go on working.'
      : `Nothing is collected from it any more${source.hasSecret ? ', and its credentials are forgotten' : ''}.`;
  return (
    <Dialog
      open
      grave
      onClose={onClose}
      title="Retire this source?"
      footer={
        <>
          <Button kind="stop" busy={busy} onClick={() => void run(source.id)}>
            Retire
          </Button>
          <Button onClick={onClose}>Back</Button>
        </>
      }
    >
      <p>
        <strong>{placeOf(source)}</strong>
      </p>
      <p>{meaning} Its readings stay. It can be added anew.</p>
      <Refusal problem={problem} />
    </Dialog>
  );
}
