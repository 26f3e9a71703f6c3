import { useState, type FormEvent } from 'react';
import { Stack } from '@chakra-ui/react';
import { Button } from '../../../components/ui/button';
import { Field } from '../../../components/ui/field';
import { Input, Textarea } from '../../../components/ui/input';
import { Message } from '../../../components/ui/message';
import { asProblem, type FieldProblem } from '../../../lib/api/problem';
import { draftRule } from '../api';

interface RuleDraftFormProps {
  districtId: number;
  /** The version to begin from. */
  from: Record<string, unknown> | undefined;
  onDrafted: () => void;
}

/** A new version of a rule as data; what the service finds wrong is said with the place in the data. */
export function RuleDraftForm({ districtId, from, onDrafted }: RuleDraftFormProps) {
  const [text, setText] = useState(() => JSON.stringify(from ?? {}, null, 2));
  const [note, setNote] = useState('');
  const [busy, setBusy] = useState(false);
  const [wrong, setWrong] = useState<FieldProblem[]>([]);

  const send = async (event: FormEvent) => {
    event.preventDefault();
    setBusy(true);
    setWrong([]);
    try {
      await draftRule(districtId, { body: JSON.parse(text) as unknown, note });
      setNote('');
      onDrafted();
    } catch (error) {
      const problem = asProblem(error);
      setWrong(problem.errors.length > 0 ? problem.errors : [{ field: '', text: problem.message }]);
    } finally {
      setBusy(false);
    }
  };

  return (
    <form onSubmit={(event) => void send(event)}>
      <Stack gap="4">
        <Field label="The rule, as data (JSON)">
          <Textarea
            rows={16}
            fontFamily="mono"
            spellCheck={false}
            value={text}
            onChange={({ target }) => setText(target.value)}
          />
        </Field>
        <Field label="What changes, and why" required>
          <Input required value={note} onChange={({ target }) => setNote(target.value)} />
        </Field>
        {wrong.length > 0 && (
          <Message tone="wrong" title="This cannot be a rule yet.">
            {wrong.map(({ field, text: said }) => (
              <p key={field + said}>
                {field && <code>{field}</code>} {said}
              </p>
            ))}
          </Message>
        )}
        <Button type="submit" kind="go" busy={busy} alignSelf="flex-start">
          Keep the draft
        </Button>
      </Stack>
    </form>
  );
}
