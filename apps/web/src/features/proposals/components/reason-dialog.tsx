import { Stack } from '@chakra-ui/react';
import { useId, useState } from 'react';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { Field } from '../../../components/ui/field';
import { Textarea } from '../../../components/ui/input';
import type { Act } from '../../../lib/use-act';
import { Refusal } from '../../../components/states/refusal';

interface ReasonDialogProps {
  open: boolean;
  onClose: () => void;
  title: string;
  /** What will happen. */
  explanation: string;
  button: string;
  act: Act<string, unknown>;
}

/** Asks for a reason before something is laid aside or given back. What is typed outlives closing it. */
export function ReasonDialog({ open, onClose, title, explanation, button, act }: ReasonDialogProps) {
  const [reason, setReason] = useState('');
  const [missing, setMissing] = useState(false);
  const formId = useId();
  const submit = async () => {
    setMissing(reason.trim() === '');
    if (reason.trim() === '') return;
    if ((await act.run(reason.trim())) !== undefined) onClose();
  };
  return (
    <Dialog
      open={open}
      onClose={onClose}
      title={title}
      footer={
        <>
          <Button type="submit" form={formId} kind="go" busy={act.busy}>
            {button}
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
          event.stopPropagation();
          void submit();
        }}
      >
        <Stack gap="3">
          <p>{explanation}</p>
          <Field
            label="Reason"
            required
            error={missing ? 'Give a reason: it stays in the record.' : undefined}
          >
            <Textarea value={reason} maxLength={500} onChange={({ target }) => setReason(target.value)} />
          </Field>
          <Refusal problem={act.problem} />
        </Stack>
      </form>
    </Dialog>
  );
}
