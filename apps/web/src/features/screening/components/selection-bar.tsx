import { Box, Flex } from '@chakra-ui/react';
import { Button } from '../../../components/ui/button';
import { Field } from '../../../components/ui/field';
import { Input, Select } from '../../../components/ui/input';
import { NOTHING, selectedEnds, type Selection } from '../selection';
import type { Said, SeenSensor } from '../types';

interface SelectionBarProps {
  sensors: readonly SeenSensor[];
  selection: Selection;
  zone: string;
  onChange: (selection: Selection) => void;
  onSay: (said: Said) => void;
}

/** The span that is to be set: sensor, first and last reading, and what to say of it. */
export function SelectionBar({ sensors, selection, zone, onChange, onSay }: SelectionBarProps) {
  const ends = selectedEnds(selection, zone);
  const wrong =
    selection.from && selection.to && !ends ? 'The last must not lie before the first.' : undefined;
  const change = (changes: Partial<Selection>) =>
    onChange({ ...selection, sensorId: selection.sensorId ?? sensors[0]?.sensorId, ...changes });
  return (
    <Flex as="fieldset" gap="3" wrap="wrap" align="flex-end" border="0" p="0" m="0" data-screen-only>
      <Box as="legend" color="mute" fontSize="sm" p="0" mb="1">
        Choose a span: draw over the chart, take one from the list below, or type its ends.
      </Box>
      <Box minW="150px">
        <Field label="Sensor">
          <Select
            value={selection.sensorId ?? sensors[0]?.sensorId}
            onChange={({ target }) => change({ sensorId: Number(target.value) })}
          >
            {sensors.map(({ sensorId, name }) => (
              <option key={sensorId} value={sensorId}>
                {name}
              </option>
            ))}
          </Select>
        </Field>
      </Box>
      <Box minW="210px">
        <Field label="First reading" error={wrong}>
          <Input
            type="datetime-local"
            value={selection.from}
            onChange={({ target }) => change({ from: target.value })}
          />
        </Field>
      </Box>
      <Box minW="210px">
        <Field label="Last reading">
          <Input
            type="datetime-local"
            value={selection.to}
            onChange={({ target }) => change({ to: target.value })}
          />
        </Field>
      </Box>
      <Flex gap="1.5" wrap="wrap">
        <Button kind="go" disabled={!ends} onClick={() => onSay('failed')}>
          Set aside…
        </Button>
        <Button disabled={!ends} onClick={() => onSay('valid')}>
          Set right…
        </Button>
        {ends && (
          <Button kind="quiet" onClick={() => onChange(NOTHING)}>
            Choose nothing
          </Button>
        )}
      </Flex>
    </Flex>
  );
}
