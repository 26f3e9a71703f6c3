import { ChoiceEntry, EntryForm, EntryGrid, NumberEntry, TextEntry } from '../../../components/form';
import { useEntryForm } from '../../../lib/use-entry-form';
import { addSensor } from '../api';
import { QUANTITIES } from '../types';

const EMPTY = { name: '', quantity: 'air temperature' };

/** Adds a sensor: what it measures, how high, and how far it may be off by its data sheet. */
export function SensorForm({ towerId, onAdded }: { towerId: number; onAdded: () => void }) {
  const entries = useEntryForm({
    entries: EMPTY,
    perform: (typed: object) => addSensor(towerId, typed),
    onDone: (_, form) => {
      form.reset(EMPTY);
      onAdded();
    },
  });
  return (
    <EntryForm entries={entries} act="Add the sensor">
      <EntryGrid>
        <TextEntry name="name" label="Column name" help="As in the logger’s file" required />
        <ChoiceEntry
          name="quantity"
          label="Measures"
          choices={QUANTITIES.map((quantity) => ({ value: quantity, label: quantity }))}
        />
        <NumberEntry name="heightM" label="Above ground, m" required />
        <NumberEntry name="limits" label="Limits, ±" help="As the data sheet gives them, in the unit" />
        <NumberEntry name="sigma" label="or one standard deviation" help="Give one of the two" />
      </EntryGrid>
    </EntryForm>
  );
}
