import pg from 'pg';
import type { TestProject } from 'vitest/node';
import { isRunning } from '#db/cluster/processes.mjs';
import { stateFolder } from '#db/cluster/paths.mjs';
import { withLock } from '#db/cluster/withLock.mjs';
import { runScript } from '#src/server/launch/child.mjs';
import { migrationEnvironment } from '#src/server/environment.mjs';
import { ensureTestCluster, templateName } from '#tests/config/testCluster.mjs';

/** What a test needs to make databases of its own; see `createTestDatabase`. */
export interface TestCluster {
  host: string;
  port: number;
  superuserUrl: string;
  template: string;
  rolePasswords: Record<string, string>;
  authSecret: string;
}

declare module 'vitest' {
  interface ProvidedContext {
    testCluster: TestCluster;
  }
}

/** Starts the tests' PostgreSQL and migrates one template database, which each test file copies. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const cluster = await ensureTestCluster();
  const template = templateName();
  await withLock(stateFolder, 'test-template', () => makeTemplate(cluster, template));
  project.provide('testCluster', {
    host: cluster.host,
    port: cluster.port,
    superuserUrl: cluster.superuserUrl,
    template,
    rolePasswords: cluster.secrets.roles,
    authSecret: cluster.secrets.authSecret,
  });
  return () => cluster.stop();
}

async function makeTemplate(cluster: Awaited<ReturnType<typeof ensureTestCluster>>, template: string): Promise<void> {
  const client = new pg.Client({ connectionString: cluster.superuserUrl });
  await client.connect();
  try {
    const { rows } = await client.query<{ datname: string; datistemplate: boolean }>(
      `select datname, datistemplate from pg_database where datname like any (array['template\\_%', 'test\\_%']) order by oid`,
    );
    await dropLeftovers(client, rows, template);
    // Only a finished template is marked as one: a half-made one is made again.
    if (rows.some((row) => row.datname === template && row.datistemplate)) return;
    await client.query(`drop database if exists ${template} with (force)`);
    await runScript('db/migrate.ts', { env: migrationEnvironment({ cluster, database: template }) });
    await client.query(`alter database ${template} is_template true`);
  } finally {
    await client.end();
  }
}

/** Databases of test runs that were killed (their name holds the process), and templates of older migrations. */
async function dropLeftovers(client: pg.Client, rows: { datname: string }[], template: string): Promise<void> {
  const dead = rows.filter(({ datname }) => {
    const pid = /^test_(\d+)_/.exec(datname)?.[1];
    return pid !== undefined && !isRunning(Number(pid));
  });
  const old = rows
    .filter(({ datname }) => /^template_[0-9a-f]{12}$/.test(datname) && datname !== template)
    .slice(0, -2);
  for (const { datname } of old) await client.query(`alter database ${datname} is_template false`);
  for (const { datname } of [...dead, ...old]) await client.query(`drop database if exists ${datname} with (force)`);
}
