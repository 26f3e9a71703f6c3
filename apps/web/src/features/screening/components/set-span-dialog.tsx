import { Stack } from '@chakra-ui/react';
import { useId, useState } from 'react';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { Field } from '../../../components/ui/field';
import { Textarea } from '../../../components/ui/input';
import { dateAndTime } from '../../../lib/format/time';
import { useAct } from '../../../lib/use-act';
import { setSpan, type Ends } from '../api';
import type { Said } from '../types';
import { SAID_NAME } from '../words';

const LEAST_LETTERS = 3;

/** A span that is about to be set. */
export interface SpanAsked extends Ends {
  sensorId: number;
  sensorName: string;
  said: Said;
}

const WHAT_HAPPENS: Record<Said, string> = {
  failed: 'These readings are left out of every mean; they stay in the record as they came.',
  valid: 'These readings count as valid, whatever the checks say of them.',
};

interface SetSpanDialogProps {
  span: SpanAsked;
  zone: string;
  onClose: () => void;
  onSet: () => void;
}

/** Says what setting a span does, asks why, and does it. What is typed stays when it is refused. */
export function SetSpanDialog({ span, zone, onClose, onSet }: SetSpanDialogProps) {
  const { sensorId, sensorName, said, from, to } = span;
  const [reason, setReason] = useState('');
  const [checked, setChecked] = useState(false);
  const formId = useId();
  const act = useAct(async () => {
    const made = await setSpan({ sensorId, from, to, quality: said, reason: reason.trim() });
    onSet();
    onClose();
    return made;
  });
  const missing = reason.trim().length < LEAST_LETTERS;
  return (
    <Dialog
      open
      onClose={onClose}
      title={`${SAID_NAME[said]} ${sensorName}?`}
      footer={
        <>
          <Button type="submit" form={formId} kind="go" busy={act.busy}>
            {SAID_NAME[said]}
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
            From the reading of <strong>{dateAndTime(from, zone)}</strong> to that of{' '}
            <strong>{dateAndTime(to, zone)}</strong>. {WHAT_HAPPENS[said]} All that depends on them is worked
            out anew; notices already sent stay as they were sent.
          </p>
          <Field
            label="Reason"
            required
            error={checked && missing ? 'Say why in a few words: it stays in the record.' : undefined}
            help="It is kept with your name, and can be undone."
          >
            <Textarea value={reason} maxLength={500} onChange={({ target }) => setReason(target.value)} />
          </Field>
          <Refusal problem={act.problem} />
        </Stack>
      </form>
    </Dialog>
  );
}
