import { describe, expect, it } from 'vitest';
import { may, requirePermission, rolesWith, type Permission } from '#src/access/permissions.ts';
import { ROLES } from '#src/access/viewer.ts';

/** PRODUCT.md, "Who sees what", row by row for what exists now. */
const TABLE: Readonly<Partial<Record<Permission, string>>> = {
  'record:see': 'director strength_coach swing_coach',
  'family:see': 'guardian',
  'own:see': 'athlete',
  'trial:record': 'director strength_coach',
  'trial:settle': 'director strength_coach',
  'growth:record': 'director strength_coach',
  'driver:record': 'director swing_coach',
  'ground:record': 'director swing_coach',
  'outrun:see': 'director strength_coach swing_coach',
  'restriction:set': 'director strength_coach swing_coach',
  'restriction:clear': 'director strength_coach',
  'people:manage': 'director',
  'programme:manage': 'director',
  'child-sign-in:make': 'guardian',
};

describe('the permission map', () => {
  it.each(Object.entries(TABLE))('%s: %s', (permission, roles) => {
    expect(rolesWith(permission as Permission).join(' ')).toBe(roles);
  });

  it('stops whoever lacks the permission, and nobody else', () => {
    for (const role of ROLES) {
      const stopped = () => requirePermission({ role }, 'outrun:see');
      if (may({ role }, 'outrun:see')) expect(stopped).not.toThrow();
      else expect(stopped).toThrow(expect.objectContaining({ code: 'forbidden' }));
    }
  });
});
