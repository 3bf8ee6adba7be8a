import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { accountLines } from '#src/server/launch/accounts.mjs';
import { sourceHash } from '#src/server/launch/build.mjs';
import { requireNodeVersion } from '#src/server/launch/nodeVersion.mjs';
import { arePackagesInstalled } from '#src/server/launch/packages.mjs';

let folder = '';
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'marram-test-'));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

describe('requireNodeVersion', () => {
  it.each(['20.19.0', '20.20.2'])('takes %s', (version) => expect(() => requireNodeVersion(version)).not.toThrow());
  it.each(['20.18.3', '18.20.0', '22.1.0'])('refuses %s', (version) =>
    expect(() => requireNodeVersion(version)).toThrow(version),
  );
});

describe('arePackagesInstalled', () => {
  const lock = (packages: object) => JSON.stringify({ packages });
  const wanted = {
    '': { name: 'x' },
    'node_modules/a': { version: '1.0.0' },
    'node_modules/b': { version: '2.0.0', dev: true },
    'node_modules/other-machine': { version: '1.0.0', optional: true },
  };
  const write = (found?: object) => {
    writeFileSync(join(folder, 'package-lock.json'), lock(wanted));
    if (!found) return;
    mkdirSync(join(folder, 'node_modules'));
    writeFileSync(join(folder, 'node_modules', '.package-lock.json'), lock(found));
  };

  it('is false before the first installation', () => {
    write();
    expect(arePackagesInstalled(folder)).toBe(false);
  });
  it('is true without packages for other machines', () => {
    write({ 'node_modules/a': { version: '1.0.0' }, 'node_modules/b': { version: '2.0.0' } });
    expect(arePackagesInstalled(folder)).toBe(true);
  });
  it('is false with another version', () => {
    write({ 'node_modules/a': { version: '1.0.1' }, 'node_modules/b': { version: '2.0.0' } });
    expect(arePackagesInstalled(folder)).toBe(false);
  });
  it('is false without the development packages', () => {
    write({ 'node_modules/a': { version: '1.0.0' } });
    expect(arePackagesInstalled(folder)).toBe(false);
  });
});

describe('sourceHash', () => {
  it('follows names and contents of what is built, and nothing else', () => {
    mkdirSync(join(folder, 'src', 'server'), { recursive: true });
    writeFileSync(join(folder, 'src', 'a.ts'), '1');
    const first = sourceHash(folder);
    writeFileSync(join(folder, 'src', 'server', 'main.ts'), '1');
    expect(sourceHash(folder)).toBe(first);
    writeFileSync(join(folder, 'src', 'a.ts'), '2');
    const second = sourceHash(folder);
    expect(second).not.toBe(first);
    writeFileSync(join(folder, 'src', 'b.ts'), '');
    expect(sourceHash(folder)).not.toBe(second);
  });
});

describe('accountLines', () => {
  it('gives the first account of each role', () => {
    const file = join(folder, 'accounts.json');
    const account = (role: string, email: string) => ({ role, email, password: 'pw' });
    writeFileSync(
      file,
      JSON.stringify([
        account('swing_coach', 'a@x.example'),
        account('swing_coach', 'b@x.example'),
        account('director', 'c@x.example'),
      ]),
    );
    expect(accountLines(file).map((line) => line.split(/ {2,}/))).toEqual([
      ['swing coach', 'a@x.example', 'pw'],
      ['director', 'c@x.example', 'pw'],
    ]);
  });
  it('gives none without a demo', () => expect(accountLines(join(folder, 'none.json'))).toEqual([]));
});
