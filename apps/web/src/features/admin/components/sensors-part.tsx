import { Box } from '@chakra-ui/react';
import { Empty } from '../../../components/states/empty';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { PlainTable } from '../../../components/ui/plain-table';
import { useAct } from '../../../lib/use-act';
import { retireSensor } from '../api';
import type { Sensor, Tower } from '../types';
import { SensorForm } from './sensor-form';

/** A tower's sensors with height and uncertainty, and a form for one more. */
export function SensorsPart({ tower, onChanged }: { tower: Tower; onChanged: () => void }) {
  const { run, problem } = useAct(async (id: number) => {
    await retireSensor(id);
    onChanged();
  });
  const setAside = ({ id, name, retired }: Sensor) =>
    retired ? (
      'set aside'
    ) : (
      <Button size="sm" onClick={() => void run(id)} aria-label={`Set aside ${name}`}>
        Set aside
      </Button>
    );
  return (
    <Card padded>
      <PartTitle mb="3">Sensors</PartTitle>
      <Refusal problem={problem} />
      {tower.sensors.length === 0 ? (
        <Empty title="No sensor yet">
          A surface inversion needs air temperature at two heights at least.
        </Empty>
      ) : (
        <PlainTable
          caption="Sensors"
          rows={tower.sensors}
          keyOf={({ id }) => id}
          columns={[
            { head: 'Column name', cell: ({ name }) => <strong>{name}</strong> },
            { head: 'Measures', cell: ({ quantity, unit }) => `${quantity}${unit && `, ${unit}`}` },
            { head: 'Height, m', cell: ({ heightM }) => heightM, numeric: true },
            { head: 'σ', cell: ({ sigma }) => Number(sigma.toPrecision(3)), numeric: true },
            { head: 'Gain, offset', cell: ({ gain, offset }) => `${gain}, ${offset}`, numeric: true },
            { head: 'State', cell: setAside },
          ]}
        />
      )}
      <Box mt="4">
        <SensorForm towerId={tower.id} onAdded={onChanged} />
      </Box>
    </Card>
  );
}
