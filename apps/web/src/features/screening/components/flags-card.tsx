import { Box, Flex, Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { Field } from '../../../components/ui/field';
import { Muted, PartTitle } from '../../../components/ui/heading';
import { Select } from '../../../components/ui/input';
import { Pager } from '../../../components/ui/pager';
import { PlainTable } from '../../../components/ui/plain-table';
import { counted } from '../../../lib/format/number';
import { dayOf } from '../../../lib/format/time';
import { useFlags, type FlagFilter } from '../api';
import { calendarDays, dayAfter, daysEndingWith } from '../days';
import type { FlaggedSpan, Sensor } from '../types';
import type { ReadingsChoice } from '../use-readings-choice';
import { CHECK_NAME } from '../words';
import { QualityMark } from './quality-mark';
import { SpanText } from './span-text';

const ANY: FlagFilter = { check: '', quality: '', sensorId: '' };

interface FlagsCardProps {
  towerId: number;
  sensors: readonly Sensor[];
  zone: string;
  choice: ReadingsChoice;
  /** Shows a span in the chart and chooses it. */
  onShow: (span: FlaggedSpan) => void;
}

/** The spans that checks spoke of in the weeks of the calendar, the newest first. */
export function FlagsCard({ towerId, sensors, zone, choice, onShow }: FlagsCardProps) {
  const [filter, setFilter] = useState(ANY);
  const [page, setPage] = useState(1);
  const weeks = calendarDays(choice.day, choice.today);
  const ends = {
    from: daysEndingWith(weeks.from, 1, zone).from,
    to: daysEndingWith(dayAfter(weeks.to, 0), 1, zone).to,
  };
  const flags = useFlags(towerId, ends, filter, page);
  const change = (changes: Partial<FlagFilter>) => {
    setFilter({ ...filter, ...changes });
    setPage(1);
  };
  const narrowed = Object.values(filter).some((value) => value !== '');
  return (
    <Card padded minW="0">
      <PartTitle mb="2">
        Flagged spans{' '}
        <Muted small fontWeight="400">
          {dayOf(ends.from, zone)} to {dayOf(Date.parse(ends.to) - 1, zone)}
        </Muted>
      </PartTitle>
      <Stack gap="3">
        <FlagFilterBar filter={filter} sensors={sensors} onChange={change} />
        <Loaded from={flags} what="the flagged spans">
          {({ items, total, pageSize }) =>
            items.length === 0 ? (
              <Empty title={narrowed ? 'No such span' : 'No check spoke of these weeks'} />
            ) : (
              <>
                <PlainTable
                  caption="Flagged spans"
                  rows={items}
                  keyOf={({ sensorId, check, from }) => `${sensorId} ${check} ${from}`}
                  columns={[
                    { head: 'Sensor', cell: ({ sensorName }) => <strong>{sensorName}</strong> },
                    { head: 'When', cell: (span) => <SpanText span={span} zone={zone} /> },
                    { head: 'What the check found', cell: (span) => <Found span={span} /> },
                    { head: 'State', cell: (span) => <SpanState span={span} /> },
                    {
                      head: 'Show',
                      cell: (span) => (
                        <Button
                          size="sm"
                          aria-label={`Show ${span.sensorName}, ${CHECK_NAME[span.check]}`}
                          onClick={() => onShow(span)}
                        >
                          Show
                        </Button>
                      ),
                    },
                  ]}
                />
                <Pager page={page} pageSize={pageSize} total={total} what="span" onPage={setPage} />
              </>
            )
          }
        </Loaded>
      </Stack>
    </Card>
  );
}

function Found({ span: { says, readings } }: { span: FlaggedSpan }) {
  return (
    <>
      {says} <Muted small>({counted(readings, 'reading')})</Muted>
    </>
  );
}

function SpanState({ span: { quality, setBy } }: { span: FlaggedSpan }) {
  return (
    <>
      <QualityMark quality={quality} />
      {setBy !== null && (
        <Muted small display="block">
          by {setBy}
        </Muted>
      )}
    </>
  );
}

interface FlagFilterBarProps {
  filter: FlagFilter;
  sensors: readonly Sensor[];
  onChange: (changes: Partial<FlagFilter>) => void;
}

function FlagFilterBar({ filter, sensors, onChange }: FlagFilterBarProps) {
  const bind = (name: keyof FlagFilter) => ({
    value: filter[name],
    onChange: ({ target }: { target: { value: string } }) => onChange({ [name]: target.value }),
  });
  return (
    <Flex gap="3" wrap="wrap" role="search" aria-label="Narrow the flagged spans" data-screen-only>
      <Box minW="150px">
        <Field label="State">
          <Select {...bind('quality')}>
            <option value="">any</option>
            <option value="failed">failed</option>
            <option value="suspect">suspect</option>
          </Select>
        </Field>
      </Box>
      <Box minW="220px">
        <Field label="Check">
          <Select {...bind('check')}>
            <option value="">every check</option>
            {Object.entries(CHECK_NAME).map(([check, name]) => (
              <option key={check} value={check}>
                {name}
              </option>
            ))}
          </Select>
        </Field>
      </Box>
      <Box minW="160px">
        <Field label="Sensor of the spans">
          <Select {...bind('sensorId')}>
            <option value="">all</option>
            {sensors.map(({ id, name }) => (
              <option key={id} value={id}>
                {name}
              </option>
            ))}
          </Select>
        </Field>
      </Box>
    </Flex>
  );
}
