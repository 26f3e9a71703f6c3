import { Flex, Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { paths } from '../../../app/paths';
import { Failed } from '../../../components/states/failed';
import { Loading } from '../../../components/states/loading';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { Message } from '../../../components/ui/message';
import { TextLink } from '../../../components/ui/text-link';
import { counted } from '../../../lib/format/number';
import { dateAndTime } from '../../../lib/format/time';
import { useAct } from '../../../lib/use-act';
import { commitUpload, usePreview } from '../api';
import { answered, columnsOfOpenUnit, setTwice, unitOf } from '../mapping-draft';
import type { Proposal, Question, Tower, Upload } from '../types';
import { useAsked } from '../use-asked';
import { useMappingDraft } from '../use-mapping-draft';
import { useSettled } from '../use-settled';
import { layoutInWords, timeInWords } from '../words';
import { ColumnsTable } from './columns-table';
import { LayoutPart } from './layout-part';
import { PreviewPart } from './preview-part';
import { QuestionChoice } from './question-choice';

interface CheckFileProps {
  upload: Upload;
  proposal: Proposal;
  tower: Tower;
  zone: string;
  onSheet: (sheet: string) => void;
  onBegun: () => void;
}

/** What was found in a file, to be looked at and corrected, and what importing it would give. */
export function CheckFile({ upload, proposal, tower, zone, onSheet, onBegun }: CheckFileProps) {
  const { draft, setDraft, answers, setAnswers, reset } = useMappingDraft(upload.id, proposal);
  const [open, setOpen] = useState(false);
  const hasSensor = draft.format === 'long' || Object.keys(draft.columns ?? {}).length > 0;
  const preview = usePreview(upload.id, useSettled(hasSensor ? draft : null));
  const act = useAct(async () => {
    const begun = await commitUpload(upload.id, draft);
    onBegun();
    return begun;
  });
  const questions = [...proposal.questions, ...useAsked(preview.data)];
  const openUnits = columnsOfOpenUnit(proposal.columns);
  const isAnswered = ({ id }: Question) =>
    answers[id] !== undefined || (id === 'unit' && openUnits.every((column) => unitOf(draft, column)));
  const unanswered = questions.filter((question) => !isAnswered(question));
  const answer = (question: Question, value: string) => {
    setAnswers({ ...answers, [question.id]: value });
    setDraft(answered(draft, question, value, openUnits));
  };
  const ready = hasSensor && unanswered.length === 0 && setTwice(draft).length === 0 && !preview.error;
  const found = preview.data;
  const isCorrected = layoutInWords(draft) !== layoutInWords(proposal.mapping);
  return (
    <Stack gap="4">
      {upload.sameAs && (
        <Message tone="warn" title="Nothing new: this very file was imported before">
          It came in{' '}
          <TextLink to={paths.importResult(upload.sameAs.importId)}>
            on {dateAndTime(upload.sameAs.receivedAt, zone)}
          </TextLink>
          . Importing it again changes nothing: what is known already counts as repeated.
        </Message>
      )}
      {upload.fault && (
        <Message tone="wrong" title="The import broke off">
          {upload.fault}
        </Message>
      )}
      <Card padded>
        <Flex justify="space-between" align="baseline" gap="3" wrap="wrap" mb="2">
          <PartTitle>What was found</PartTitle>
          <Button kind="quiet" size="sm" onClick={() => setOpen(!open)} aria-expanded={open}>
            {open ? 'Hide how it is written' : 'Correct how it is written'}
          </Button>
        </Flex>
        <p>
          {proposal.from === 'last file' ? `As the last file of ${tower.name}. ` : ''}
          The time stands in {timeInWords(draft)}. {layoutInWords(draft)}
          {isCorrected ? '' : ` ${proposal.notes.join(' ')}`}
        </p>
        {open && (
          <Stack gap="3" mt="4">
            <LayoutPart
              proposal={proposal}
              tower={tower}
              draft={draft}
              onChange={setDraft}
              onSheet={onSheet}
            />
            <Button kind="quiet" size="sm" alignSelf="flex-start" onClick={reset}>
              Back to what was found
            </Button>
          </Stack>
        )}
      </Card>
      {questions.length > 0 && (
        <Card padded edge="lid">
          <PartTitle mb="2">Please say</PartTitle>
          <Stack gap="4">
            {questions.map((question) => (
              <QuestionChoice
                key={question.id}
                question={question}
                value={answers[question.id]}
                onAnswer={(value) => answer(question, value)}
              />
            ))}
          </Stack>
        </Card>
      )}
      <Card padded>
        <PartTitle mb="2">Columns and sensors</PartTitle>
        <ColumnsTable proposal={proposal} tower={tower} draft={draft} onChange={setDraft} />
      </Card>
      <Card padded aria-busy={preview.isLoading}>
        <PartTitle mb="2">What importing gives</PartTitle>
        {!hasSensor && <p>Say above which column is which sensor of {tower.name}.</p>}
        {hasSensor && preview.error && (
          <Failed what="the preview" problem={preview.error} onRetry={() => void preview.mutate()} />
        )}
        {hasSensor && !found && !preview.error && <Loading label="the preview" rows={2} />}
        {hasSensor && found && !preview.error && <PreviewPart preview={found} zone={zone} />}
      </Card>
      <Stack gap="2" align="flex-start">
        <Refusal problem={act.problem} />
        {unanswered.length > 0 && <p>Answer what is asked above first.</p>}
        <Button
          kind="go"
          size="lg"
          busy={act.busy}
          disabled={!ready || !found}
          onClick={() => void act.run(undefined)}
        >
          {found && found.whole && ready ? `Import ${counted(found.read, 'reading')}` : 'Import the file'}
        </Button>
        <TextLink to={paths.importFile(upload.towerId)}>Choose another file</TextLink>
      </Stack>
    </Stack>
  );
}
