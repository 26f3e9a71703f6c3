import type { Role } from '@lidwatch/contracts';

/** The person whose session a request carries. */
export interface SignedIn {
  id: number;
  name: string;
  email: string;
  role: Role;
  /** The districts an officer acts in; empty for the other roles, which see all. */
  districtIds: number[];
}
