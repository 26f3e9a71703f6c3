import { Outlet } from 'react-router-dom';
import type { Role } from '../lib/api/types';
import { useMe } from '../lib/api/use-me';
import { WrongRolePage } from '../pages/wrong-role-page';

/** Lets the named roles in and tells others whose page it is. The API refuses them too. */
export function RoleGate({ roles }: { roles: readonly Role[] }) {
  const { me } = useMe();
  if (!me) return null;
  return roles.includes(me.role) ? <Outlet /> : <WrongRolePage me={me} roles={roles} />;
}
