import type { SWRResponse } from 'swr';
import { withQuery } from './client';
import type { ApiProblem } from './problem';
import type { DistrictHistory } from './types';
import { useApi } from './use-api';

/** The strength of a district's surface inversion between two instants, with limits, notices and nights. */
export function useDistrictHistory(
  districtId: number | undefined,
  span: { from: string; to: string },
  { live = false } = {},
): SWRResponse<DistrictHistory, ApiProblem> {
  const path = districtId === undefined ? null : withQuery(`/api/districts/${districtId}/history`, span);
  return useApi<DistrictHistory>(path, { live, keepPrevious: true });
}
