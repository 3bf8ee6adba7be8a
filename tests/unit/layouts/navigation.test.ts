import { describe, expect, it } from 'vitest';
import { may } from '#src/access/permissions.ts';
import { ROLES } from '#src/access/viewer.ts';
import { findRoute } from '#src/http/routes.ts';
import { placesFor } from '#src/layouts/navigation.ts';

describe('the places in the header', () => {
  it.each([
    ['director', ['Today', 'Squads', 'Asked values', 'Outruns', 'Programme', 'Method']],
    ['strength_coach', ['Today', 'Squads', 'Asked values', 'Outruns', 'Method']],
    ['swing_coach', ['Today', 'Squads', 'Outruns', 'Method']],
    ['guardian', ['Family', 'Method']],
    ['athlete', ['Progress', 'Method']],
  ] as const)('of a %s', (role, labels) => {
    expect(placesFor({ role }).map(({ label }) => label)).toEqual(labels);
  });

  it('of a stranger are the public ones', () => {
    expect(placesFor(null).map(({ label }) => label)).toEqual(['Method']);
  });

  it('lead only where the route lets that role in', () => {
    for (const role of ROLES) {
      for (const { href } of placesFor({ role })) {
        const access = findRoute(href, 'GET')?.access;
        expect(access === 'public' || (access !== undefined && may({ role }, access)), `${role} ${href}`).toBe(true);
      }
    }
  });
});
