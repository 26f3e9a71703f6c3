import { Box } from '@chakra-ui/react';
import { EntryForm, EntryGrid, NumberEntry, TextEntry } from '../../../components/form';
import { Field } from '../../../components/ui/field';
import { Select } from '../../../components/ui/input';
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
  /** What counts so far, by night. */
  known: (day: string) => Forecast | undefined;
  onEntered: () => void;
}

const entriesOf = (day: string, known: Forecast | undefined) => ({
  ...{ day, note: '' },
  lowC: known?.lowC ?? undefined,
  cloudPercent: known?.cloudPercent ?? undefined,
  windMPerS: known?.windMPerS ?? undefined,
  highC: known?.highC ?? undefined,
  mixingHeightM: known?.mixingHeightM ?? undefined,
});

/** Enters the forecast of a night and the day after. What is left empty is not said. */
export function ForecastForm({ districtId, night, known, onEntered }: ForecastFormProps) {
  const [entered, setEntered] = useState<Forecast>();
  const entries = useEntryForm({
    entries: entriesOf(night, known(night)),
    perform: (typed: Omit<ForecastInput, 'districtId'>) => enterForecast({ ...typed, districtId }),
    onDone: (made) => {
      setEntered(made);
      onEntered();
    },
  });
  const { form } = entries;
  const day = form.watch('day');
  // Another night begins with what counts for it: tonight's numbers are not another night's.
  const turnTo = (next: string) => {
    setEntered(undefined);
    form.reset(entriesOf(next, known(next)));
  };
  return (
    <EntryForm entries={entries} act={known(day) ? 'Enter it anew' : 'Enter the forecast'}>
      <EntryGrid>
        <Field label="Night">
          <Select value={day} onChange={({ target }) => turnTo(target.value)}>
            {Array.from({ length: NIGHTS_OFFERED }, (_, i) => addDays(night, i)).map((each) => (
              <option key={each} value={each}>
                {nightInWords(each)}
              </option>
            ))}
          </Select>
        </Field>
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
