import { Field } from '../ui/field';
import { Input } from '../ui/input';
import { useEntry, type EntryProps } from './entry';

/** Reads what stands in a number's field; undefined when it is empty, NaN when it is no number. */
export const readNumber = (text: unknown): number | undefined => {
  const written = String(text ?? '')
    .trim()
    .replace('−', '-');
  return written === '' ? undefined : Number(written);
};

/** A number of a form, with its unit in the label; an empty one is left out. */
export function NumberEntry(entry: EntryProps) {
  const { register, error } = useEntry(entry);
  const field = register(entry.name, {
    setValueAs: readNumber,
    validate: (value: number | undefined) => {
      if (value === undefined) return !entry.required || 'This is needed.';
      return Number.isFinite(value) || 'Write a number such as 2.5.';
    },
  });
  return (
    <Field label={entry.label} help={entry.help} error={error} required={entry.required}>
      <Input inputMode="decimal" autoComplete="off" {...field} />
    </Field>
  );
}
