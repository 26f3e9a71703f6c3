import { Box } from '@chakra-ui/react';
import { useFormContext } from 'react-hook-form';
import { ChoiceEntry, EntryGrid, NumberEntry, TextEntry } from '../../../components/form';
import type { SourceEntries } from './source-entries';

const FORMATS = [
  { value: 'wide', label: 'wide: a column per sensor' },
  { value: 'long', label: 'long: time, sensor, value' },
];
const TIME_FORMS = [
  { value: 'iso', label: '2026-01-31 05:10' },
  { value: 'day/month/year', label: '31/01/2026 05:10' },
  { value: 'month/day/year', label: '01/31/2026 05:10' },
  { value: 'epoch-seconds', label: 'seconds since 1970 (UTC)' },
  { value: 'epoch-milliseconds', label: 'milliseconds since 1970 (UTC)' },
];
const DECIMALS = [
  { value: '.', label: '-3.2' },
  { value: ',', label: '-3,2' },
];
const STAMPS = [
  { value: 'end', label: 'end of the interval' },
  { value: 'start', label: 'beginning of the interval' },
  { value: 'middle', label: 'middle of the interval' },
  { value: 'instant', label: 'instant of the reading' },
];
const REPEATED = [
  { value: 'refuse', label: 'refuse its rows' },
  { value: 'first', label: 'the first of the two' },
  { value: 'second', label: 'the second of the two' },
  { value: 'in-order', label: 'by the order of the rows' },
];
const MISSING_HOUR = [
  { value: 'refuse', label: 'refuse its rows' },
  { value: 'later', label: 'an hour later' },
];

/** Entries that are folded away; they are unfolded where one of them is wrong. */
const FOLDED = ['headerRow', 'firstDataRow', 'clock', 'columns', 'units'] as const;

/** How a source's files are laid out: first what differs often, the rest folded away. */
export function LayoutEntries({ severalTimeColumns }: { severalTimeColumns: boolean }) {
  const { watch, formState } = useFormContext<SourceEntries>();
  const isLong = watch('format') === 'long';
  const isWrong = FOLDED.some((name) => formState.errors[name] !== undefined);
  const timeHelp = severalTimeColumns ? 'Kept: the time stands in several columns' : undefined;
  return (
    <>
      <EntryGrid>
        <ChoiceEntry name="format" label="Layout" choices={FORMATS} />
        <TextEntry name="separator" label="Separator" help="One character, tab, or blank" required />
        <TextEntry name="timeColumn" label="Column with the time" help={timeHelp} required />
        <ChoiceEntry name="timeForm" label="Time is written as" choices={TIME_FORMS} />
        {isLong && <TextEntry name="sensorColumn" label="Column with the sensor" required />}
        {isLong && <TextEntry name="valueColumn" label="Column with the value" required />}
        <TextEntry name="missing" label="Written for no reading" help="Several: with blanks between" />
      </EntryGrid>
      <details open={isWrong || undefined}>
        <Box as="summary" cursor="pointer" fontWeight="600" py="1">
          More about the layout
        </Box>
        <Box mt="3">
          <EntryGrid>
            <ChoiceEntry name="decimal" label="Numbers are written as" choices={DECIMALS} />
            <NumberEntry name="headerRow" label="Row of the header" help="0: none; empty: the first line" />
            <NumberEntry name="firstDataRow" label="Row of the first reading" help="If lines stand between" />
            <TextEntry
              name="clock"
              label="Its clock"
              help="UTC, −07:00 or America/Boise; empty: the tower’s"
            />
            <ChoiceEntry name="stamp" label="Its stamps mean" choices={STAMPS} none="as the tower’s" />
            <ChoiceEntry name="repeatedHour" label="Hour that comes twice in autumn" choices={REPEATED} />
            <ChoiceEntry name="missingHour" label="Hour left out in spring" choices={MISSING_HOUR} />
            <TextEntry
              name="columns"
              label="Columns with other names"
              help="A line each: column = sensor"
              lines={3}
              mono
            />
            <TextEntry
              name="units"
              label="Columns in other units"
              help="A line each: column = °F, K, mph, kPa, …"
              lines={3}
              mono
            />
          </EntryGrid>
        </Box>
      </details>
    </>
  );
}
