import { Stack } from '@chakra-ui/react';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import type { Tower } from '../types';
import { KeysPart } from './keys-part';
import { NeighboursPart } from './neighbours-part';
import { SensorsPart } from './sensors-part';
import { SourcesPart } from './sources-part';
import { TowerChanges } from './tower-changes';
import { TowerEnd } from './tower-end';
import { TowerForm } from './tower-form';

interface TowerViewProps {
  tower: Tower;
  /** Keys are the administrator's alone. */
  mayMakeKeys: boolean;
  /** The zone of the tower's district. */
  zone: string;
  onChanged: () => void;
}

/** One tower: its sensors, where its readings come from, its keys, its settings, and what was changed. */
export function TowerView({ tower, mayMakeKeys, zone, onChanged }: TowerViewProps) {
  return (
    <Stack gap="5">
      <SensorsPart tower={tower} zone={zone} onChanged={onChanged} />
      <SourcesPart towerId={tower.id} />
      <KeysPart towerId={tower.id} sensor={tower.sensors[0]?.name} mayMakeKeys={mayMakeKeys} />
      <Card padded>
        <PartTitle mb="3">Settings</PartTitle>
        <TowerForm key={tower.version} tower={tower} onSaved={onChanged} />
      </Card>
      <NeighboursPart tower={tower} />
      <TowerChanges towerId={tower.id} zone={zone} />
      <TowerEnd tower={tower} onChanged={onChanged} />
    </Stack>
  );
}
