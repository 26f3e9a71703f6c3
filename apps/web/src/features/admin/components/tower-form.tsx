import { useNavigate } from 'react-router-dom';
import { paths } from '../../../app/paths';
import { ChoiceEntry, EntryForm, EntryGrid, NumberEntry, TextEntry } from '../../../components/form';
import { useEntryForm } from '../../../lib/use-entry-form';
import { addTower, changeTower } from '../api';
import type { Tower } from '../types';

const STAMPS = [
  { value: 'end', label: 'the end of the interval' },
  { value: 'start', label: 'its start' },
  { value: 'middle', label: 'its middle' },
  { value: 'instant', label: 'an instant' },
];
const SCREENINGS = [
  { value: 'full', label: 'leave failed readings out' },
  { value: 'report-only', label: 'report only' },
];
const FORMS = [
  { value: 'sensor-aware', label: 'by what the sensors can tell apart' },
  { value: 'plain', label: 'by the plain numbers' },
];

interface TowerFormProps {
  /** The tower to change; a new one when left out. */
  tower?: Tower;
  onSaved: () => void;
}

/** A tower's place, its logger's cadence and clock, and how its readings are judged. */
export function TowerForm({ tower, onSaved }: TowerFormProps) {
  const navigate = useNavigate();
  const entries = useEntryForm({
    entries: tower
      ? settingsOf(tower)
      : { name: '', clock: 'UTC', stamp: 'end', screening: 'full', inversionForm: 'sensor-aware' },
    perform: (typed: object) =>
      tower ? changeTower(tower.id, { ...typed, version: tower.version }) : addTower(typed),
    onDone: async (saved) => {
      onSaved();
      if (!tower) await navigate(paths.adminTower(saved.id));
    },
  });
  return (
    <EntryForm entries={entries} act={tower ? 'Save the tower' : 'Add the tower'}>
      <EntryGrid>
        <TextEntry name="name" label="Name" required />
        <NumberEntry name="elevationM" label="Ground above sea level, m" required />
        <NumberEntry name="latitude" label="Latitude, °" help="North is positive" required />
        <NumberEntry name="longitude" label="Longitude, °" help="East is positive" required />
        <NumberEntry name="intervalMinutes" label="A reading every, min" required />
        <NumberEntry
          name="blockMinutes"
          label="Averaged over, min"
          help="Empty: 15 where the interval fits"
        />
        <NumberEntry name="staleLimitMinutes" label="Silent after, min" help="Empty: 45, or 2.5 intervals" />
        <TextEntry name="clock" label="The logger’s clock" help="UTC, −07:00 or America/Denver" required />
        <ChoiceEntry name="stamp" label="A stamp means" choices={STAMPS} />
        <ChoiceEntry name="screening" label="Screening" choices={SCREENINGS} />
        <ChoiceEntry name="inversionForm" label="Inversions are found" choices={FORMS} />
        <NumberEntry
          name="embedDepthM"
          label="Pass over thinner layers, m"
          help="Within an inversion; 0 for towers"
        />
      </EntryGrid>
    </EntryForm>
  );
}

function settingsOf(tower: Tower) {
  const { name, elevationM, latitude, longitude, intervalMinutes, blockMinutes, staleLimitMinutes } = tower;
  const { clock, stamp, screening, inversionForm, embedDepthM } = tower;
  return {
    ...{ name, elevationM, latitude, longitude, intervalMinutes, blockMinutes, staleLimitMinutes },
    ...{ clock, stamp, screening, inversionForm, embedDepthM },
  };
}
