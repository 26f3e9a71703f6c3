import { Box } from '@chakra-ui/react';
import { ChoiceEntry, EntryForm, EntryGrid, NumberEntry, TextEntry } from '../../../components/form';
import { Message } from '../../../components/ui/message';
import { useState } from 'react';
import { useEntryForm } from '../../../lib/use-entry-form';
import { enterForecast } from '../api';
import { addDays, dayAfterInWords, nightInWords } from '../days';
import type { Forecast, ForecastInput } from '../types';

const NIGHTS_OFFERED = 4;

interface ForecastFormProps {
  districtId: number;
  /** The night at hand. */
  night: string;
  /** What counts for that night so far. */
  known: Forecast | undefined;
  onEntered: () => void;
}

const entriesOf = (night: string, known: Forecast | undefined) => ({
  ...{ day: night, note: '' },
  ...(known && {
    lowC: known.lowC ?? undefined,
    cloudPercent: known.cloudPercent ?? undefined,
    windMPerS: known.windMPerS ?? undefined,
    highC: known.highC ?? undefined,
    mixingHeightM: known.mixingHeightM ?? undefined,
  }),
});

/** Enters the forecast of a night and the day after. What is left empty is not said. */
export function ForecastForm({ districtId, night, known, onEntered }: ForecastFormProps) {
  const [entered, setEntered] = useState<Forecast>();
  const entries = useEntryForm({
    entries: entriesOf(night, known),
    perform: (typed: Omit<ForecastInput, 'districtId'>) => enterForecast({ ...typed, districtId }),
    onDone: (made) => {
      setEntered(made);
      onEntered();
    },
  });
  const day = entries.form.watch('day');
  return (
    <EntryForm entries={entries} act={known ? 'Enter it anew' : 'Enter the forecast'}>
      <EntryGrid>
        <ChoiceEntry
          name="day"
          label="Night"
          choices={Array.from({ length: NIGHTS_OFFERED }, (_, i) => addDays(night, i)).map((each) => ({
            value: each,
            label: nightInWords(each),
          }))}
        />
        <NumberEntry name="lowC" label="Low of the night, °C" />
        <NumberEntry name="windMPerS" label="Wind of the night, m/s" />
        <NumberEntry name="cloudPercent" label="Cloud of the night, %" />
        <NumberEntry name="highC" label={`High of ${dayAfterInWords(day)}, °C`} />
        <NumberEntry name="mixingHeightM" label={`Mixing height of ${dayAfterInWords(day)}, m`} />
        <TextEntry name="note" label="Note" />
      </EntryGrid>
      <Box color="mute" fontSize="sm">
        It counts from now on, until the next one for the same night; what was entered before stays on the
        record.
      </Box>
      {entered && <Message tone="done">Entered for {nightInWords(entered.day)}.</Message>}
    </EntryForm>
  );
}
