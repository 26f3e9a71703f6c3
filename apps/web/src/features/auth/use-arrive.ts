import { useLocation, useNavigate } from 'react-router-dom';
import { useSWRConfig } from 'swr';
import { startOf } from '../../app/paths';
import type { Me } from '../../lib/api/types';
import { ME } from '../../lib/api/use-me';

/** Takes somebody who has just signed in back to where they were going, or to where their own work begins. */
export function useArrive(): (me: Me) => Promise<void> {
  const navigate = useNavigate();
  const { mutate } = useSWRConfig();
  const { state } = useLocation() as { state: { from?: string } | null };
  return async (me) => {
    await mutate((key) => key !== ME, undefined, { revalidate: false });
    await mutate(ME, me, { revalidate: false });
    await navigate(state?.from ?? startOf[me.role], { replace: true });
  };
}
