import { Box, chakra } from '@chakra-ui/react';
import { decimal } from '../../../lib/format/number';
import { dateAndTime } from '../../../lib/format/time';
import type { RawReading, RawSeries } from '../types';
import { CHECK_NAME, QUALITY_NAME } from '../words';

const Cell = chakra('td', {
  base: { px: '3', py: '1', textAlign: 'end', borderTopWidth: '1px', borderColor: 'line' },
});
const Head = chakra('th', {
  base: { px: '3', py: '1', textAlign: 'end', color: 'mute', bg: 'card', position: 'sticky', top: '0' },
});

const said = ({ value, quality, checks = [] }: RawReading): string => {
  const flagged = quality === 'valid' && checks.length === 0 ? [] : [QUALITY_NAME[quality]];
  return [decimal(value, 2), ...flagged, ...checks.map((check) => CHECK_NAME[check])].join(', ');
};

const Open = chakra('button', {
  base: {
    color: 'air',
    textDecoration: 'underline',
    textUnderlineOffset: '3px',
    minH: '6',
    cursor: 'pointer',
  },
});

interface RawTableProps {
  shown: readonly RawSeries[];
  zone: string;
  /** A reading is to be opened. */
  onOpen: (reading: { sensorId: number; t: string }) => void;
}

/** The readings behind the chart, a row each time; each opens. */
export function RawTable({ shown, zone, onOpen }: RawTableProps) {
  const byTime = shown.map(({ points }) => new Map(points.map((reading) => [reading.t, reading])));
  const times = [...new Set(shown.flatMap(({ points }) => points.map(({ t }) => t)))].sort();
  return (
    <Box maxH="380px" overflow="auto" tabIndex={0} role="region" aria-label="Readings as a table">
      <chakra.table width="100%" fontSize="sm" borderCollapse="collapse">
        <thead>
          <tr>
            <Head textAlign="start" scope="col">
              Time ({zone})
            </Head>
            {shown.map(({ sensorId, name, unit }) => (
              <Head key={sensorId} scope="col">
                {name}, {unit}
              </Head>
            ))}
          </tr>
        </thead>
        <tbody>
          {times.map((t) => (
            <tr key={t}>
              <Cell textAlign="start">{dateAndTime(t, zone)}</Cell>
              {byTime.map((readings, k) => {
                const reading = readings.get(t);
                const { sensorId } = shown[k]!;
                return (
                  <Cell key={sensorId}>
                    {reading && (
                      <Open type="button" onClick={() => onOpen({ sensorId, t })}>
                        {said(reading)}
                      </Open>
                    )}
                  </Cell>
                );
              })}
            </tr>
          ))}
        </tbody>
      </chakra.table>
    </Box>
  );
}
