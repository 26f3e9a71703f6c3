import { Problem } from '../common/problem';
import type { SignedIn } from './signed-in';

/** Whether a person may see a district's affairs: officers their own, the others all. */
export function seesDistrict(user: SignedIn, districtId: number): boolean {
  return user.role !== 'officer' || user.districtIds.includes(districtId);
}

/** Throws 403 `not-your-district` when an officer reaches for a district that is not theirs. */
export function requireOwnDistrict(user: SignedIn, districtId: number): void {
  if (!seesDistrict(user, districtId))
    throw new Problem(
      'not-your-district',
      'This belongs to a district that is not one of yours. Ask its officer.',
    );
}
