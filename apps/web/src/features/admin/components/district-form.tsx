import {
  ChecksEntry,
  ChoiceEntry,
  EntryForm,
  EntryGrid,
  NumberEntry,
  TextEntry,
} from '../../../components/form';
import { useEntryForm } from '../../../lib/use-entry-form';
import { addDistrict, changeDistrict } from '../api';
import type { District, Tower } from '../types';

const COMBINATIONS = [
  { value: 'first-fresh', label: 'the first that is fresh' },
  { value: 'any', label: 'the strongest of all' },
  { value: 'all', label: 'the weakest of all' },
  { value: 'median', label: 'the median' },
];

/** A district's form: its towers as chosen ids, in the order of the list. */
type Entries = Omit<District, 'id' | 'slug' | 'version' | 'towers'> & { towerIds: number[] };

interface DistrictFormProps {
  /** The district to change; a new one when left out. */
  district: District | undefined;
  towers: readonly Tower[];
  onSaved: () => void;
}

/** A district's place and zone, the towers that speak for it, and what its notices name. */
export function DistrictForm({ district, towers, onSaved }: DistrictFormProps) {
  const entries = useEntryForm({
    entries: district ? settingsOf(district) : { combine: 'first-fresh' as const, towerIds: [] },
    perform: (typed: Entries) => {
      const { towerIds, ...fields } = typed;
      const before = new Map(district?.towers.map((each) => [each.towerId, each]));
      const speaking = towerIds.map((id) => before.get(id) ?? { towerId: id, mayBegin: true, mayEnd: true });
      const wanted = { ...fields, towers: speaking };
      return district
        ? changeDistrict(district.id, { ...wanted, version: district.version })
        : addDistrict(wanted);
    },
    onDone: (_, form) => {
      form.reset();
      onSaved();
    },
  });
  const choices = towers.map(({ id, name }) => ({ value: id, label: name }));
  return (
    <EntryForm entries={entries} act={district ? 'Save the district' : 'Add the district'}>
      <EntryGrid>
        <TextEntry name="name" label="Name" required />
        <TextEntry name="timeZone" label="Time zone" help="Such as America/Denver" required />
        <NumberEntry name="latitude" label="Latitude, °" help="North is positive" required />
        <NumberEntry name="longitude" label="Longitude, °" help="East is positive" required />
        <NumberEntry name="elevationM" label="Ground above sea level, m" />
        <NumberEntry name="population" label="People" />
        <TextEntry name="ordinanceRef" label="Ordinance" help="As notices name it" />
        <TextEntry name="contactPhone" label="Telephone" help="Empty: the office’s" />
      </EntryGrid>
      <ChecksEntry name="towerIds" label="Towers that speak for it" choices={choices} />
      <EntryGrid>
        <ChoiceEntry name="combine" label="Who of them counts" choices={COMBINATIONS} />
        <ChoiceEntry name="floorTowerId" label="Tower on the floor" choices={choices} none="none" numeric />
        <ChoiceEntry name="benchTowerId" label="Tower on the bench" choices={choices} none="none" numeric />
        <ChoiceEntry name="pm25TowerId" label="PM2.5 monitor" choices={choices} none="none" numeric />
      </EntryGrid>
      <TextEntry name="areaText" label="Where it is, in words" />
    </EntryForm>
  );
}

function settingsOf(district: District): Entries {
  const { id: _id, slug: _slug, version: _version, towers, ...fields } = district;
  return { ...fields, towerIds: towers.map(({ towerId }) => towerId) };
}
