import { expect, it } from 'vitest';
import { routeName } from '#src/server/routeName.ts';

it.each([
  ['/athletes/0198c1f2-7a7b-7000-8000-000000000001/strength?from=2026', '/athletes/:id/strength'],
  ['/sign-in/link/Zm9vYmFyYmF6cXV4', '/sign-in/link/:id'],
  ['/reset/abcdefghijklmnopqrstuvwxyzabcdef', '/reset/:id'],
  ['/athletes/42', '/athletes/:id'],
  ['/api/method/jump-curve', '/api/method/jump-curve'],
  ['/x\n{"level":"fatal"}', '/:id'],
  ['/', '/'],
])('names %s as %s', (target, name) => expect(routeName(target)).toBe(name));
