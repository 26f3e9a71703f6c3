import { Box, Flex } from '@chakra-ui/react';
import { Button } from '../../../components/ui/button';
import { Field } from '../../../components/ui/field';
import { Input, Select } from '../../../components/ui/input';
import type { District } from '../../../lib/api/types';
import { SPANS, type SpanName } from '../spans';

interface SpanBarProps {
  districts: District[];
  chosen: District;
  name: SpanName;
  from: string;
  to: string;
  /** What is wrong with the dates, if anything. */
  error: string | undefined;
  onChange: (changes: Record<string, string>) => void;
}

/** Which district and which span are shown. */
export function SpanBar({ districts, chosen, name, from, to, error, onChange }: SpanBarProps) {
  return (
    <Flex gap="4" wrap="wrap" align="flex-end" data-screen-only>
      <Box minW="180px">
        <Field label="District">
          <Select value={chosen.slug} onChange={({ target }) => onChange({ district: target.value })}>
            {districts.map(({ slug, name: districtName }) => (
              <option key={slug} value={slug}>
                {districtName}
              </option>
            ))}
          </Select>
        </Field>
      </Box>
      <Flex role="group" aria-label="Span" gap="1.5" wrap="wrap">
        {SPANS.map((span) => (
          <Button
            key={span.name}
            aria-pressed={span.name === name}
            kind={span.name === name ? 'go' : 'plain'}
            onClick={() => onChange({ span: span.name })}
          >
            {span.label}
          </Button>
        ))}
      </Flex>
      {name === 'dates' && (
        <Flex gap="3" align="flex-start">
          <Field label="From" error={error}>
            <Input type="date" value={from} onChange={({ target }) => onChange({ from: target.value })} />
          </Field>
          <Field label="To">
            <Input type="date" value={to} onChange={({ target }) => onChange({ to: target.value })} />
          </Field>
        </Flex>
      )}
    </Flex>
  );
}
