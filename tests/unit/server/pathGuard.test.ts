import { expect, it } from 'vitest';
import { isOddTarget } from '#src/server/pathGuard.ts';

const odd = [
  '//squads',
  '/squads//1',
  '/squads//',
  '/\\squads',
  '/squads\\1',
  '/%2fsquads',
  '/squads%2F1',
  '/%5Csquads',
  '/%2573quads',
  '/%73quads',
  '/%53quads',
  '/./squads',
  '/squads/..',
  '/squads/../people',
  '/%2e%2e/people',
  '/squads/%2E',
  '/squads%00',
  '/squads%0d%0aSet-Cookie:x',
  '/squads%',
  '/squads%zz',
  '/%ff',
  '/squads#x',
  '/squads x',
  'squads',
  'http://evil.example/squads',
  '*',
  `/${'a'.repeat(2048)}`,
];
it.each(odd)('refuses %s', (target) => expect(isOddTarget(target)).toBe(true));

const plain = [
  '/',
  '/squads',
  '/squads/',
  '/squads/0198c1f2-7a7b-7000-8000-000000000001',
  '/_astro/a.B1_-x.js',
  '/method/jump%20height',
  '/x?next=%2Fsquads//%2e',
  '/%C3%A9',
];
it.each(plain)('takes %s', (target) => expect(isOddTarget(target)).toBe(false));
