import { Stack } from '@chakra-ui/react';
import { useId, useState, type ReactNode } from 'react';
import type { Act } from '../../lib/use-act';
import { Refusal } from '../states/refusal';
import { Button } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { Field } from '../ui/field';
import { Textarea } from '../ui/input';

/** The service takes no shorter reason. */
const LEAST_LETTERS = 3;
const MOST_LETTERS = 500;

interface ReasonDialogProps {
  open?: boolean;
  onClose: () => void;
  title: string;
  /** What will happen. */
  explanation: ReactNode;
  /** What the button does: "Set aside". */
  button: string;
  help?: string;
  /** Does it with the reason; answers undefined where it was refused. */
  act: Act<string, unknown>;
}

/** Says what an act does and asks why, for the record. What is typed stays when it is refused. */
export function ReasonDialog({
  open = true,
  onClose,
  title,
  explanation,
  button,
  help,
  act,
}: ReasonDialogProps) {
  const [reason, setReason] = useState('');
  const [checked, setChecked] = useState(false);
  const formId = useId();
  const missing = reason.trim().length < LEAST_LETTERS;
  const submit = async () => {
    setChecked(true);
    if (missing) return;
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
            help={help}
            error={checked && missing ? 'Say why in a few words: it stays in the record.' : undefined}
          >
            <Textarea
              value={reason}
              maxLength={MOST_LETTERS}
              onChange={({ target }) => setReason(target.value)}
            />
          </Field>
          <Refusal problem={act.problem} />
        </Stack>
      </form>
    </Dialog>
  );
}
