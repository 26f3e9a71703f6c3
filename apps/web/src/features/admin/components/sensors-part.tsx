import { Box } from '@chakra-ui/react';
import { useState } from 'react';
import { Empty } from '../../../components/states/empty';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { PlainTable } from '../../../components/ui/plain-table';
import { dateAndTime } from '../../../lib/format/time';
import type { Sensor, Tower } from '../types';
import { SensorDialog } from './sensor-dialog';
import { SensorForm } from './sensor-form';

interface SensorsPartProps {
  tower: Tower;
  zone: string;
  onChanged: () => void;
}

/** A tower's sensors with height and uncertainty, a way to change each from an instant on, and a form for one more. */
export function SensorsPart({ tower, zone, onChanged }: SensorsPartProps) {
  const [asked, setAsked] = useState<number>();
  const chosen = tower.sensors.find(({ id }) => id === asked);
  const since = ({ versions }: Sensor): string => {
    const from = versions.at(-1)?.from;
    return from ? dateAndTime(from, zone) : 'the beginning';
  };
  return (
    <Card padded>
      <PartTitle mb="3">Sensors</PartTitle>
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
            { head: 'Holds from', cell: since },
            { head: 'State', cell: ({ retired }) => (retired ? 'set aside' : 'in use') },
            {
              head: 'Change',
              cell: ({ id, name }) => (
                <Button size="sm" onClick={() => setAsked(id)} aria-label={`Change ${name}`}>
                  Change…
                </Button>
              ),
            },
          ]}
        />
      )}
      <Box mt="4">
        <SensorForm towerId={tower.id} onAdded={onChanged} />
      </Box>
      {chosen && (
        <SensorDialog sensor={chosen} zone={zone} onClose={() => setAsked(undefined)} onChanged={onChanged} />
      )}
    </Card>
  );
}
