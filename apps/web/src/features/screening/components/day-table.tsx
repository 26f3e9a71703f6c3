import { Box, chakra } from '@chakra-ui/react';
import { SmallTitle } from '../../../components/ui/heading';
import { dayOf } from '../../../lib/format/time';
import type { CalendarDay, DayOfSensor, SeenSensor } from '../types';

const Cell = chakra('td', {
  base: { px: { base: '1', md: '3' }, py: '1', textAlign: 'end', borderTopWidth: '1px', borderColor: 'line' },
});
const Head = chakra('th', {
  base: { px: { base: '1', md: '3' }, py: '1', textAlign: 'end', color: 'mute', fontWeight: '600' },
});

const COLUMNS: readonly { head: string; cell: (day: DayOfSensor) => string | number }[] = [
  { head: 'Expected', cell: ({ expected }) => expected },
  { head: 'Taken', cell: ({ taken }) => taken },
  { head: 'Suspect', cell: ({ suspect }) => suspect },
  { head: 'Failed', cell: ({ failed }) => failed },
  {
    head: 'Usable',
    cell: ({ completenessPercent }) => (completenessPercent === null ? '–' : `${completenessPercent} %`),
  },
];

interface DayTableProps {
  day: CalendarDay;
  sensors: readonly SeenSensor[];
  zone: string;
}

/** The numbers of one day, sensor by sensor. */
export function DayTable({ day, sensors, zone }: DayTableProps) {
  const name = dayOf(day.from, zone);
  return (
    <Box>
      <SmallTitle mb="1">{name}</SmallTitle>
      <Box
        overflowX="auto"
        position="relative"
        maxW="760px"
        tabIndex={0}
        role="region"
        aria-label={`Counts, ${name}`}
      >
        <chakra.table width="100%" fontSize="sm" borderCollapse="collapse">
          <chakra.caption srOnly>Readings of {name}</chakra.caption>
          <thead>
            <tr>
              <Head scope="col" textAlign="start">
                Sensor
              </Head>
              {COLUMNS.map(({ head }) => (
                <Head key={head} scope="col">
                  {head}
                </Head>
              ))}
            </tr>
          </thead>
          <tbody>
            {day.sensors.map((own, k) => (
              <tr key={own.sensorId}>
                <Cell as="th" scope="row" textAlign="start" fontWeight="600">
                  {sensors[k]?.name}
                </Cell>
                {COLUMNS.map(({ head, cell }) => (
                  <Cell key={head}>{cell(own)}</Cell>
                ))}
              </tr>
            ))}
          </tbody>
        </chakra.table>
      </Box>
    </Box>
  );
}
