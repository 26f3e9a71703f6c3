import { Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { Loaded } from '../../../components/states/loaded';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { ShownOnce } from '../../../components/ui/shown-once';
import { useDistrictSettings, useUsers } from '../api';
import { InviteForm } from './invite-form';
import { UserTable } from './user-table';

/** A one-time link that was just made, and for whom. */
export interface MadeLink {
  name: string;
  url: string;
}

/** Everybody who signs in, and the invitation of more. */
export function UsersView() {
  const users = useUsers();
  const { data: districts = [] } = useDistrictSettings();
  const [made, setMade] = useState<MadeLink>();
  const onMade = (link: MadeLink) => {
    setMade(link);
    void users.mutate();
  };
  return (
    <Stack gap="5">
      {made && (
        <ShownOnce title={`Hand this link to ${made.name} only`} secret={made.url}>
          <p>It works once. It is not shown again; you can make another.</p>
        </ShownOnce>
      )}
      <Card overflow="hidden">
        <Loaded from={users} what="the people">
          {({ items }) => (
            <UserTable
              users={items}
              districts={districts}
              onMade={onMade}
              onChanged={() => void users.mutate()}
            />
          )}
        </Loaded>
      </Card>
      <Card padded>
        <PartTitle mb="3">Invite somebody</PartTitle>
        <InviteForm districts={districts} onMade={onMade} />
      </Card>
    </Stack>
  );
}
