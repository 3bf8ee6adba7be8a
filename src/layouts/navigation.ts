import { may } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import type { Permission } from '#src/access/permissions.ts';

export type PlaceKey = 'today' | 'squads' | 'asked' | 'outruns' | 'family' | 'progress' | 'programme' | 'method';

interface PlaceLink {
  key: PlaceKey;
  href: string;
  label: string;
  permission: Permission | null;
}

/** The places of the header in their one order. Families and athletes have one home, so Today is staff's alone. */
const PLACES: readonly PlaceLink[] = [
  { key: 'today', href: '/today', label: 'Today', permission: 'squad:see' },
  { key: 'squads', href: '/squads', label: 'Squads', permission: 'squad:see' },
  { key: 'asked', href: '/asked', label: 'Asked values', permission: 'trial:settle' },
  { key: 'outruns', href: '/outruns', label: 'Outruns', permission: 'outrun:see' },
  { key: 'programme', href: '/programme/people', label: 'Programme', permission: 'people:manage' },
  { key: 'family', href: '/family', label: 'Family', permission: 'family:see' },
  { key: 'progress', href: '/my/progress', label: 'Progress', permission: 'own:see' },
  { key: 'method', href: '/method', label: 'Method', permission: null },
];

/** The places that a role may go to; a stranger has the public ones. */
export const placesFor = (viewer: Pick<Viewer, 'role'> | null): PlaceLink[] =>
  PLACES.filter(({ permission }) => permission === null || (viewer !== null && may(viewer, permission)));
