import { AppError } from '#src/errors/appError.ts';
import type { Role, Viewer } from '#src/access/viewer.ts';

/**
 * What each role may do: the one map. Whose rows it reaches is another question, answered in SQL. The order of the
 * rows is that of PRODUCT.md's table.
 */
const MAP = {
  'session:own': ['director', 'strength_coach', 'swing_coach', 'guardian', 'athlete'],
  'today:see': ['director', 'strength_coach', 'swing_coach', 'guardian', 'athlete'],
  'squad:see': ['director', 'strength_coach', 'swing_coach'],
  'record:see': ['director', 'strength_coach', 'swing_coach'],
  'family:see': ['guardian'],
  'own:see': ['athlete'],
  'trial:record': ['director', 'strength_coach'],
  'trial:settle': ['director', 'strength_coach'],
  'testing-day:close': ['director', 'strength_coach'],
  'growth:record': ['director', 'strength_coach'],
  'driver:record': ['director', 'swing_coach'],
  'ground:record': ['director', 'swing_coach'],
  'handedness:correct': ['director', 'strength_coach', 'swing_coach'],
  'restriction:set': ['director', 'strength_coach', 'swing_coach'],
  'restriction:clear': ['director', 'strength_coach'],
  'outrun:see': ['director', 'strength_coach', 'swing_coach'],
  'outrun:judge': ['director', 'strength_coach', 'swing_coach'],
  'season:import': ['director'],
  'people:manage': ['director'],
  'programme:manage': ['director'],
  'child-sign-in:make': ['guardian'],
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof MAP;

export const PERMISSIONS = Object.keys(MAP) as Permission[];

/** Roles that hold a permission. */
export const rolesWith = (permission: Permission): readonly Role[] => MAP[permission];

/** Whether a role holds a permission. */
export const may = ({ role }: Pick<Viewer, 'role'>, permission: Permission): boolean =>
  (MAP[permission] as readonly Role[]).includes(role);

/**
 * Stops a viewer whose role lacks the permission.
 *
 * @throws {AppError} forbidden
 */
export function requirePermission(viewer: Pick<Viewer, 'role'>, permission: Permission): void {
  if (!may(viewer, permission)) throw new AppError('forbidden', 'Your role does not do this');
}
