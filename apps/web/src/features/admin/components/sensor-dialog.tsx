import { Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { EntryForm, EntryGrid, NumberEntry, TextEntry } from '../../../components/form';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { SmallTitle } from '../../../components/ui/heading';
import { fromZonedInput, toZonedInput } from '../../../lib/format/zoned-input';
import { useAct } from '../../../lib/use-act';
import { useEntryForm } from '../../../lib/use-entry-form';
import { changeSensor, removeSensor, retireSensor } from '../api';
import type { Sensor } from '../types';
import { SensorVersions } from './sensor-versions';

interface Typed {
  name: string;
  heightM: number;
  sigma?: number;
  limits?: number;
  pairSigma?: number;
  offset: number;
  gain: number;
  from: string;
  note: string;
}

interface SensorDialogProps {
  sensor: Sensor;
  zone: string;
  onClose: () => void;
  onChanged: () => void;
}

/** What is true of a sensor from an instant on, what was before, and the ways to set it aside or take it away. */
export function SensorDialog({ sensor, zone, onClose, onChanged }: SensorDialogProps) {
  const { id, name, unit, retired } = sensor;
  const [asked, setAsked] = useState<'delete'>();
  const entries = useEntryForm<Typed, Sensor>({
    entries: {
      ...{ name, heightM: sensor.heightM, offset: sensor.offset, gain: sensor.gain },
      ...{ pairSigma: sensor.pairSigma ?? undefined, from: toZonedInput(Date.now(), zone), note: '' },
    },
    perform: ({ from, ...typed }) => changeSensor(id, { ...typed, from: fromZonedInput(from, zone) ?? '' }),
    onDone: onChanged,
  });
  const act = useAct(async (what: 'retire' | 'delete') => {
    if (what === 'delete') await removeSensor(id);
    else await retireSensor(id, !retired);
    onChanged();
    onClose();
  });
  return (
    <Dialog open onClose={onClose} title={`Sensor ${name}`} footer={<Button onClick={onClose}>Close</Button>}>
      <Stack gap="5">
        <EntryForm entries={entries} act="Hold from then on">
          <EntryGrid>
            <TextEntry name="name" label="Column name" required />
            <NumberEntry name="heightM" label="Above ground, m" required />
            <NumberEntry name="offset" label={`Offset, ${unit}`} required />
            <NumberEntry name="gain" label="Gain" required />
            <NumberEntry name="limits" label={`Limits, ± ${unit}`} help="As the data sheet gives them" />
            <NumberEntry
              name="sigma"
              label={`or one σ, ${unit}`}
              help={`Now ${Number(sensor.sigma.toPrecision(3))}; half of k = 2`}
            />
            <NumberEntry name="pairSigma" label={`σ of a matched pair’s difference, ${unit}`} />
          </EntryGrid>
          <TextEntry
            name="from"
            type="datetime-local"
            label={`Holds for readings after (${zone})`}
            required
          />
          <TextEntry name="note" label="Why" help="Such as: replaced, moved, calibrated." />
        </EntryForm>
        <Stack gap="2">
          <SmallTitle>What held from when</SmallTitle>
          <SensorVersions sensor={sensor} zone={zone} onChanged={onChanged} />
        </Stack>
        <Stack gap="2" align="flex-start">
          <SmallTitle>{retired ? 'It is set aside' : 'No longer in use?'}</SmallTitle>
          <Button busy={act.busy} onClick={() => void act.run('retire')}>
            {retired ? `Use ${name} again` : `Set ${name} aside`}
          </Button>
          <span>Its readings stay; new ones are {retired ? 'taken again' : 'not taken'}.</span>
          <Button
            kind="quiet"
            size="sm"
            busy={act.busy}
            onClick={() => (asked ? void act.run('delete') : setAsked('delete'))}
          >
            {asked ? `Delete ${name} for ever` : 'Made by mistake? Delete it'}
          </Button>
          <Refusal problem={act.problem} />
        </Stack>
      </Stack>
    </Dialog>
  );
}
