import { Field } from '../ui/field';
import { Select } from '../ui/input';
import { useEntry, type EntryProps } from './entry';

/** A choice as it is stored and as it is read. */
export interface Choice {
  value: string | number;
  label: string;
}

interface ChoiceEntryProps extends EntryProps {
  choices: readonly Choice[];
  /** The first line when nothing need be chosen; gives null. */
  none?: string;
  /** The stored values are numbers (ids). */
  numeric?: boolean;
}

const toId = (value: unknown): number | null => (value === '' || value == null ? null : Number(value));

/** One of a short list. */
export function ChoiceEntry({ choices, none, numeric = false, ...entry }: ChoiceEntryProps) {
  const { register, rules, error } = useEntry(entry);
  const field = register(entry.name, numeric ? { ...rules, setValueAs: toId } : rules);
  return (
    <Field label={entry.label} help={entry.help} error={error} required={entry.required}>
      <Select {...field}>
        {none !== undefined && <option value="">{none}</option>}
        {choices.map(({ value, label }) => (
          <option key={value} value={value}>
            {label}
          </option>
        ))}
      </Select>
    </Field>
  );
}
