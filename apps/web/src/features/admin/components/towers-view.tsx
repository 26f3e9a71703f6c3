import { Stack } from '@chakra-ui/react';
import { paths } from '../../../app/paths';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { PlainTable } from '../../../components/ui/plain-table';
import { TextLink } from '../../../components/ui/text-link';
import { counted } from '../../../lib/format/number';
import { useTowers } from '../api';
import { TowerForm } from './tower-form';

/** All towers, and a form for one more. A PM2.5 monitor is a tower whose only sensor measures PM2.5. */
export function TowersView() {
  const towers = useTowers();
  return (
    <Stack gap="5">
      <Card overflow="hidden">
        <Loaded from={towers} what="the towers">
          {(all) =>
            all.length === 0 ? (
              <Empty title="No tower yet">Add the first below; then its sensors on its own page.</Empty>
            ) : (
              <PlainTable
                caption="Towers"
                rows={all}
                keyOf={({ id }) => id}
                columns={[
                  {
                    head: 'Tower',
                    cell: ({ id, name }) => <TextLink to={paths.adminTower(id)}>{name}</TextLink>,
                  },
                  { head: 'Sensors', cell: ({ sensors }) => counted(sensors.length, 'sensor') },
                  { head: 'Ground, m', cell: ({ elevationM }) => elevationM, numeric: true },
                  { head: 'Every, min', cell: ({ intervalMinutes }) => intervalMinutes, numeric: true },
                  { head: 'Clock', cell: ({ clock, stamp }) => `${clock}, ${stamp} of the interval` },
                  { head: 'State', cell: ({ retired }) => (retired ? 'set aside' : 'in use') },
                ]}
              />
            )
          }
        </Loaded>
      </Card>
      <Card padded>
        <PartTitle mb="3">Add a tower</PartTitle>
        <TowerForm onSaved={() => void towers.mutate()} />
      </Card>
    </Stack>
  );
}
