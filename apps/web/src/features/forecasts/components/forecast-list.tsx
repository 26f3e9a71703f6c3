import { Box } from '@chakra-ui/react';
import { Empty } from '../../../components/states/empty';
import { PlainTable } from '../../../components/ui/plain-table';
import { dateAndTime } from '../../../lib/format/time';
import { nightInWords } from '../days';
import type { Forecast } from '../types';
import { difference, mixingInWords, number } from '../words';

function Both({ said, came }: { said: number | null; came: number | null | undefined }) {
  const off = difference(said, came ?? null);
  return (
    <>
      {number(said)}
      {came !== undefined && (
        <Box as="span" color="mute">
          {' '}
          → {number(came)}
          {off && ` (${off})`}
        </Box>
      )}
    </>
  );
}

/** The forecasts of some days; behind the arrow what it turned out to be, and in brackets forecast minus outcome. */
export function ForecastList({ forecasts, zone }: { forecasts: Forecast[]; zone: string }) {
  if (forecasts.length === 0) {
    return <Empty title="No forecast yet">Enter tonight’s above, or bring a table.</Empty>;
  }
  return (
    <PlainTable
      caption="Forecasts and what came of them"
      rows={forecasts}
      keyOf={({ id }) => id}
      columns={[
        { head: 'Night', cell: ({ day }) => <strong>{nightInWords(day)}</strong> },
        { head: 'Low, °C', cell: ({ lowC, outcome }) => <Both said={lowC} came={outcome?.lowC} /> },
        {
          head: 'Wind, m/s',
          cell: ({ windMPerS, outcome }) => <Both said={windMPerS} came={outcome?.windMPerS} />,
        },
        { head: 'Cloud, %', cell: ({ cloudPercent }) => number(cloudPercent, 0) },
        { head: 'High, °C', cell: ({ highC, outcome }) => <Both said={highC} came={outcome?.highC} /> },
        {
          head: 'Mixing, m',
          cell: ({ mixingHeightM, outcome }) => (
            <>
              {number(mixingHeightM, 0)}
              {outcome && (
                <Box as="span" color="mute">
                  {' '}
                  → {mixingInWords(outcome)}
                </Box>
              )}
            </>
          ),
        },
        {
          head: 'Entered',
          cell: ({ enteredAt, by, entries, note }) => (
            <Box as="span" fontSize="sm">
              {dateAndTime(enteredAt, zone)}
              {by ? `, ${by}` : ''}
              {entries > 1 ? `; ${entries} entries` : ''}
              {note ? `: ${note}` : ''}
            </Box>
          ),
        },
      ]}
    />
  );
}
