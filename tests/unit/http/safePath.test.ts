import { describe, expect, it } from 'vitest';
import { safePath } from '#src/http/safePath.ts';

describe('safePath', () => {
  it.each(['/outruns/0190a1b2?tab=1', '/squads', '/athletes/x#care'])('keeps a path of ours: %s', (to) => {
    expect(safePath(to)).toBe(to);
  });

  it.each([
    null,
    undefined,
    '',
    'squads',
    '//evil.example',
    '/\\evil.example',
    'https:evil',
    'https://evil.example',
    '/a\r\nb',
    '/a\\b',
    '/api/trials',
    '/sign-in?to=/x',
  ])('replaces %j', (to) => {
    expect(safePath(to)).toBe('/today');
  });
});
