import { ReasonDialog } from '../../../components/reason/reason-dialog';
import { counted } from '../../../lib/format/number';
import { useAct } from '../../../lib/use-act';
import { withdrawImport } from '../api';
import type { Import } from '../types';

interface WithdrawDialogProps {
  of: Import;
  onClose: () => void;
  onDone: () => void;
}

/** Says what undoing an import does, asks why, and does it. */
export function WithdrawDialog({ of, onClose, onDone }: WithdrawDialogProps) {
  const act = useAct((reason: string) => withdrawImport(of.id, reason).finally(onDone));
  return (
    <ReasonDialog
      onClose={onClose}
      title={`Undo the import of ${of.name}?`}
      explanation={
        `${counted(of.new + of.corrected, 'reading')} of ${of.towerName} go out of force; where they took the place ` +
        'of others, those come back. What a later file only repeated goes, too. All that depends on them is worked ' +
        'out anew. The record keeps both.'
      }
      button="Undo the import"
      act={act}
    />
  );
}
