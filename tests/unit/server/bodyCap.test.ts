import { expect, it } from 'vitest';
import { bodyCapOf } from '#src/server/bodyCap.ts';

it.each([
  ['/api/trials', 256 * 1024],
  ['/sign-in', 256 * 1024],
  ['/api/method/jump-curve', 2 * 1024 * 1024],
  ['/api/driver-sessions/import', 12 * 1024 * 1024],
  ['/api/driver-sessions/importer', 256 * 1024],
])('caps %s at %i bytes', (path, bytes) => expect(bodyCapOf(path)).toBe(bytes));
