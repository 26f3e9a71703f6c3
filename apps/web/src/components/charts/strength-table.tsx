import { Box, chakra } from '@chakra-ui/react';
import { RangeText } from '../ui/range-text';
import type { DistrictHistory } from '../../lib/api/types';
import { decimal } from '../../lib/format/number';
import { dateAndTime } from '../../lib/format/time';
import { isInSteps } from './strength-series';

const Cell = chakra('td', {
  base: { px: '3', py: '1', textAlign: 'end', borderTopWidth: '1px', borderColor: 'line' },
});
const Head = chakra('th', {
  base: { px: '3', py: '1', textAlign: 'end', color: 'mute', bg: 'card', position: 'sticky', top: '0' },
});

const degrees = (value: number | null): string => (value === null ? 'not known' : decimal(value));

/** The numbers behind the chart, every one of them. */
export function StrengthTable({ history, name }: { history: DistrictHistory; name: string }) {
  const inSteps = isInSteps(history);
  return (
    <Box
      maxH="340px"
      overflow="auto"
      tabIndex={0}
      role="region"
      aria-label={`Strength in ${name} as a table`}
    >
      <chakra.table width="100%" fontSize="sm" borderCollapse="collapse">
        <thead>
          <tr>
            <Head textAlign="start">Time ({history.timeZone})</Head>
            <Head>Strength °C</Head>
            <Head>{inSteps ? 'Strongest within the tower °C' : 'Within the tower °C'}</Head>
            {inSteps && <Head>Lowest within the tower °C</Head>}
            <Head>Sure</Head>
          </tr>
        </thead>
        <tbody>
          {history.points.map((point) => (
            <tr key={point.t}>
              <Cell textAlign="start">{dateAndTime(point.t, history.timeZone)}</Cell>
              <Cell>
                <RangeText value={point.strength} />
              </Cell>
              <Cell>{degrees(point.within)}</Cell>
              {inSteps && <Cell>{degrees(point.lowest ?? null)}</Cell>}
              <Cell>{point.sure === 'not known' ? 'not known' : point.sure === 'true' ? 'yes' : 'no'}</Cell>
            </tr>
          ))}
        </tbody>
      </chakra.table>
    </Box>
  );
}
