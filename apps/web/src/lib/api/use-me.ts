import useSWR from 'swr';
import { ApiProblem } from './problem';
import { api } from './client';
import type { Me } from './types';

/** The key under which SWR keeps who is signed in. */
export const ME = '/api/auth/me';

async function fetchMe(): Promise<Me | null> {
  try {
    return await api.get<Me>(ME);
  } catch (error) {
    if (error instanceof ApiProblem && error.status === 401) return null;
    throw error;
  }
}

/** Who is signed in: undefined while asked, null when nobody is. */
export function useMe() {
  const { data, error, isLoading, mutate } = useSWR<Me | null, ApiProblem>(ME, fetchMe, {
    revalidateOnFocus: true,
    dedupingInterval: 5_000,
  });
  return { me: data, error, isLoading, mutate };
}
