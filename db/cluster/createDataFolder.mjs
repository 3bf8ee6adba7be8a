import { spawnSync } from 'node:child_process';
import { appendFileSync, chownSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { databaseEnvironment } from './databaseUser.mjs';

/** Makes an empty cluster: UTF-8, byte order, checksums, passwords by SCRAM, superuser `postgres`. */
export function createDataFolder({ binaries, dataDir, user, password }) {
  const folder = mkdtempSync(join(tmpdir(), 'marram-'));
  const passwordFile = join(folder, 'password');
  writeFileSync(passwordFile, `${password}\n`, { mode: 0o600 });
  if (process.getuid() === 0) for (const path of [folder, passwordFile]) chownSync(path, user.uid, user.gid);
  const args = ['-D', dataDir, '-U', 'postgres', '--auth=scram-sha-256', `--pwfile=${passwordFile}`];
  const done = spawnSync(
    join(binaries, 'initdb'),
    [...args, '--encoding=UTF8', '--locale=C.UTF-8', '--data-checksums'],
    {
      ...user.switch,
      cwd: '/',
      env: databaseEnvironment,
      encoding: 'utf8',
    },
  );
  rmSync(folder, { recursive: true, force: true });
  if (done.status !== 0) throw new Error(`The database could not be created: ${done.stderr.trim().split('\n').pop()}`);
  appendFileSync(join(dataDir, 'postgresql.conf'), "\ninclude = 'marram.conf'\n");
}
