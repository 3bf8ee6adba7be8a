import type { Role } from '#src/access/viewer.ts';

/** One (academy, role) that a person may act as. */
export interface Membership {
  membershipId: string;
  academyName: string;
  role: Role;
}
