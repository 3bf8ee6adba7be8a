/** The five roles. Each is a set of permissions; none stands above another. */
export const ROLES = ['director', 'strength_coach', 'swing_coach', 'guardian', 'athlete'] as const;
export type Role = (typeof ROLES)[number];

/** What people are called on screen. */
export const ROLE_NAMES: Readonly<Record<Role, string>> = {
  director: 'director',
  strength_coach: 'strength coach',
  swing_coach: 'swing coach',
  guardian: 'parent',
  athlete: 'athlete',
};

/** A signed-in person acting as one role in one academy. */
export interface Viewer {
  personId: string;
  academyId: string;
  role: Role;
  sessionId: string;
  membershipId: string;
  name: string;
  academyName: string;
  timeZone: string;
  /** Whom to tell of a worry about a child, as the academy words it. */
  safeguarding: string;
  /** The person's own (academy, role) pairs, this one among them. */
  memberships: readonly Membership[];
}

/** One (academy, role) that a person may act as. */
export interface Membership {
  membershipId: string;
  academyName: string;
  role: Role;
}

export const isStaff = ({ role }: Pick<Viewer, 'role'>): boolean => role !== 'guardian' && role !== 'athlete';
