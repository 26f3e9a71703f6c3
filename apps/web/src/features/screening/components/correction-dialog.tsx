import { Stack } from '@chakra-ui/react';
import { EntryForm, EntryGrid, NumberEntry, TextEntry } from '../../../components/form';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { Message } from '../../../components/ui/message';
import { fromZonedInput, toZonedInput } from '../../../lib/format/zoned-input';
import { useEntryForm } from '../../../lib/use-entry-form';
import { correctSensor } from '../api';
import type { Sensor } from '../types';

interface Typed {
  offset: number;
  gain: number;
  from: string;
  note: string;
}

interface CorrectionDialogProps {
  sensor: Sensor;
  zone: string;
  onClose: () => void;
  onCorrected: () => void;
}

/** A correction from an instant on; what was measured before it stays as it was. */
export function CorrectionDialog({ sensor, zone, onClose, onCorrected }: CorrectionDialogProps) {
  const { id, name, unit, offset, gain } = sensor;
  const entries = useEntryForm<Typed, Sensor>({
    entries: { offset, gain, from: toZonedInput(Date.now(), zone), note: '' },
    perform: (typed) =>
      correctSensor(id, {
        ...{ offset: typed.offset, gain: typed.gain, note: typed.note },
        from: fromZonedInput(typed.from, zone) ?? '',
      }),
    onDone: () => {
      onCorrected();
      onClose();
    },
  });
  return (
    <Dialog open onClose={onClose} title={`Correct ${name}`} footer={<Button onClick={onClose}>Back</Button>}>
      <EntryForm entries={entries} act="Correct">
        <Stack gap="4">
          <EntryGrid>
            <NumberEntry name="offset" label={`Offset, ${unit}`} required />
            <NumberEntry name="gain" label="Gain" required help="1 where only an offset is needed." />
          </EntryGrid>
          <TextEntry
            name="from"
            type="datetime-local"
            label={`Holds for readings after (${zone})`}
            required
          />
          <TextEntry name="note" label="Why" required help="Such as: compared with the reference, 2 h." />
          <Message tone="info">
            Readings after that instant are corrected anew, up to the next correction if there is one. All
            that depends on them is worked out anew.
          </Message>
        </Stack>
      </EntryForm>
    </Dialog>
  );
}
