import { Box, Flex } from '@chakra-ui/react';
import { useLocation, useNavigate } from 'react-router-dom';
import { paths } from '../../../app/paths';
import { Button } from '../../../components/ui/button';
import { Field } from '../../../components/ui/field';
import { Input, Select } from '../../../components/ui/input';
import { dayAfter } from '../days';
import type { Tower } from '../types';
import { SPANS, type ReadingsChoice } from '../use-readings-choice';

interface ReadingsBarProps {
  towers: readonly Tower[];
  towerId: number;
  choice: ReadingsChoice;
}

/** Which tower and which days are shown, and the way to the next. */
export function ReadingsBar({ towers, towerId, choice }: ReadingsBarProps) {
  const navigate = useNavigate();
  const { search } = useLocation();
  const { day, today, days, change } = choice;
  const later = dayAfter(day, days);
  return (
    <Flex gap="4" wrap="wrap" align="flex-end" data-screen-only>
      <Box minW="180px">
        <Field label="Tower">
          <Select
            value={towerId}
            onChange={({ target }) =>
              void navigate({ pathname: paths.towerReadings(Number(target.value)), search })
            }
          >
            {towers.map(({ id, name, retired }) => (
              <option key={id} value={id}>
                {name}
                {retired ? ' (retired)' : ''}
              </option>
            ))}
          </Select>
        </Field>
      </Box>
      <Box minW="160px">
        <Field label={days === 1 ? 'Day' : 'Last day'}>
          <Input
            type="date"
            value={day}
            max={today}
            onChange={({ target }) => target.value && change({ day: target.value })}
          />
        </Field>
      </Box>
      <Flex gap="1.5">
        <Button onClick={() => change({ day: dayAfter(day, -days) })}>Earlier</Button>
        <Button disabled={day >= today} onClick={() => change({ day: later > today ? today : later })}>
          Later
        </Button>
      </Flex>
      <Flex role="group" aria-label="Span" gap="1.5" wrap="wrap">
        {SPANS.map((span) => (
          <Button
            key={span.days}
            aria-pressed={span.days === days}
            kind={span.days === days ? 'go' : 'plain'}
            onClick={() => change({ days: span.days })}
          >
            {span.label}
          </Button>
        ))}
      </Flex>
    </Flex>
  );
}
