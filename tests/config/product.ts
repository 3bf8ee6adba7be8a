import { readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import pg from 'pg';
import { freePort } from '#db/cluster/freePort.mjs';
import { stateFolder } from '#db/cluster/paths.mjs';
import { environmentOf, serverEnvironment } from '#src/server/environment.mjs';
import { ensureBuild } from '#src/server/launch/build.mjs';
import { prepareDatabase } from '#src/server/launch/database.mjs';
import { answers, spawnServer, stopChild } from '#src/server/launch/server.mjs';
import { ensureTestCluster } from '#tests/config/testCluster.mjs';

export interface DemoAccount {
  role: string;
  email: string;
  password: string;
}

/** The running product with the demo in a database of its own. */
export interface RunningProduct {
  baseUrl: string;
  accounts: DemoAccount[];
  /** The addresses of its database by role, as the application reads them. */
  env: Record<string, string>;
  superuserUrl: string;
  /** Its log: one JSON object a line. */
  logFile: string;
}

/** Starts the built product on a free port with a fresh demo; `stop` ends it and drops its database. */
export async function startProduct(name: string): Promise<{ product: RunningProduct; stop: () => Promise<void> }> {
  await ensureBuild();
  const cluster = await ensureTestCluster();
  const database = `test_${process.pid}_${name}`;
  const accountsFile = join(stateFolder, `accounts-${database}.json`);
  const logFile = join(stateFolder, `${name}-server.log`);
  rmSync(logFile, { force: true });
  await prepareDatabase({ cluster, database, seed: true, accountsFile });
  const accounts = JSON.parse(readFileSync(accountsFile, 'utf8')) as DemoAccount[];
  rmSync(accountsFile);

  const port = await freePort();
  const baseUrl = `http://127.0.0.1:${port}`;
  const child = spawnServer({ ...serverEnvironment({ cluster, database, port }), PUBLIC_URL: baseUrl }, logFile);
  if (!(await answers(`${baseUrl}/readyz`, child, 60_000))) {
    await stopChild(child);
    throw new Error(`The server did not get ready. Its log: ${logFile}`);
  }
  const superuserUrl = new URL(cluster.superuserUrl);
  superuserUrl.pathname = `/${database}`;
  return {
    product: {
      baseUrl,
      accounts,
      env: environmentOf({ cluster, database, port }),
      superuserUrl: superuserUrl.toString(),
      logFile,
    },
    stop: async () => {
      await stopChild(child);
      await dropDatabase(cluster.superuserUrl, database);
      await cluster.stop();
    },
  };
}

async function dropDatabase(superuserUrl: string, database: string): Promise<void> {
  const client = new pg.Client({ connectionString: superuserUrl });
  await client.connect();
  await client.query(`drop database if exists ${database} with (force)`).finally(() => client.end());
}
