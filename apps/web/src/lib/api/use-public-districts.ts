import useSWR from 'swr';
import { api } from './client';
import type { ApiProblem } from './problem';

/** A district by its public name. */
export interface PublicDistrictName {
  slug: string;
  name: string;
  /** The office that signs its notices. */
  officeName: string;
}

/** The districts residents may choose from; needs no session. */
export const usePublicDistricts = () =>
  useSWR<PublicDistrictName[], ApiProblem>('/api/public/status', (path: string) =>
    api.get<PublicDistrictName[]>(path),
  );

/** The name of the office that speaks on the residents' pages; undefined until it is known. */
export const usePublicOffice = (): string | undefined => usePublicDistricts().data?.[0]?.officeName;
