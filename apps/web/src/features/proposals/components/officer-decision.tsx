import { Box, Flex, Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { paths } from '../../../app/paths';
import { NoticeTexts } from '../../../components/notice-text/notice-texts';
import { WhoGetsIt } from '../../../components/notice-text/who-gets-it';
import { isDecidedMeanwhile } from '../../../components/states/refusal';
import { Failed } from '../../../components/states/failed';
import { Loading } from '../../../components/states/loading';
import { Button } from '../../../components/ui/button';
import { SmallTitle } from '../../../components/ui/heading';
import { asProblem, type ApiProblem } from '../../../lib/api/problem';
import type { ProposalDetail } from '../../../lib/api/types';
import { useRequestKey } from '../../../lib/request-key';
import { useAct } from '../../../lib/use-act';
import { kindInSentence } from '../../../lib/words';
import { issueProposal, returnProposal, usePreview, type IssueInput } from '../api';
import { IssueDialog } from './issue-dialog';
import { ReasonDialog } from '../../../components/reason/reason-dialog';
import { UntilField } from './until-field';

interface OfficerDecisionProps {
  proposal: ProposalDetail;
  zone: string;
  onAnswer: () => void;
  /** Called with the service's answer when somebody else was quicker. */
  onOvertaken: (problem: ApiProblem) => void;
}

/** The officer's decision: the notice word for word, to whom and until when; issue it, or return it to the analyst. */
export function OfficerDecision({ proposal, zone, onAnswer, onOvertaken }: OfficerDecisionProps) {
  const { id, version, kind, act } = proposal;
  const [expiresAt, setExpiresAt] = useState<string>();
  const [asking, setAsking] = useState<'issue' | 'return'>();
  const preview = usePreview(id, version, expiresAt);
  const navigate = useNavigate();
  const requestKey = useRequestKey();
  const told = (error: unknown): never => {
    const problem = asProblem(error);
    if (isDecidedMeanwhile(problem)) onOvertaken(problem);
    throw problem;
  };
  const issue = useAct(async ({ password }: { password?: string }) => {
    if (!preview.data) return undefined;
    const input: IssueInput = { previewHash: preview.data.hash, version, requestKey: requestKey.key() };
    if (expiresAt) input.expiresAt = expiresAt;
    if (password) input.password = password;
    const notice = await issueProposal(id, input)
      .catch(told)
      .finally(() => {
        onAnswer();
        void preview.mutate();
      });
    await navigate(paths.notice(notice.id), { state: { justDone: act } });
    return notice;
  });
  const giveBack = useAct((reason: string) =>
    returnProposal(id, { reason, version }).catch(told).finally(onAnswer),
  );
  const verb = act === 'end' ? `End the ${kindInSentence(kind)}` : `Issue ${kindInSentence(kind)}`;
  if (!preview.data) {
    return preview.error ? (
      <Failed what="the notice" problem={preview.error} onRetry={() => void preview.mutate()} />
    ) : (
      <Loading label="the notice" rows={2} rowHeight="28" />
    );
  }
  return (
    <Stack gap="3.5">
      <SmallTitle>{act === 'end' ? 'What goes out when it ends' : 'The notice as it goes out'}</SmallTitle>
      <NoticeTexts texts={preview.data.texts} segments={preview.data.segments} />
      {act === 'begin' && (
        <UntilField
          value={expiresAt ?? preview.data.expiresAt}
          zone={zone}
          problem={expiresAt ? preview.error : undefined}
          onChange={setExpiresAt}
        />
      )}
      <Box color="mute">
        <WhoGetsIt recipients={preview.data.recipients} />
      </Box>
      <Button
        kind={act === 'begin' && kind === 'burnBan' ? 'stop' : 'go'}
        size="lg"
        wide
        disabled={preview.isValidating || preview.error !== undefined}
        onClick={() => setAsking('issue')}
      >
        {verb}…
      </Button>
      <Flex>
        <Button flex="1" onClick={() => setAsking('return')}>
          Return to the analyst…
        </Button>
      </Flex>
      <IssueDialog
        open={asking === 'issue'}
        onClose={() => setAsking(undefined)}
        proposal={proposal}
        preview={preview.data}
        verb={verb}
        zone={zone}
        act={issue}
      />
      <ReasonDialog
        open={asking === 'return'}
        onClose={() => setAsking(undefined)}
        title="Return it to the analyst?"
        explanation="Nothing goes out. The analyst sees your reason and decides anew."
        button="Return"
        act={giveBack}
      />
    </Stack>
  );
}
