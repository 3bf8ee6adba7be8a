import { pathToFileURL } from 'node:url';
import { Logger, runMigrations } from 'graphile-worker';
import { Kysely, Migrator, PostgresDialect, type Migration } from 'kysely';
import pg from 'pg';
import * as people from '#db/migrations/0001_people.ts';
import * as testing from '#db/migrations/0002_testing.ts';
import * as driver from '#db/migrations/0003_driver.ts';
import * as outrun from '#db/migrations/0004_outrun.ts';
import * as jobs from '#db/migrations/0005_jobs.ts';
import * as coaching from '#db/migrations/0006_coaching.ts';

/** Every migration, oldest first. A shipped one is never edited. */
export const migrations: Readonly<Record<string, Migration>> = {
  '0001_people': people,
  '0002_testing': testing,
  '0003_driver': driver,
  '0004_outrun': outrun,
  '0005_jobs': jobs,
  '0006_coaching': coaching,
};

export interface MigrateOptions {
  /** Connection of the cluster's superuser, any database. */
  superuserUrl: string;
  /** Database to make if it is not there. */
  database: string;
  /** Password of each role: marram_owner, marram_app, marram_auth, marram_job, marram_backup. */
  rolePasswords: Readonly<Record<string, string>>;
}

/**
 * Makes the roles and the database if they are missing and brings the schema to the newest migration.
 * Safe to run twice and from two processes at once.
 *
 * @throws the first migration's error; nothing of that migration stays.
 */
export async function migrate({ superuserUrl, database, rolePasswords }: MigrateOptions): Promise<void> {
  await withClient(superuserUrl, async (client) => {
    // One at a time: two starts on one cluster would race for the same roles.
    await client.query('select pg_advisory_lock(724001)');
    await makeRoles(client, rolePasswords);
    const found = await client.query('select from pg_database where datname = $1', [database]);
    if (found.rowCount === 0) {
      await client.query(`create database ${client.escapeIdentifier(database)} owner marram_owner encoding 'UTF8'`);
    }
    await withClient(urlOf(superuserUrl, { database }), async (inside) => {
      await inside.query(`
        revoke all on schema public from public;
        grant usage, create on schema public to marram_owner;
        revoke connect, temporary on database ${inside.escapeIdentifier(database)} from public;
        grant connect on database ${inside.escapeIdentifier(database)} to marram_app, marram_auth, marram_job, marram_backup;
        grant create on database ${inside.escapeIdentifier(database)} to marram_owner, marram_job`);
    });
    await runMigrations({
      connectionString: urlOf(superuserUrl, { database, user: 'marram_job', password: rolePasswords['marram_job'] }),
      logger: quietLogger(),
    });
    await runOwn(urlOf(superuserUrl, { database, user: 'marram_owner', password: rolePasswords['marram_owner'] }));
    await withClient(urlOf(superuserUrl, { database }), async (inside) => {
      await inside.query(`
        grant select on all tables in schema public to marram_backup;
        grant select on all sequences in schema public to marram_backup;
        grant select on kysely_migration to marram_app`);
    });
  });
}

async function makeRoles(client: pg.Client, passwords: Readonly<Record<string, string>>): Promise<void> {
  const attributes: Readonly<Record<string, string>> = {
    marram_owner: 'bypassrls',
    marram_app: 'nobypassrls',
    marram_auth: 'nobypassrls',
    marram_job: 'nobypassrls',
    marram_backup: 'bypassrls',
  };
  for (const [role, attribute] of Object.entries(attributes)) {
    const password = passwords[role];
    if (!password) throw new Error(`migrate requires a password for ${role}`);
    const found = await client.query('select from pg_roles where rolname = $1', [role]);
    const verb = found.rowCount === 0 ? 'create' : 'alter';
    await client.query(
      `${verb} role ${role} login nosuperuser nocreatedb nocreaterole ${attribute} password ${client.escapeLiteral(password)}`,
    );
  }
  // The enqueue function belongs to the owner and writes the queue's tables, which belong to the jobs' role.
  await client.query('grant marram_job to marram_owner');
  await client.query(`alter role marram_app set statement_timeout = '15s'`);
  await client.query(`alter role marram_app set idle_in_transaction_session_timeout = '30s'`);
  await client.query(`alter role marram_app set lock_timeout = '8s'`);
}

async function runOwn(ownerUrl: string): Promise<void> {
  const db = new Kysely<unknown>({
    dialect: new PostgresDialect({ pool: new pg.Pool({ connectionString: ownerUrl, max: 2 }) }),
  });
  try {
    const migrator = new Migrator({ db, provider: { getMigrations: () => Promise.resolve({ ...migrations }) } });
    const { error } = await migrator.migrateToLatest();
    if (error) throw error;
  } finally {
    await db.destroy();
  }
}

async function withClient<T>(connectionString: string, work: (client: pg.Client) => Promise<T>): Promise<T> {
  const client = new pg.Client({ connectionString });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

/** The same server with another database, user or password. */
export function urlOf(
  base: string,
  parts: { database?: string; user?: string; password?: string | undefined },
): string {
  const url = new URL(base);
  if (parts.database) url.pathname = `/${parts.database}`;
  if (parts.user) url.username = parts.user;
  if (parts.password) url.password = parts.password;
  return url.toString();
}

/** The queue's own migrations are not news to the person who starts the product. */
function quietLogger() {
  return new Logger(() => () => undefined);
}

if (process.argv[1] && import.meta.url === pathToFileURL(process.argv[1]).href) {
  const { MARRAM_SUPERUSER_URL, MARRAM_DATABASE, MARRAM_ROLE_PASSWORDS } = process.env;
  await migrate({
    superuserUrl: MARRAM_SUPERUSER_URL ?? '',
    database: MARRAM_DATABASE ?? 'marram',
    rolePasswords: JSON.parse(MARRAM_ROLE_PASSWORDS ?? '{}') as Record<string, string>,
  });
}
