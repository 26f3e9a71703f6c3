import { Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { PlainTable } from '../../../components/ui/plain-table';
import { useDistrictSettings, useOffice, useTowers } from '../api';
import type { District } from '../types';
import { DistrictForm } from './district-form';
import { OfficeForm } from './office-form';

/** The districts with a form to add or change one, and the office that signs the notices. */
export function DistrictsView() {
  const districts = useDistrictSettings();
  const { data: towers = [] } = useTowers();
  const office = useOffice();
  const [changing, setChanging] = useState<District>();
  const onSaved = () => {
    setChanging(undefined);
    void districts.mutate();
  };
  return (
    <Stack gap="5">
      <Card overflow="hidden">
        <Loaded from={districts} what="the districts">
          {(all) =>
            all.length === 0 ? (
              <Empty title="No district yet">
                Add the first below, once there is a tower to speak for it.
              </Empty>
            ) : (
              <PlainTable
                caption="Districts"
                rows={all}
                keyOf={({ id }) => id}
                columns={[
                  { head: 'District', cell: ({ name }) => <strong>{name}</strong> },
                  { head: 'Zone', cell: ({ timeZone }) => timeZone },
                  {
                    head: 'Towers',
                    cell: ({ towers: own }) =>
                      own
                        .map(({ towerId }) => towers.find(({ id }) => id === towerId)?.name ?? '…')
                        .join(', '),
                  },
                  { head: 'Ordinance', cell: ({ ordinanceRef }) => ordinanceRef || '–' },
                  {
                    head: 'Change',
                    cell: (district) => (
                      <Button onClick={() => setChanging(district)}>Change {district.name}</Button>
                    ),
                  },
                ]}
              />
            )
          }
        </Loaded>
      </Card>
      <Card padded>
        <PartTitle mb="3">{changing ? `Change ${changing.name}` : 'Add a district'}</PartTitle>
        <DistrictForm
          key={changing ? `${changing.id} ${changing.version}` : 'new'}
          district={changing}
          towers={towers}
          onSaved={onSaved}
        />
      </Card>
      <Card padded>
        <PartTitle mb="3">The office that signs the notices</PartTitle>
        <Loaded from={office} what="the office">
          {(found) => <OfficeForm office={found} onSaved={() => void office.mutate()} />}
        </Loaded>
      </Card>
    </Stack>
  );
}
