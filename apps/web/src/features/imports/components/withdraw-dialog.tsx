import { Stack } from '@chakra-ui/react';
import { useId, useState } from 'react';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { Field } from '../../../components/ui/field';
import { Textarea } from '../../../components/ui/input';
import { counted } from '../../../lib/format/number';
import { useAct } from '../../../lib/use-act';
import { withdrawImport } from '../api';
import type { Import } from '../types';

const LEAST_LETTERS = 3;

interface WithdrawDialogProps {
  of: Import;
  onClose: () => void;
  onDone: () => void;
}

/** Says what undoing an import does, asks why, and does it. */
export function WithdrawDialog({ of, onClose, onDone }: WithdrawDialogProps) {
  const [reason, setReason] = useState('');
  const [checked, setChecked] = useState(false);
  const formId = useId();
  const act = useAct(async () => {
    const undone = await withdrawImport(of.id, reason.trim()).finally(onDone);
    onClose();
    return undone;
  });
  const missing = reason.trim().length < LEAST_LETTERS;
  return (
    <Dialog
      open
      onClose={onClose}
      title={`Undo the import of ${of.name}?`}
      footer={
        <>
          <Button type="submit" form={formId} kind="go" busy={act.busy}>
            Undo the import
          </Button>
          <Button onClick={onClose}>Back</Button>
        </>
      }
    >
      <form
        id={formId}
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          setChecked(true);
          if (!missing) void act.run(undefined);
        }}
      >
        <Stack gap="3">
          <p>
            {counted(of.new + of.corrected, 'reading')} of {of.towerName} go out of force; where they took the
            place of others, those come back. All that depends on them is worked out anew. The record keeps
            both.
          </p>
          <Field
            label="Reason"
            required
            error={checked && missing ? 'Say why in a few words: it stays in the record.' : undefined}
          >
            <Textarea value={reason} maxLength={500} onChange={({ target }) => setReason(target.value)} />
          </Field>
          <Refusal problem={act.problem} />
        </Stack>
      </form>
    </Dialog>
  );
}
