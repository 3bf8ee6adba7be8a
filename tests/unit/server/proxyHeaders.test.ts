import { expect, it } from 'vitest';
import { cleanForwarding } from '#src/server/proxyHeaders.ts';

const sent = () => ({
  host: 'club.example',
  'x-forwarded-for': '9.9.9.9, 203.0.113.7',
  'x-forwarded-host': 'evil.example',
  'x-forwarded-proto': 'https',
  'x-forwarded-port': '1',
  forwarded: 'for=9.9.9.9',
  'x-real-ip': '9.9.9.9',
  'x-marram-client': '9.9.9.9',
});

it('takes everything away from a stranger', () => {
  const headers = sent();
  cleanForwarding(headers, '198.51.100.1', new Set(['10.0.0.1']), true);
  expect(headers).toEqual({ host: 'club.example', 'x-marram-client': '198.51.100.1' });
});

it('keeps the address that a configured proxy appended, and its own public protocol', () => {
  const headers = sent();
  cleanForwarding(headers, '10.0.0.1', new Set(['10.0.0.1']), true);
  expect(headers).toEqual({
    host: 'club.example',
    'x-forwarded-for': '203.0.113.7',
    'x-forwarded-proto': 'https',
    'x-marram-client': '203.0.113.7',
  });
});

it('believes no address that is none', () => {
  const headers = { 'x-forwarded-for': '<script>' };
  cleanForwarding(headers, '10.0.0.1', new Set(['10.0.0.1']), false);
  expect(headers).toEqual({ 'x-marram-client': '10.0.0.1' });
});
