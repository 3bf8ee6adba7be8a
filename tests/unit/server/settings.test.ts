import { expect, it } from 'vitest';
import { readSettings } from '#src/server/settings.ts';

const complete = {
  DATABASE_URL: 'postgres://a',
  DATABASE_AUTH_URL: 'postgres://b',
  DATABASE_JOB_URL: 'postgres://c',
  AUTH_SECRET: 'k3v9QpXz7LmT2wYbR8nD5sHfJ4gC6aE1',
};

it('reads the public address into hosts and origins', () => {
  const settings = readSettings({ ...complete, PORT: '4400', PUBLIC_URL: 'https://club.example/' });
  expect([...settings.hosts]).toEqual(['127.0.0.1', 'localhost', 'club.example']);
  expect([...settings.origins]).toEqual(['http://127.0.0.1:4400', 'http://localhost:4400', 'https://club.example']);
});

it.each([
  ['AUTH_SECRET', undefined],
  ['AUTH_SECRET', 'short'],
  ['AUTH_SECRET', 'a'.repeat(64)],
  ['AUTH_SECRET', 'changeme'.repeat(8)],
  ['DATABASE_URL', undefined],
  ['DATABASE_AUTH_URL', ''],
  ['DATABASE_JOB_URL', undefined],
  ['PORT', '0'],
  ['PORT', 'http'],
])('refuses to start with %s = %s, without repeating the value', (name, value) => {
  let message = '';
  try {
    readSettings({ ...complete, [name]: value });
  } catch (error) {
    message = (error as Error).message;
  }
  expect(message).toContain(name);
  expect(value && value.length > 5 ? message.includes(value) : false).toBe(false);
});
