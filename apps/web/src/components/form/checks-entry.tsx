import { Box, chakra, Stack } from '@chakra-ui/react';
import { useFormContext } from 'react-hook-form';
import type { Choice } from './choice-entry';
import { useEntry, type EntryProps } from './entry';

const Line = chakra('label', { base: { display: 'inline-flex', gap: '2', alignItems: 'center', minH: '8' } });
const Tick = chakra('input', { base: { width: '20px', height: '20px', accentColor: 'air', margin: 0 } });

interface ChecksEntryProps extends EntryProps {
  choices: readonly Choice[];
}

/** Several of a list, by boxes; the form holds the chosen numbers. */
export function ChecksEntry({ choices, ...entry }: ChecksEntryProps) {
  const { error } = useEntry(entry);
  const { watch, setValue } = useFormContext<Record<string, number[]>>();
  const chosen = watch(entry.name) ?? [];
  const toggle = (id: number, on: boolean) =>
    setValue(entry.name, on ? [...chosen, id] : chosen.filter((other) => other !== id), {
      shouldDirty: true,
    });
  return (
    <chakra.fieldset border="0" p="0" m="0">
      <chakra.legend fontWeight="600" p="0">
        {entry.label}
      </chakra.legend>
      <Stack gap="0" direction={{ base: 'column', md: 'row' }} columnGap="5" wrap="wrap">
        {choices.map(({ value, label }) => (
          <Line key={value}>
            <Tick
              type="checkbox"
              checked={chosen.includes(Number(value))}
              onChange={({ target }) => toggle(Number(value), target.checked)}
            />
            {label}
          </Line>
        ))}
      </Stack>
      {entry.help && (
        <Box color="mute" fontSize="sm">
          {entry.help}
        </Box>
      )}
      {error && (
        <Box role="alert" color="ban" fontSize="sm">
          {error}
        </Box>
      )}
    </chakra.fieldset>
  );
}
