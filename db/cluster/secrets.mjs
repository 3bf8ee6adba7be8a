import { randomBytes } from 'node:crypto';
import { closeSync, existsSync, fsyncSync, openSync, readFileSync, renameSync, writeSync } from 'node:fs';
import { join } from 'node:path';

/** The roles of the database, each with a password of its own. */
export const databaseRoles = ['marram_owner', 'marram_app', 'marram_auth', 'marram_job', 'marram_backup'];

/**
 * Reads `secrets.json` of the state folder, making it at first start (readable by its owner alone).
 * `made` says that the passwords are new: a database that exists already does not know them.
 */
export function secretsOf(stateFolder) {
  const path = join(stateFolder, 'secrets.json');
  if (existsSync(path)) return { secrets: read(path), made: false };
  const secrets = {
    superuser: secret(),
    authSecret: secret(),
    roles: Object.fromEntries(databaseRoles.map((role) => [role, secret()])),
  };
  writePrivately(path, secrets);
  return { secrets, made: true };
}

function read(path) {
  let secrets;
  try {
    secrets = JSON.parse(readFileSync(path, 'utf8'));
  } catch (error) {
    if (error.code === 'EACCES') {
      throw new Error(
        `${path} belongs to another user: start as the one who started first, or in a clone of your own.`,
      );
    }
    throw new Error(`${path} cannot be read (${error.message}): put it back, or delete it to have new passwords made.`);
  }
  const all = [secrets.superuser, secrets.authSecret, ...databaseRoles.map((role) => secrets.roles?.[role])];
  if (!all.every((value) => typeof value === 'string' && value.length >= 32)) {
    throw new Error(`${path} is not complete: put it back, or delete it to have new passwords made.`);
  }
  return secrets;
}

/** 256 random bits in characters that need no escaping in a URL or in SQL. */
function secret() {
  return randomBytes(32).toString('base64url');
}

/** Writes JSON for its owner alone, whole or not at all. */
export function writePrivately(path, value) {
  const draft = `${path}.${process.pid}`;
  const file = openSync(draft, 'w', 0o600);
  writeSync(file, `${JSON.stringify(value, null, 2)}\n`);
  fsyncSync(file);
  closeSync(file);
  renameSync(draft, path);
}
