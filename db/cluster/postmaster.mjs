import { spawn, spawnSync } from 'node:child_process';
import { closeSync, existsSync, openSync, readFileSync, rmSync, statSync, truncateSync } from 'node:fs';
import { join } from 'node:path';
import { databaseEnvironment } from './databaseUser.mjs';
import { commandLine, isRunning, processesIn, waitUntil } from './processes.mjs';

/** What `postmaster.pid` says: id, port and state of the server of this data folder, or undefined without one. */
export function readPostmaster(dataDir) {
  try {
    const lines = readFileSync(join(dataDir, 'postmaster.pid'), 'utf8').split('\n');
    return { pid: Number(lines[0]), port: Number(lines[3]), state: (lines[7] ?? '').trim() };
  } catch {
    return undefined;
  }
}

/** The server that really runs on this data folder: alive, not a zombie, and PostgreSQL with our folder as argument. */
export function runningPostmaster(dataDir) {
  const found = readPostmaster(dataDir);
  if (!found || !isRunning(found.pid)) return undefined;
  const words = commandLine(found.pid);
  return words[0]?.endsWith('/postgres') && words.includes(dataDir) ? found : undefined;
}

/**
 * Removes a `postmaster.pid` that no running server stands behind (killed, a zombie, or its id now someone else's).
 * Waits first for the killed server's own children: while one works on the data, nothing may start on it.
 */
export async function clearStalePostmaster(dataDir, log) {
  if (!existsSync(join(dataDir, 'postmaster.pid')) || runningPostmaster(dataDir)) return;
  const gone = await waitUntil(() => processesIn(dataDir).length === 0, 30_000);
  if (!gone) {
    throw new Error(
      `A killed database server left processes at work in ${dataDir} (${processesIn(dataDir).join(', ')}): wait for them to end, then start again.`,
    );
  }
  log('The database was not shut down properly last time: it recovers by itself');
  rmSync(join(dataDir, 'postmaster.pid'), { force: true });
}

/**
 * Starts the server in a session of its own, so that a Ctrl-C meant for us does not reach it before our own orderly
 * stop, and waits until it takes connections.
 *
 * @returns the server's process id
 */
export async function startPostmaster({ binaries, dataDir, user, port, logFile }) {
  if (existsSync(logFile) && statSync(logFile).size > 5_000_000) truncateSync(logFile);
  const output = openSync(logFile, 'a', 0o600);
  const child = spawn(join(binaries, 'postgres'), ['-D', dataDir, '-p', String(port)], {
    ...user.switch,
    cwd: '/',
    env: databaseEnvironment,
    detached: true,
    stdio: ['ignore', output, output],
  });
  closeSync(output);
  let ended = false;
  child.once('error', () => (ended = true));
  child.once('exit', () => (ended = true));
  child.unref();
  const ready = () => {
    const found = readPostmaster(dataDir);
    return ended || (found?.pid === child.pid && found.state === 'ready');
  };
  const inTime = await waitUntil(ready, 60_000);
  if (ended || !inTime) {
    const last = readFileSync(logFile, 'utf8').trim().split('\n').slice(-3).join(' / ');
    throw new Error(`PostgreSQL did not start. Its log (${logFile}) ends: ${last}`);
  }
  return child.pid;
}

/** Stops the server of this data folder in order: no new work, open transactions rolled back, everything on disk. */
export async function stopPostmaster(dataDir) {
  const found = runningPostmaster(dataDir);
  if (!found) return;
  process.kill(found.pid, 'SIGINT');
  if (await waitUntil(() => !isRunning(found.pid), 20_000)) return;
  if (runningPostmaster(dataDir)?.pid === found.pid) process.kill(found.pid, 'SIGQUIT');
  await waitUntil(() => !isRunning(found.pid), 10_000);
}

/** Gives the superuser a new password without the old one: the server is down and the folder is ours. */
export function resetSuperuserPassword({ binaries, dataDir, user, password }) {
  const done = spawnSync(join(binaries, 'postgres'), ['--single', '-D', dataDir, 'postgres'], {
    ...user.switch,
    cwd: '/',
    env: databaseEnvironment,
    input: `ALTER ROLE postgres PASSWORD '${password}';\n`,
    encoding: 'utf8',
  });
  if (done.status !== 0) throw new Error(`The database's password could not be renewed: ${done.stderr.trim()}`);
}
