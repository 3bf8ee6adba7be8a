import { chownSync, existsSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { basename, join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { createDataFolder } from './cluster/createDataFolder.mjs';
import { usableDataFolder } from './cluster/dataFolder.mjs';
import { databaseUser } from './cluster/databaseUser.mjs';
import { binariesOfVersion, requireBinaries } from './cluster/findBinaries.mjs';
import { freePort } from './cluster/freePort.mjs';
import { madeFolder, stateFolder as usualStateFolder } from './cluster/paths.mjs';
import {
  clearStalePostmaster,
  resetSuperuserPassword,
  runningPostmaster,
  startPostmaster,
  stopPostmaster,
} from './cluster/postmaster.mjs';
import { isRunning, waitUntil } from './cluster/processes.mjs';
import { secretsOf, writePrivately } from './cluster/secrets.mjs';
import { hostRules, settings } from './cluster/settings.mjs';
import { enter, leave } from './cluster/users.mjs';
import { withLock } from './cluster/withLock.mjs';

const host = '127.0.0.1';
const usualPort = 54329;

/**
 * Makes sure that a private PostgreSQL runs for this checkout, installing, creating and starting whatever is missing;
 * joins the one that runs already. Safe to call from several processes at once.
 *
 * @param {object} [options]
 * @param {string} [options.stateFolder] where secrets and, if its user can enter it, the data are kept
 * @param {string} [options.dataDir] the data folder, default `pg` in the state folder
 * @param {boolean} [options.durable] false for test data only: faster, and lost in a crash
 * @param {number[]} [options.ports] ports to try before any free one
 * @param {(line: string) => void} [options.log] is told, in plain words, what is done
 * @returns {Promise<{host: string, port: number, pid: number, dataDir: string, binaries: string, superuserUrl: string, secrets: {superuser: string, authSecret: string, roles: Record<string, string>}, started: boolean, stop: () => Promise<void>}>}
 *   `stop` leaves the cluster, and shuts it down when nobody else uses it
 */
export async function ensureCluster({
  stateFolder = usualStateFolder,
  dataDir: wanted = join(stateFolder, 'pg'),
  durable = true,
  ports = basename(wanted) === 'pg' ? [usualPort] : [],
  log = () => {},
} = {}) {
  madeFolder(stateFolder);
  const name = basename(wanted);
  const record = join(stateFolder, name === 'pg' ? 'cluster.json' : `cluster-${name}.json`);
  const users = join(stateFolder, `users-${name}`);

  return withLock(stateFolder, 'cluster', async () => {
    const newest = requireBinaries(log);
    const user = databaseUser();
    const { secrets, made } = secretsOf(stateFolder);
    const dataDir = usableDataFolder(wanted, user, log);
    const context = { binaries: newest, dataDir, user, password: secrets.superuser };
    const complete = join(dataDir, 'marram.conf');
    if (made) forgetMarks(stateFolder);

    if (!existsSync(complete)) {
      log('Creating the database folder');
      emptyFolder(dataDir);
      createDataFolder(context);
      writeAs(user, complete, settings({ durable }));
      writeFileSync(markOf(stateFolder, name), 'set\n');
    } else {
      context.binaries = binariesOfVersion(readFileSync(join(dataDir, 'PG_VERSION'), 'utf8').trim());
    }
    if (!existsSync(markOf(stateFolder, name))) {
      log('The passwords are new: giving them to the database that was here');
      await stopPostmaster(dataDir);
      await clearStalePostmaster(dataDir, log);
      resetSuperuserPassword(context);
      writeFileSync(markOf(stateFolder, name), 'set\n');
    }

    let found = runningPostmaster(dataDir);
    if (found && found.state !== 'ready') {
      // Just starting or just stopping, by a process that has died or by hand: wait for what it becomes.
      const { pid } = found;
      await waitUntil(() => !isRunning(pid) || runningPostmaster(dataDir)?.state === 'ready', 60_000);
      found = runningPostmaster(dataDir);
    }
    const started = !found;
    if (!found) {
      await clearStalePostmaster(dataDir, log);
      writeAs(user, complete, settings({ durable }));
      writeAs(user, join(dataDir, 'pg_hba.conf'), hostRules);
      const port = await freePort([lastPort(record), ...ports].filter((each) => each > 0));
      const pid = await startPostmaster({ ...context, port, logFile: join(stateFolder, `${name}.log`) });
      found = { pid, port, state: 'ready' };
      log(`PostgreSQL runs on ${host}:${port}`);
    }
    const { pid, port } = found;
    writePrivately(record, { host, port, pid, dataDir });
    enter(users);
    const stop = () =>
      withLock(stateFolder, 'cluster', async () => {
        if (!leave(users)) await stopPostmaster(dataDir);
      });
    const superuserUrl = `postgres://postgres:${secrets.superuser}@${host}:${port}/postgres`;
    return { host, port, pid, dataDir, binaries: context.binaries, superuserUrl, secrets, started, stop };
  });
}

/** The data folder was begun by a start that died in the middle: nothing of it was ever used. */
function emptyFolder(folder) {
  for (const entry of readdirSync(folder)) rmSync(join(folder, entry), { recursive: true, force: true });
}

/** The file that says that a data folder knows the passwords of `secrets.json`. */
function markOf(stateFolder, name) {
  return join(stateFolder, `${name}.password`);
}

/** New passwords: every data folder must be told, also those that this start does not use. */
function forgetMarks(stateFolder) {
  for (const entry of readdirSync(stateFolder)) {
    if (entry.endsWith('.password')) rmSync(join(stateFolder, entry));
  }
}

/** Writes a file that the database's user can read, whatever our umask. */
function writeAs(user, path, text) {
  writeFileSync(path, text, { mode: 0o600 });
  chownSync(path, user.uid, user.gid);
}

/** The port of the last time: a server that comes back on it is found again by pools that still wait. */
function lastPort(record) {
  try {
    return Number(JSON.parse(readFileSync(record, 'utf8')).port);
  } catch {
    return 0;
  }
}

/** What `--status` prints. */
function status() {
  const record = join(usualStateFolder, 'cluster.json');
  if (!existsSync(record)) return 'No cluster has been started here.';
  const { port, dataDir } = JSON.parse(readFileSync(record, 'utf8'));
  const found = runningPostmaster(dataDir);
  return found
    ? `Running on ${host}:${found.port} (process ${found.pid}), data in ${dataDir}`
    : `Not running (last port ${port}), data in ${dataDir}`;
}

async function main() {
  if (process.argv.includes('--status')) {
    console.log(status());
    return;
  }
  const cluster = await ensureCluster({ log: (line) => console.error(line) });
  console.log(cluster.superuserUrl);
  const alive = setInterval(() => {}, 60_000);
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.once(signal, async () => {
      clearInterval(alive);
      await cluster.stop();
      process.exit(0);
    });
  }
}

if (process.argv[1] && import.meta.url === pathToFileURL(process.argv[1]).href) {
  main().catch((error) => {
    console.error(error.message);
    process.exit(1);
  });
}
