import { describe, expect, it } from 'vitest';
import { isFromOwnPage } from '#src/server/originGuard.ts';

const origins = new Set(['http://127.0.0.1:4321']);

describe('isFromOwnPage', () => {
  it.each([
    { origin: 'http://127.0.0.1:4321' },
    { origin: 'http://127.0.0.1:4321', 'sec-fetch-site': 'same-origin' },
    { origin: 'null', 'sec-fetch-site': 'same-origin' },
    { 'sec-fetch-site': 'same-origin' },
  ])('takes %o', (headers) => expect(isFromOwnPage(headers, '/api/trials', origins)).toBe(true));

  it.each([
    {},
    { origin: 'null' },
    { origin: 'http://127.0.0.1:4322' },
    { origin: 'https://127.0.0.1:4321' },
    { origin: 'http://127.0.0.1:4321.evil.example' },
    { origin: 'http://127.0.0.1:4321/' },
    { origin: 'http://127.0.0.1:4321', 'sec-fetch-site': 'cross-site' },
    { 'sec-fetch-site': 'same-site' },
    { 'sec-fetch-site': 'none' },
  ])('refuses %o', (headers) => expect(isFromOwnPage(headers, '/api/trials', origins)).toBe(false));

  it('lets a program without an origin reach the calculators, and another site not', () => {
    expect(isFromOwnPage({}, '/api/method/trend', origins)).toBe(true);
    expect(isFromOwnPage({ origin: 'https://evil.example' }, '/api/method/trend', origins)).toBe(false);
    expect(isFromOwnPage({ 'sec-fetch-site': 'cross-site' }, '/api/method/trend', origins)).toBe(false);
  });
});
