import { Stack } from '@chakra-ui/react';
import { useId, useState } from 'react';
import { WhoGetsIt } from '../../../components/notice-text/who-gets-it';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { PasswordField } from '../../../components/ui/password-field';
import type { NoticePreview, ProposalDetail } from '../../../lib/api/types';
import { dayAndTime } from '../../../lib/format/time';
import type { Act } from '../../../lib/use-act';
import { KIND_NAME } from '../../../lib/words';
import { Refusal } from '../../../components/states/refusal';

interface IssueDialogProps {
  open: boolean;
  onClose: () => void;
  proposal: ProposalDetail;
  preview: NoticePreview;
  verb: string;
  zone: string;
  act: Act<{ password?: string }, unknown>;
}

/** The last question before something public: what happens, who gets what, until when; a burn ban asks for the password. */
export function IssueDialog({ open, onClose, proposal, preview, verb, zone, act }: IssueDialogProps) {
  const [password, setPassword] = useState('');
  const [missing, setMissing] = useState(false);
  const formId = useId();
  const wrong = act.problem?.code === 'password-wrong' || act.problem?.code === 'password-needed';
  const submit = () => {
    setMissing(preview.needsPassword && password === '');
    if (preview.needsPassword && password === '') return;
    void act.run(preview.needsPassword ? { password } : {});
  };
  const ban = proposal.kind === 'burnBan' && proposal.act === 'begin';
  return (
    <Dialog
      grave
      open={open}
      onClose={onClose}
      title={`${verb} in ${proposal.districtName}?`}
      footer={
        <>
          <Button type="submit" form={formId} kind={ban ? 'stop' : 'go'} busy={act.busy}>
            {verb} now
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
          submit();
        }}
      >
        <Stack gap="3">
          <p>
            {proposal.act === 'begin' ? (
              <>
                {KIND_NAME[proposal.kind]} in {proposal.districtName} from now until{' '}
                <strong>{dayAndTime(preview.expiresAt, zone)}</strong>.
              </>
            ) : (
              <>From now on there is no such restriction in {proposal.districtName}, and people are told.</>
            )}
          </p>
          <p>
            <WhoGetsIt recipients={preview.recipients} />
          </p>
          {preview.needsPassword && (
            <PasswordField
              label="Your password, again"
              value={password}
              onChange={(text) => {
                setPassword(text);
                act.clear();
              }}
              error={missing ? 'Enter your password.' : wrong ? act.problem?.message : undefined}
            />
          )}
          {!wrong && <Refusal problem={act.problem} />}
        </Stack>
      </form>
    </Dialog>
  );
}
