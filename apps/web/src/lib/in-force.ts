import type { StateName } from '../components/ui/state-shape';
import type { DistrictAir, NoticeBrief } from './api/types';

/** The strictest notice in force in a district, if any. */
export const strictestInForce = (inForce: readonly NoticeBrief[]): NoticeBrief | undefined =>
  inForce.find(({ kind }) => kind === 'burnBan') ?? inForce[0];

/**
 * The state a district is shown in: the strictest notice in force; else *not known* while its air is not known, so that
 * silence is never read as clean air; else no restriction.
 */
export function stateOf(air: Pick<DistrictAir, 'inForce' | 'fresh' | 'finding'>): StateName {
  const notice = strictestInForce(air.inForce);
  if (notice) return notice.kind;
  return air.fresh && air.finding.surface !== 'not known' ? 'none' : 'unknown';
}
