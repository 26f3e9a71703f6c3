import { ReasonDialog } from '../../../components/reason/reason-dialog';
import { dateAndTime } from '../../../lib/format/time';
import { useAct } from '../../../lib/use-act';
import { setSpan, type Ends } from '../api';
import type { Said } from '../types';
import { SAID_NAME } from '../words';

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
  const act = useAct(async (reason: string) => {
    const made = await setSpan({ sensorId, from, to, quality: said, reason });
    onSet();
    return made;
  });
  return (
    <ReasonDialog
      onClose={onClose}
      title={`${SAID_NAME[said]} ${sensorName}?`}
      explanation={
        <>
          From the reading of <strong>{dateAndTime(from, zone)}</strong> to that of{' '}
          <strong>{dateAndTime(to, zone)}</strong>. {WHAT_HAPPENS[said]} All that depends on them is worked
          out anew; notices already sent stay as they were sent.
        </>
      }
      button={SAID_NAME[said]}
      help="It is kept with your name, and can be undone."
      act={act}
    />
  );
}
