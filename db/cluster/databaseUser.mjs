import { readFileSync } from 'node:fs';

/**
 * Who the database runs as: PostgreSQL refuses root, so root lends it Debian's `postgres` user; anybody else runs it
 * as themselves (`switch` is then empty). `switch` goes into the options of `spawn`.
 */
export function databaseUser() {
  const uid = process.getuid();
  if (uid !== 0) return { uid, gid: process.getgid(), switch: {} };
  const line = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .find((entry) => entry.startsWith('postgres:'));
  if (!line) throw new Error('There is no user "postgres" on this machine, and PostgreSQL refuses to run as root.');
  const [, , user, group] = line.split(':');
  const ids = { uid: Number(user), gid: Number(group) };
  return { ...ids, switch: ids };
}

/** A small, known environment: nothing of ours leaks into the database's processes. */
export const databaseEnvironment = { PATH: '/usr/bin:/bin', LANG: 'C.UTF-8', LC_ALL: 'C.UTF-8', TZ: 'UTC', HOME: '/' };
