import { spawnSync } from 'node:child_process';
import { join } from 'node:path';
import { databaseEnvironment } from '#db/cluster/databaseUser.mjs';
import { stateFolder } from '#db/cluster/paths.mjs';
import { withLock } from '#db/cluster/withLock.mjs';
import { environmentOf, migrationEnvironment } from '../environment.mjs';
import { runScript } from './child.mjs';
import { say } from './progress.mjs';

/** Where the seed writes the demo's accounts: `[{ role, email, password }]`. */
export const demoAccountsFile = join(stateFolder, 'demo-accounts.json');

/**
 * Brings the database to the newest migration and, in a demo, fills it when it is empty.
 *
 * @param {object} options
 * @param {Awaited<ReturnType<typeof import('#db/cluster.mjs').ensureCluster>>} options.cluster
 * @param {string} [options.database]
 * @param {boolean} options.seed whether this is a demo
 * @param {string} [options.accountsFile] where the seed leaves the demo's accounts
 * @param {AbortSignal} [options.signal]
 */
export async function prepareDatabase({ cluster, database = 'marram', seed, accountsFile = demoAccountsFile, signal }) {
  await withLock(stateFolder, `database-${database}`, async () => {
    await runScript('db/migrate.ts', { env: migrationEnvironment({ cluster, database }), signal });
    if (!seed || !isEmpty(cluster, database)) return;
    say('Filling the empty database with the demo academy');
    const env = { ...environmentOf({ cluster, database }), MARRAM_DEMO: '1', MARRAM_DEMO_ACCOUNTS: accountsFile };
    await runScript('db/seed/demo.ts', { env, signal });
  });
}

/** Whether no academy has been made in the database yet. */
function isEmpty(cluster, database) {
  const url = new URL(cluster.superuserUrl);
  const done = spawnSync(
    join(cluster.binaries, 'psql'),
    [
      '-XAt',
      '-h',
      url.hostname,
      '-p',
      url.port,
      '-U',
      url.username,
      '-c',
      'select not exists (select from academy)',
      database,
    ],
    // The password goes by the environment: a command line can be read by every user of the machine.
    { env: { ...databaseEnvironment, PGPASSWORD: url.password }, encoding: 'utf8', cwd: '/' },
  );
  if (done.status !== 0) throw new Error(`The database cannot be asked: ${done.stderr.trim()}`);
  return done.stdout.trim() === 't';
}
