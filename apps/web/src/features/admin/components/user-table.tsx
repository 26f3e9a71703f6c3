import { Flex } from '@chakra-ui/react';
import { useState } from 'react';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { PlainTable } from '../../../components/ui/plain-table';
import { useAct } from '../../../lib/use-act';
import { newPasswordLink } from '../api';
import type { District, User } from '../types';
import { RetireDialog } from './retire-dialog';
import { UserDialog } from './user-dialog';
import type { MadeLink } from './users-view';

interface UserTableProps {
  users: readonly User[];
  districts: readonly District[];
  onMade: (link: MadeLink) => void;
  onChanged: () => void;
}

/** Who signs in, in which role, and what can be done about each. */
export function UserTable({ users, districts, onMade, onChanged }: UserTableProps) {
  const [changing, setChanging] = useState<User>();
  const [retiring, setRetiring] = useState<User>();
  const { run, problem } = useAct(async ({ id, name }: User) =>
    onMade({ name, url: (await newPasswordLink(id)).url }),
  );
  const namesOf = (ids: readonly number[]) =>
    districts
      .filter(({ id }) => ids.includes(id))
      .map(({ name }) => name)
      .join(', ');
  const acts = (user: User) =>
    user.state === 'retired' ? null : (
      <Flex gap="2" wrap="wrap">
        <Button size="sm" onClick={() => setChanging(user)} aria-label={`Change ${user.name}`}>
          Change
        </Button>
        <Button size="sm" onClick={() => void run(user)} aria-label={`New link for ${user.name}`}>
          New link
        </Button>
        <Button size="sm" onClick={() => setRetiring(user)} aria-label={`Retire ${user.name}`}>
          Retire
        </Button>
      </Flex>
    );
  return (
    <>
      <Refusal problem={problem} />
      <PlainTable
        caption="People who sign in"
        rows={users}
        keyOf={({ id }) => id}
        columns={[
          { head: 'Name', cell: ({ name }) => <strong>{name}</strong> },
          { head: 'E-mail', cell: ({ email }) => email },
          { head: 'Role', cell: ({ role }) => role },
          {
            head: 'Districts',
            cell: ({ role, districtIds }) =>
              role === 'officer' ? namesOf(districtIds) || 'none yet' : 'all',
          },
          { head: 'State', cell: ({ state }) => state },
          { head: 'Acts', cell: acts },
        ]}
      />
      {changing && (
        <UserDialog
          user={changing}
          districts={districts}
          onClose={() => setChanging(undefined)}
          onChanged={onChanged}
        />
      )}
      {retiring && (
        <RetireDialog user={retiring} onClose={() => setRetiring(undefined)} onRetired={onChanged} />
      )}
    </>
  );
}
