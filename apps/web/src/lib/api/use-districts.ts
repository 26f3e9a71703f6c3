import type { District } from './types';
import { useApi } from './use-api';

/** All districts, with their zones and towers. */
export const useDistricts = () => useApi<District[]>('/api/districts');

/** The zone of a district; UTC, which the screens name, until it is known. */
export function useZone(districtId: number | undefined): string {
  const { data } = useDistricts();
  return data?.find(({ id }) => id === districtId)?.timeZone ?? 'UTC';
}
