import { Box } from '@chakra-ui/react';
import { PlainTable } from '../../../components/ui/plain-table';
import { Select } from '../../../components/ui/input';
import { Message } from '../../../components/ui/message';
import { chooseSensor, sensorOf, setTwice, setUnit, unitOf } from '../mapping-draft';
import type { Mapping, Proposal, ProposedColumn, Tower } from '../types';
import { UNITS } from '../words';

interface ColumnsTableProps {
  proposal: Proposal;
  tower: Tower;
  draft: Mapping;
  onChange: (draft: Mapping) => void;
}

type ShownColumn = Pick<ProposedColumn, 'name' | 'samples' | 'note' | 'unit'>;

/** Which sensor each column is, and its unit: chosen from the tower's own. Of a long table, each sensor as written. */
export function ColumnsTable({ proposal, tower, draft, onChange }: ColumnsTableProps) {
  const sensors = tower.sensors.filter(({ retired }) => !retired);
  const rows: readonly ShownColumn[] =
    draft.format === 'long'
      ? proposal.written.map((name) => ({ name, samples: [], note: null, unit: null }))
      : proposal.columns.filter(({ name }) => !isTime(draft, name));
  const twice = setTwice(draft);
  const sensorCalled = (name: string | undefined) => sensors.find((sensor) => sensor.name === name);
  return (
    <>
      <PlainTable
        caption="Columns of the file"
        rows={rows}
        keyOf={({ name }) => name}
        columns={[
          {
            head: draft.format === 'long' ? 'Sensor as written' : 'Column',
            cell: ({ name, note }) => (
              <>
                <strong>{name}</strong>
                {note && (
                  <Box color="lid" fontSize="sm">
                    {note}
                  </Box>
                )}
              </>
            ),
          },
          {
            head: 'First values',
            cell: ({ samples }) => (
              <Box as="span" color="mute" fontSize="sm" fontFamily="mono">
                {samples.slice(0, 3).map(short).join('  ')}
              </Box>
            ),
          },
          {
            head: 'Is the sensor',
            cell: ({ name, unit }) => (
              <Select
                aria-label={`Sensor of column ${name}`}
                value={sensorOf(draft, name) ?? ''}
                onChange={({ target }) =>
                  onChange(chooseSensor(draft, name, sensorCalled(target.value), unit))
                }
              >
                <option value="">leave out</option>
                {sensors.map((sensor) => (
                  <option key={sensor.id} value={sensor.name}>
                    {sensor.name} ({sensor.quantity})
                  </option>
                ))}
              </Select>
            ),
          },
          {
            head: 'In',
            cell: ({ name }) => {
              const sensor = sensorCalled(sensorOf(draft, name));
              if (!sensor) return '–';
              return (
                <Select
                  aria-label={`Unit of column ${name}`}
                  value={unitOf(draft, name) ?? ''}
                  onChange={({ target }) => onChange(setUnit(draft, name, target.value))}
                >
                  <option value="">{sensor.unit}</option>
                  {(UNITS[sensor.quantity] ?? []).map((unit) => (
                    <option key={unit} value={unit}>
                      {unit} → {sensor.unit}
                    </option>
                  ))}
                </Select>
              );
            },
          },
        ]}
      />
      {twice.length > 0 && (
        <Message tone="wrong">
          {twice.join(', ')}: two columns are set to the same sensor. Leave one of them out.
        </Message>
      )}
    </>
  );
}

const SHOWN = 12;
const short = (text: string): string => (text.length > SHOWN ? `${text.slice(0, SHOWN)}…` : text);

const isTime = ({ timeColumn, timeColumns }: Mapping, name: string): boolean =>
  timeColumns ? timeColumns.some(({ column }) => column === name) : timeColumn === name;
