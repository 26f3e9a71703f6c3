import { Flex, Stack } from '@chakra-ui/react';
import { Button } from '../../../components/ui/button';
import { Field } from '../../../components/ui/field';
import { Select } from '../../../components/ui/input';
import type { Mapping } from '../types';
import { TIME_PARTS } from '../words';

type Part = NonNullable<Mapping['timeColumns']>[number];

interface TimeColumnsProps {
  names: readonly string[];
  draft: Mapping;
  onChange: (draft: Mapping) => void;
}

/** In which column the time stands, or in which several and what each of them says. */
export function TimeColumns({ names, draft, onChange }: TimeColumnsProps) {
  const parts = draft.timeColumns;
  const options = names.map((name) => (
    <option key={name} value={name}>
      {name}
    </option>
  ));
  const set = (next: Part[]) => onChange({ ...draft, timeColumns: next });
  if (!parts) {
    return (
      <Stack gap="1" align="flex-start" maxW="420px">
        <Field label="The time stands in">
          <Select
            value={draft.timeColumn ?? ''}
            onChange={({ target }) => onChange({ ...draft, timeColumn: target.value })}
          >
            {options}
          </Select>
        </Field>
        <Button
          kind="quiet"
          size="sm"
          onClick={() => set([{ column: draft.timeColumn ?? names[0] ?? '', part: 'date' }])}
        >
          It stands in several columns
        </Button>
      </Stack>
    );
  }
  return (
    <Stack gap="2" align="flex-start">
      <strong>The time stands in</strong>
      {parts.map((part, i) => (
        <Flex key={i} gap="2" wrap="wrap">
          <Select
            aria-label={`Column of part ${i + 1} of the time`}
            value={part.column}
            onChange={({ target }) => set(parts.with(i, { ...part, column: target.value }))}
          >
            {options}
          </Select>
          <Select
            aria-label={`What part ${i + 1} of the time is`}
            value={part.part}
            onChange={({ target }) => set(parts.with(i, { ...part, part: target.value as Part['part'] }))}
          >
            {TIME_PARTS.map((name) => (
              <option key={name}>{name}</option>
            ))}
          </Select>
        </Flex>
      ))}
      <Flex gap="2" wrap="wrap">
        <Button
          kind="quiet"
          size="sm"
          onClick={() => set([...parts, { column: names[0] ?? '', part: 'time' }])}
        >
          One more column
        </Button>
        <Button
          kind="quiet"
          size="sm"
          onClick={() => {
            if (parts.length > 1) return set(parts.slice(0, -1));
            const { timeColumns: _, ...rest } = draft;
            onChange({ ...rest, timeColumn: parts[0]?.column ?? 'time' });
          }}
        >
          One less
        </Button>
      </Flex>
    </Stack>
  );
}
