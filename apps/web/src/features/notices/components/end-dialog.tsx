import { Stack } from '@chakra-ui/react';
import { useId, useState } from 'react';
import { NoticeTexts } from '../../../components/notice-text/notice-texts';
import { WhoGetsIt } from '../../../components/notice-text/who-gets-it';
import { Failed } from '../../../components/states/failed';
import { Loading } from '../../../components/states/loading';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { Field } from '../../../components/ui/field';
import { Textarea } from '../../../components/ui/input';
import { PasswordField } from '../../../components/ui/password-field';
import type { NoticeBrief } from '../../../lib/api/types';
import { useRequestKey } from '../../../lib/request-key';
import { useAct } from '../../../lib/use-act';
import { kindInSentence } from '../../../lib/words';
import { endNotice, useEndPreview, type EndInput } from '../api';

interface EndDialogProps {
  open: boolean;
  notice: NoticeBrief;
  onClose: () => void;
  /** Called after each answer of the service. */
  onAnswer: () => void;
}

/** Ends a notice: the text that goes out, to how many, the reason, and for a burn ban the password again. */
export function EndDialog({ open, notice, onClose, onAnswer }: EndDialogProps) {
  const preview = useEndPreview(open ? notice : null);
  const [reason, setReason] = useState('');
  const [password, setPassword] = useState('');
  const [checked, setChecked] = useState(false);
  const formId = useId();
  const requestKey = useRequestKey();
  const end = useAct(async (previewHash: string) => {
    const input: EndInput = {
      reason: reason.trim(),
      version: notice.version,
      previewHash,
      requestKey: requestKey.key(),
    };
    if (needsPassword) input.password = password;
    const ended = await endNotice(notice.id, input).finally(onAnswer);
    onClose();
    return ended;
  });
  const needsPassword = preview.data?.needsPassword ?? notice.kind === 'burnBan';
  const wrong = end.problem?.code === 'password-wrong' || end.problem?.code === 'password-needed';
  const complete = reason.trim() !== '' && (!needsPassword || password !== '');
  const submit = () => {
    setChecked(true);
    if (complete && preview.data) void end.run(preview.data.hash);
  };
  return (
    <Dialog
      grave
      open={open}
      onClose={onClose}
      title={`End the ${kindInSentence(notice.kind)} in ${notice.districtName}?`}
      footer={
        <>
          <Button type="submit" form={formId} kind="go" busy={end.busy} disabled={!preview.data}>
            End it now
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
          {preview.error && (
            <Failed what="the text" problem={preview.error} onRetry={() => void preview.mutate()} />
          )}
          {!preview.data && !preview.error && <Loading label="the text" rows={2} />}
          {preview.data && (
            <>
              <NoticeTexts texts={preview.data.texts} segments={preview.data.segments} />
              <p>
                <WhoGetsIt recipients={preview.data.recipients} />
              </p>
            </>
          )}
          <Field
            label="Reason"
            required
            error={checked && reason.trim() === '' ? 'Give a reason: it stays in the record.' : undefined}
          >
            <Textarea value={reason} maxLength={500} onChange={({ target }) => setReason(target.value)} />
          </Field>
          {needsPassword && (
            <PasswordField
              label="Your password, again"
              value={password}
              onChange={(text) => {
                setPassword(text);
                end.clear();
              }}
              error={
                checked && password === '' ? 'Enter your password.' : wrong ? end.problem?.message : undefined
              }
            />
          )}
          {!wrong && <Refusal problem={end.problem} />}
        </Stack>
      </form>
    </Dialog>
  );
}
