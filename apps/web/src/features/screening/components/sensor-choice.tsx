import { Box, chakra, Flex } from '@chakra-ui/react';
import { Field } from '../../../components/ui/field';
import { Select } from '../../../components/ui/input';
import { colorVar } from '../../../theme/palette';
import { lineColor } from '../raw-datasets';
import type { SeenSensor } from '../types';

const Line = chakra('label', { base: { display: 'inline-flex', gap: '2', alignItems: 'center', minH: '8' } });
const Tick = chakra('input', { base: { width: '20px', height: '20px', accentColor: 'air', margin: 0 } });

interface SensorChoiceProps {
  /** Every sensor of the tower. */
  sensors: readonly SeenSensor[];
  quantity: SeenSensor['quantity'];
  /** Sensors of the quantity that are left out of the chart. */
  hidden: ReadonlySet<number>;
  onQuantity: (quantity: string) => void;
  onHide: (sensorId: number, hide: boolean) => void;
}

/** Which quantity the chart shows, and which of its sensors. */
export function SensorChoice({ sensors, quantity, hidden, onQuantity, onHide }: SensorChoiceProps) {
  const quantities = [...new Set(sensors.map((sensor) => sensor.quantity))];
  const own = sensors.filter((sensor) => sensor.quantity === quantity);
  return (
    <Flex gap="4" wrap="wrap" align="flex-end" data-screen-only>
      {quantities.length > 1 && (
        <Box minW="180px">
          <Field label="Quantity">
            <Select value={quantity} onChange={({ target }) => onQuantity(target.value)}>
              {quantities.map((each) => (
                <option key={each}>{each}</option>
              ))}
            </Select>
          </Field>
        </Box>
      )}
      {own.length > 1 && (
        <Flex role="group" aria-label="Sensors shown" columnGap="4" wrap="wrap">
          {own.map(({ sensorId, name }, line) => (
            <Line key={sensorId}>
              <Tick
                type="checkbox"
                checked={!hidden.has(sensorId)}
                onChange={({ target }) => onHide(sensorId, !target.checked)}
              />
              <svg width="18" height="6" aria-hidden="true">
                <path d="M0 3h18" stroke={colorVar(lineColor(line))} strokeWidth="3" />
              </svg>
              {name}
            </Line>
          ))}
        </Flex>
      )}
    </Flex>
  );
}
