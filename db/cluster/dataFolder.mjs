import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { chmodSync, chownSync, lstatSync, mkdirSync, realpathSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';

/**
 * Makes the data folder, or a stand-in below /var/tmp when the database's user cannot enter the wanted one (a clone in
 * a closed home, a mount that knows no other owner). Returns the real path.
 */
export function usableDataFolder(wanted, user, log) {
  const first = tryFolder(wanted, user);
  if (first) return first;
  const hash = createHash('sha256').update(dirname(wanted)).digest('hex').slice(0, 12);
  const fallback = join('/var/tmp', `marram-${hash}-${basename(wanted)}`);
  const second = tryFolder(fallback, user);
  if (!second) {
    throw new Error(`The database can be kept neither in ${wanted} nor in ${fallback}: its user may not write there.`);
  }
  log(`The database's user cannot enter ${dirname(wanted)}, so the data is kept in ${fallback}`);
  return second;
}

function tryFolder(folder, user) {
  try {
    mkdirSync(folder, { recursive: true, mode: 0o700 });
    if (process.getuid() === 0 && lstatSync(folder).uid === 0) chownSync(folder, user.uid, user.gid);
    const found = lstatSync(folder);
    // Below /var/tmp anybody may have made the name first.
    if (!found.isDirectory() || found.uid !== user.uid) return undefined;
    chmodSync(folder, 0o700);
  } catch {
    return undefined;
  }
  const path = realpathSync(folder);
  const probe = spawnSync('/bin/sh', ['-c', 'cd "$1" && : > .probe && rm .probe', 'sh', path], {
    ...user.switch,
    cwd: '/',
    stdio: 'ignore',
  });
  return probe.status === 0 ? path : undefined;
}
