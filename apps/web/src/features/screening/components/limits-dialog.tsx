import { Stack } from '@chakra-ui/react';
import { ChoiceEntry, EntryForm, EntryGrid, NumberEntry, TextEntry } from '../../../components/form';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { Muted } from '../../../components/ui/heading';
import { Message } from '../../../components/ui/message';
import { useEntryForm } from '../../../lib/use-entry-form';
import { setLimits } from '../api';
import type { LevelDifference, SensorLimits } from '../types';

interface Typed {
  lowest?: number | undefined;
  highest?: number | undefined;
  spike?: number | undefined;
  stuckHours?: number | undefined;
  fastChanges: 'on' | 'off';
  steadiness: 'on' | 'off';
  neighbourDifference?: number | undefined;
  riseC?: number | undefined;
  fallC?: number | undefined;
  risePerMetreByDayC?: number | undefined;
  fallPerMetreAtNightC?: number | undefined;
  reason: string;
}

const ON_OFF = [
  { value: 'on', label: 'suspect' },
  { value: 'off', label: 'not checked' },
];
const onOff = (is: boolean) => (is ? 'on' : 'off');

/** All four, or none where all are empty; the API says which one is missing. */
const levelsOf = ({ riseC, fallC, risePerMetreByDayC, fallPerMetreAtNightC }: Typed) => {
  const typed = { riseC, fallC, risePerMetreByDayC, fallPerMetreAtNightC };
  return Object.values(typed).every((value) => value === undefined) ? null : (typed as LevelDifference);
};

/** What is unusual from the level below to this one. */
function LevelEntries() {
  return (
    <Stack gap="2" as="fieldset" border="0" p="0" m="0">
      <Muted as="legend" small mb="2">
        Against the level below: suspect, unless other levels go the same way. All four empty: not checked.
      </Muted>
      <EntryGrid>
        <NumberEntry name="riseC" label="Warmer by over, °C" />
        <NumberEntry name="fallC" label="Colder by over, °C" />
        <NumberEntry name="risePerMetreByDayC" label="Warmer by day by over, °C per m" />
        <NumberEntry name="fallPerMetreAtNightC" label="Colder at night by over, °C per m" />
      </EntryGrid>
    </Stack>
  );
}

interface LimitsDialogProps {
  row: SensorLimits;
  onClose: () => void;
  onChanged: () => void;
}

/** Sets the limits of one sensor's checks; an empty number switches its check off. */
export function LimitsDialog({ row, onClose, onChanged }: LimitsDialogProps) {
  const { sensorId, sensorName, unit, physical, limits, usual } = row;
  const { plausible, spike, stuckHours, neighbourDifference, levelDifference } = limits;
  const entries = useEntryForm<Typed, SensorLimits>({
    entries: {
      ...{ lowest: plausible?.lowest, highest: plausible?.highest },
      ...{ spike: spike ?? undefined, stuckHours: stuckHours ?? undefined },
      ...{ ...levelDifference, neighbourDifference: neighbourDifference ?? undefined },
      ...{ fastChanges: onOff(limits.fastChanges), steadiness: onOff(limits.steadiness), reason: '' },
    },
    perform: (typed) =>
      setLimits(sensorId, {
        plausible:
          typed.lowest === undefined && typed.highest === undefined
            ? null
            : { lowest: typed.lowest ?? physical.lowest, highest: typed.highest ?? physical.highest },
        ...{ spike: typed.spike ?? null, stuckHours: typed.stuckHours ?? null },
        neighbourDifference: typed.neighbourDifference ?? null,
        levelDifference: levelsOf(typed),
        ...{ fastChanges: typed.fastChanges === 'on', steadiness: typed.steadiness === 'on' },
        reason: typed.reason,
      }),
    onDone: () => {
      onChanged();
      onClose();
    },
  });
  return (
    <Dialog
      open
      onClose={onClose}
      title={`Limits of ${sensorName}`}
      footer={<Button onClick={onClose}>Back</Button>}
    >
      <EntryForm entries={entries} act="Set the limits">
        <Stack gap="4">
          <EntryGrid>
            <NumberEntry name="lowest" label={`Lowest expected, ${unit}`} />
            <NumberEntry name="highest" label={`Highest expected, ${unit}`} />
            <NumberEntry name="spike" label={`Spike over, ${unit}`} help="Empty: not checked." />
            <NumberEntry name="stuckHours" label="Stuck after, hours" help="1 to 12; empty: not checked." />
            <ChoiceEntry name="fastChanges" label="Faster than usual" choices={ON_OFF} />
            <ChoiceEntry name="steadiness" label="Steady for hours" choices={ON_OFF} />
            <NumberEntry
              name="neighbourDifference"
              label={`From neighbouring towers by over, ${unit}`}
              help="Empty: not checked."
            />
          </EntryGrid>
          {usual.levelDifference && <LevelEntries />}
          <TextEntry name="reason" label="Why" required help="It is kept with your name." />
          <Message tone="info">
            They hold for the whole record: every reading of the tower is screened anew, and what that changes
            in the findings is said on this page.
          </Message>
        </Stack>
      </EntryForm>
    </Dialog>
  );
}
