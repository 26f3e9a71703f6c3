import { Field } from '../ui/field';
import { Input, Textarea } from '../ui/input';
import { useEntry, type EntryProps } from './entry';

interface TextEntryProps extends EntryProps {
  type?: 'text' | 'email' | 'datetime-local' | 'password';
  lines?: number;
  autoComplete?: string;
  /** Figures of one width, for codes and rules. */
  mono?: boolean;
}

/** A text of a form. */
export function TextEntry({
  type = 'text',
  lines = 1,
  autoComplete = 'off',
  mono,
  ...entry
}: TextEntryProps) {
  const { register, rules, error } = useEntry(entry);
  const field = register(entry.name, rules);
  const fontFamily = mono ? 'mono' : undefined;
  return (
    <Field label={entry.label} help={entry.help} error={error} required={entry.required}>
      {lines > 1 ? (
        <Textarea rows={lines} fontFamily={fontFamily} fontSize={mono ? 'sm' : undefined} {...field} />
      ) : (
        <Input type={type} autoComplete={autoComplete} fontFamily={fontFamily} {...field} />
      )}
    </Field>
  );
}
