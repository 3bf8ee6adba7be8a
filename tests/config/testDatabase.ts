import pg from 'pg';
import { afterAll, beforeAll, inject } from 'vitest';
import { closeDatabases } from '#src/db/client.ts';
import { environmentOf } from '#src/server/environment.mjs';

/** A database of a test's own, freshly copied from the migrated template. */
export interface TestDatabase {
  name: string;
  /** The addresses by role, as the application reads them from its environment. */
  env: Record<string, string>;
  superuserUrl: string;
  drop: () => Promise<void>;
}

let made = 0;

/** Copies the template; about a tenth of a second. Whoever calls it drops it. */
export async function createTestDatabase(): Promise<TestDatabase> {
  const cluster = inject('testCluster');
  made += 1;
  const name = `test_${process.pid}_${Date.now().toString(36)}_${made}`;
  const secrets = { superuser: '', authSecret: cluster.authSecret, roles: cluster.rolePasswords };
  await asSuperuser(cluster.superuserUrl, [
    `create database ${name} template ${cluster.template} owner marram_owner`,
    // What `migrate` grants on a database is not copied with it.
    `revoke connect, temporary on database ${name} from public`,
    `grant connect on database ${name} to marram_app, marram_auth, marram_job, marram_backup`,
    `grant create on database ${name} to marram_owner, marram_job`,
  ]);
  const superuserUrl = new URL(cluster.superuserUrl);
  superuserUrl.pathname = `/${name}`;
  return {
    name,
    env: environmentOf({ cluster: { ...cluster, secrets }, database: name, port: 4321 }),
    superuserUrl: superuserUrl.toString(),
    drop: () => asSuperuser(cluster.superuserUrl, [`drop database if exists ${name} with (force)`]),
  };
}

/**
 * For the whole test file: a database of its own, and the application's pools pointed at it.
 *
 * @returns a function that gives the database, to be called inside tests and hooks
 */
export function useTestDatabase(): () => TestDatabase {
  let database: TestDatabase | undefined;
  beforeAll(async () => {
    await closeDatabases();
    database = await createTestDatabase();
    Object.assign(process.env, database.env);
  });
  afterAll(async () => {
    await closeDatabases();
    await database?.drop();
  });
  return () => {
    if (!database) throw new Error('useTestDatabase requires a running test');
    return database;
  };
}

async function asSuperuser(connectionString: string, statements: string[]): Promise<void> {
  const client = new pg.Client({ connectionString });
  await client.connect();
  try {
    for (const statement of statements) await client.query(statement);
  } finally {
    await client.end();
  }
}
