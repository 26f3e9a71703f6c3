import useSWR from 'swr';
import { api } from './client';
import type { ApiProblem } from './problem';

/** A district by its public name. */
export interface PublicDistrictName {
  slug: string;
  name: string;
}

/** The districts residents may choose from; needs no session. */
export const usePublicDistricts = () =>
  useSWR<PublicDistrictName[], ApiProblem>('/api/public/status', (path: string) =>
    api.get<PublicDistrictName[]>(path),
  );
