import { Box, Stack } from '@chakra-ui/react';
import { Message } from '../../../components/ui/message';
import { PlainTable } from '../../../components/ui/plain-table';
import { SmallTitle } from '../../../components/ui/heading';
import { count, counted } from '../../../lib/format/number';
import { dateAndTime } from '../../../lib/format/time';
import type { Preview } from '../types';

const DIGITS = 3;
/** Above this hardly any air was ever, °C; air said to be warmer mostly is in °F. */
const DOUBTFUL_C = 45;
const SHOWN_ROWS = 6;
const SHOWN_REFUSED = 10;

type PreviewRow = Preview['rows'][number];

const shown = (value: number): string => String(Number(value.toFixed(DIGITS))).replace('-', '−');

/** What importing would give: how much, from when to when, the first rows as they are read, and what is refused. */
export function PreviewPart({ preview, zone }: { preview: Preview; zone: string }) {
  const doubtful = preview.spans.filter(({ unit, highest }) => unit === '°C' && highest > DOUBTFUL_C);
  const rest = preview.refused - Math.min(preview.refused, SHOWN_REFUSED);
  return (
    <Stack gap="4">
      <p>
        <strong>{counted(preview.read, 'reading')}</strong>
        {preview.whole
          ? ''
          : ' in the first part of the file (it is large: the rest is read when it is imported)'}
        , {preview.refused === 0 ? 'no row refused' : `${counted(preview.refused, 'row')} refused`}.
        {preview.ignoredColumns.length > 0 && ` Left out: ${preview.ignoredColumns.join(', ')}.`}
      </p>
      {preview.warnings.length > 0 && (
        <Message tone="warn" title="This looks wrong beside the tower’s own readings">
          {preview.warnings.map((warning) => (
            <p key={warning}>{warning}</p>
          ))}
        </Message>
      )}
      {preview.spans.length > 0 && (
        <PlainTable
          caption="What each sensor would get"
          rows={preview.spans}
          keyOf={({ sensor }) => sensor}
          columns={[
            { head: 'Sensor', cell: ({ sensor }) => sensor },
            { head: 'From', cell: ({ from }) => dateAndTime(from, zone) },
            { head: 'To', cell: ({ to }) => dateAndTime(to, zone) },
            { head: 'Readings', cell: (span) => count(span.count), numeric: true },
            { head: 'Lowest', cell: ({ lowest, unit }) => `${shown(lowest)} ${unit}`, numeric: true },
            { head: 'Highest', cell: ({ highest, unit }) => `${shown(highest)} ${unit}`, numeric: true },
          ]}
        />
      )}
      {doubtful.length > 0 && (
        <Message tone="warn" title="Is this °F?">
          {doubtful.map(({ sensor, highest }) => `${sensor} up to ${shown(highest)} °C`).join(', ')}: hardly
          any air is that warm. If the file is in °F, choose it under “In” above.
        </Message>
      )}
      {preview.rows.length > 0 && (
        <Box>
          <SmallTitle mb="1">The first rows as they are read</SmallTitle>
          <PlainTable
            caption="The first rows as they are read"
            rows={preview.rows.slice(0, SHOWN_ROWS)}
            keyOf={({ rowNo, time }) => `${rowNo} ${time}`}
            columns={[
              { head: 'Row', cell: ({ rowNo }) => rowNo },
              { head: 'End of the interval', cell: ({ time }) => dateAndTime(time, zone) },
              ...(zone === 'UTC'
                ? []
                : [{ head: 'In UTC', cell: ({ time }: PreviewRow) => dateAndTime(time, 'UTC') }]),
              {
                head: 'Values',
                cell: ({ values }) =>
                  values.map(({ sensor, value, unit }) => `${sensor} ${shown(value)} ${unit}`).join(' · '),
              },
            ]}
          />
        </Box>
      )}
      {preview.refusedRows.length > 0 && (
        <Message tone="warn" title={`${counted(preview.refused, 'row')} would be refused`}>
          <ul>
            {preview.refusedRows.slice(0, SHOWN_REFUSED).map(({ text }, i) => (
              <li key={i}>{text}</li>
            ))}
          </ul>
          {rest > 0 && `And ${count(rest)} more; all of them can be downloaded after the import.`}
        </Message>
      )}
    </Stack>
  );
}
