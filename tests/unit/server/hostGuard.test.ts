import { expect, it } from 'vitest';
import { hostName } from '#src/server/hostGuard.ts';

it.each([
  ['127.0.0.1:4321', '127.0.0.1'],
  ['LOCALHOST', 'localhost'],
  ['club.example:443', 'club.example'],
  [undefined, undefined],
  ['', undefined],
  ['a@127.0.0.1', undefined],
  ['127.0.0.1:4321, evil.example', undefined],
  ['127.0.0.1/evil', undefined],
  ['[::1]:4321', undefined],
])('reads %s as %s', (header, name) => expect(hostName(header)).toBe(name));
