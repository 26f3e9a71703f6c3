import { Grid } from '@chakra-ui/react';
import { useEffect, useState } from 'react';
import { Field } from '../../../components/ui/field';
import { Input, Select } from '../../../components/ui/input';
import type { District } from '../../../lib/api/types';
import type { FilterField } from '../use-notice-filter';

interface NoticeFilterBarProps {
  districts: District[];
  field: (name: FilterField) => string;
  onChange: (changes: Partial<Record<FilterField, string>>) => void;
}

/** What the log is narrowed to. */
export function NoticeFilterBar({ districts, field, onChange }: NoticeFilterBarProps) {
  const bind = (name: FilterField) => ({
    value: field(name),
    onChange: ({ target }: { target: { value: string } }) => onChange({ [name]: target.value }),
  });
  return (
    <Grid
      as="form"
      role="search"
      aria-label="Narrow the notices"
      gap="3"
      templateColumns={{
        base: 'repeat(auto-fit, minmax(9.5rem, 1fr))',
        md: 'repeat(3, 1fr)',
        xl: 'repeat(5, 1fr) 1.6fr',
      }}
      data-screen-only
      onSubmit={(event) => event.preventDefault()}
    >
      <Field label="District">
        <Select {...bind('district')}>
          <option value="">all</option>
          {districts.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </Select>
      </Field>
      <Field label="Kind">
        <Select {...bind('kind')}>
          <option value="">both</option>
          <option value="advisory">advisory</option>
          <option value="burnBan">burn ban</option>
        </Select>
      </Field>
      <Field label="State">
        <Select {...bind('state')}>
          <option value="">any</option>
          <option value="in force">in force</option>
          <option value="ended">ended</option>
          <option value="replaced">replaced</option>
        </Select>
      </Field>
      <Field label="From">
        <Input type="date" {...bind('from')} />
      </Field>
      <Field label="To">
        <Input type="date" {...bind('to')} />
      </Field>
      <WordsField words={field('words')} onWords={(words) => onChange({ words })} />
    </Grid>
  );
}

const PAUSE_MS = 350;

/** Words to look for; asked when typing pauses, not at each letter. */
function WordsField({ words, onWords }: { words: string; onWords: (words: string) => void }) {
  const [typed, setTyped] = useState(words);
  useEffect(() => {
    if (typed === words) return undefined;
    const timer = setTimeout(() => onWords(typed), PAUSE_MS);
    return () => clearTimeout(timer);
  }, [typed, words, onWords]);
  return (
    <Field label="Words">
      <Input
        type="search"
        value={typed}
        placeholder="reference, reason, name"
        onChange={({ target }) => setTyped(target.value)}
      />
    </Field>
  );
}
