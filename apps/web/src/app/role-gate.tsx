import { Navigate, Outlet } from 'react-router-dom';
import { useMe } from '../lib/api/use-me';
import type { Role } from '../lib/api/types';
import { startOf } from './paths';

/** Lets the named roles in and sends others to where their own work begins. The API refuses them too. */
export function RoleGate({ roles }: { roles: readonly Role[] }) {
  const { me } = useMe();
  if (!me) return null;
  return roles.includes(me.role) ? <Outlet /> : <Navigate to={startOf[me.role]} replace />;
}
