import { Flex, Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Button } from '../../../components/ui/button';
import { Field } from '../../../components/ui/field';
import { PartTitle } from '../../../components/ui/heading';
import { Textarea } from '../../../components/ui/input';
import type { ProposalDetail } from '../../../lib/api/types';
import { useAct } from '../../../lib/use-act';
import { confirmProposal, declineProposal } from '../api';
import { Refusal } from '../../../components/states/refusal';
import { ReasonDialog } from '../../../components/reason/reason-dialog';

interface AnalystDecisionProps {
  proposal: ProposalDetail;
  /** Called after each answer of the service, so that the page shows what holds now. */
  onAnswer: () => void;
  /** Called once the decision was taken here. */
  onDone: () => void;
}

/** The analyst's decision: confirm with a sentence for the officer, or decline with a reason. */
export function AnalystDecision({ proposal, onAnswer, onDone }: AnalystDecisionProps) {
  const { id, version } = proposal;
  const [declining, setDeclining] = useState(false);
  const form = useForm({ defaultValues: { note: '' } });
  const confirm = useAct((note: string) =>
    confirmProposal(id, { note, version }).then(onDone).finally(onAnswer),
  );
  const decline = useAct((reason: string) =>
    declineProposal(id, { reason, version }).then(onDone).finally(onAnswer),
  );
  const { errors } = form.formState;
  return (
    <form
      noValidate
      onSubmit={(event) =>
        void form.handleSubmit(({ note }) => confirm.run(note.trim()).then(() => undefined))(event)
      }
    >
      <Stack gap="3">
        <PartTitle>Your decision</PartTitle>
        <Field
          label="A sentence for the officer"
          help="What the numbers do not say: how you checked them, what the night will do."
          error={errors.note?.message}
          required
        >
          <Textarea
            {...form.register('note', {
              validate: (text) => text.trim() !== '' || 'Write a sentence: the officer decides by it.',
              maxLength: { value: 500, message: 'Keep it within 500 characters.' },
            })}
          />
        </Field>
        <Refusal problem={confirm.problem} />
        <Flex gap="2.5" wrap="wrap">
          <Button type="submit" kind="go" busy={confirm.busy} flex="1">
            Confirm for the officer
          </Button>
          <Button onClick={() => setDeclining(true)} flex="1">
            Decline…
          </Button>
        </Flex>
      </Stack>
      <ReasonDialog
        open={declining}
        onClose={() => setDeclining(false)}
        title="Decline this proposal?"
        explanation="It is laid aside and the reason is kept in the record. Nobody is notified; the rule may propose again later."
        button="Decline"
        act={decline}
      />
    </form>
  );
}
