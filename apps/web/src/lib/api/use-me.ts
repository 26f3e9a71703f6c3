import useSWR, { useSWRConfig } from 'swr';
import { ApiProblem } from './problem';
import { api } from './client';
import type { Me } from './types';

/** The key under which SWR keeps who is signed in. */
export const ME = '/api/auth/me';

/** Asks who is signed in. Whoever was before stays on the page when the session ends, to go on where they were. */
async function fetchMe(before: Me | null | undefined): Promise<Me | null> {
  try {
    return await api.get<Me>(ME);
  } catch (error) {
    if (!(error instanceof ApiProblem) || error.status !== 401) throw error;
    return before ?? null;
  }
}

/** Who is signed in: undefined while asked, null when nobody is. */
export function useMe() {
  const { cache } = useSWRConfig();
  const ask = () => fetchMe(cache.get(ME)?.data as Me | null | undefined);
  const { data, error, isLoading, mutate } = useSWR<Me | null, ApiProblem>(ME, ask, {
    revalidateOnFocus: true,
    dedupingInterval: 5_000,
  });
  return { me: data, error, isLoading, mutate };
}
