import { Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { paths } from '../../../app/paths';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { Message } from '../../../components/ui/message';
import { useDistricts } from '../../../lib/api/use-districts';
import { useAct } from '../../../lib/use-act';
import { changeTower, removeTower } from '../api';
import type { Tower } from '../types';

/** Retires a tower or uses it again, and takes one away that was made by mistake. */
export function TowerEnd({ tower, onChanged }: { tower: Tower; onChanged: () => void }) {
  const { id, name, retired, version } = tower;
  const navigate = useNavigate();
  const [sure, setSure] = useState(false);
  const { data: districts = [] } = useDistricts();
  const asking = districts.filter(
    ({ towers, floorTowerId, benchTowerId, pm25TowerId }) =>
      towers.some(({ towerId }) => towerId === id) || [floorTowerId, benchTowerId, pm25TowerId].includes(id),
  );
  const act = useAct(async (what: 'retire' | 'delete') => {
    if (what === 'retire') {
      await changeTower(id, { version, retired: !retired });
      return onChanged();
    }
    await removeTower(id);
    await navigate(paths.adminTowers);
  });
  const who = asking.map((district) => district.name).join(', ');
  return (
    <Card padded>
      <PartTitle mb="3">{retired ? 'This tower is retired' : 'No longer in use?'}</PartTitle>
      <Stack gap="3" align="flex-start">
        {asking.length > 0 && (
          <Message tone={retired ? 'warn' : 'info'}>
            {retired
              ? `Still named by ${who}: without another tower nothing is known there.`
              : `Asked for ${who}. Once it is retired, nothing new is known from it.`}
          </Message>
        )}
        <Button busy={act.busy} onClick={() => void act.run('retire')}>
          {retired ? `Use ${name} again` : `Retire ${name}`}
        </Button>
        <Button
          kind="quiet"
          size="sm"
          busy={act.busy}
          onClick={() => (sure ? void act.run('delete') : setSure(true))}
        >
          {sure ? `Delete ${name} for ever` : 'Made by mistake? Delete it'}
        </Button>
        <Refusal problem={act.problem} />
      </Stack>
    </Card>
  );
}
