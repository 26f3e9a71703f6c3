import { Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Message } from '../../../components/ui/message';
import type { ApiProblem } from '../../../lib/api/problem';
import type { Me, ProposalDetail } from '../../../lib/api/types';
import { AnalystDecision } from './analyst-decision';
import { OfficerDecision } from './officer-decision';
import { stateSentence } from './state-sentence';

interface DecisionPanelProps {
  proposal: ProposalDetail;
  me: Me;
  zone: string;
  onAnswer: () => void;
}

/**
 * What the reader may do with the proposal now. A form once shown stays, with what was typed, when somebody else
 * decides meanwhile: the sentence above it says what they did. After one's own decision only the sentence stays. An
 * officer who was not the first is told so until they have read it, also when the page already shows what holds now.
 */
export function DecisionPanel({ proposal, me, zone, onAnswer }: DecisionPanelProps) {
  const mine = me.role === 'officer' && me.districts.some(({ id }) => id === proposal.districtId);
  const analystsTurn = me.role === 'analyst' && (proposal.state === 'open' || proposal.state === 'returned');
  const officersTurn = mine && proposal.state === 'confirmed';
  const [began] = useState({ analyst: analystsTurn, officer: officersTurn });
  const [acted, setActed] = useState(false);
  const [answer, setAnswer] = useState<ApiProblem>();
  const overtaken = !acted && ((began.analyst && !analystsTurn) || (began.officer && !officersTurn));
  const sentence = stateSentence(proposal, zone);
  return (
    <Stack gap="3">
      {sentence && !(officersTurn && proposal.state === 'confirmed') && (
        <Message tone={overtaken ? 'warn' : 'info'}>{sentence}</Message>
      )}
      {(analystsTurn || (began.analyst && !acted)) && (
        <AnalystDecision proposal={proposal} onAnswer={onAnswer} onDone={() => setActed(true)} />
      )}
      {answer && (
        <>
          <Refusal problem={answer} />
          <Button onClick={() => setAnswer(undefined)}>I have read it</Button>
        </>
      )}
      {officersTurn && (
        <OfficerDecision proposal={proposal} zone={zone} onAnswer={onAnswer} onOvertaken={setAnswer} />
      )}
      {me.role === 'officer' && !mine && (
        <Message>This is not one of your districts: you can read it.</Message>
      )}
    </Stack>
  );
}
