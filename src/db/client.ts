import { Kysely, PostgresDialect, sql, type Transaction } from 'kysely';
import pg from 'pg';
import type { Viewer } from '#src/access/viewer.ts';
import type { DB } from '#src/db/types.ts';

/** A transaction in which the viewer is set: what every query on personal data takes. */
export type Tx = Transaction<DB>;

// A date is a day on a calendar, not a moment: it stays text from the database to the page.
pg.types.setTypeParser(1082, String);
pg.types.setTypeParser(20, Number);
pg.types.setTypeParser(1700, Number);

interface Opened {
  db: Kysely<DB>;
  pool: pg.Pool;
}
const opened = new Map<string, Opened>();

function open(name: string, max: number): Opened {
  const known = opened.get(name);
  if (known) return known;
  const connectionString = process.env[name];
  if (!connectionString) throw new Error(`${name} is not set`);
  const pool = new pg.Pool({ connectionString, max, connectionTimeoutMillis: 4_000, idleTimeoutMillis: 30_000 });
  // Without a listener, a backend that the server ends takes the process with it.
  pool.on('error', () => undefined);
  const connection = { db: new Kysely<DB>({ dialect: new PostgresDialect({ pool }) }), pool };
  opened.set(name, connection);
  return connection;
}

/** The application's connections: a role that owns nothing and cannot pass row security. */
export const appDb = () => open('DATABASE_URL', 10).db;

/** Sign-in and sessions, which happen before there is a viewer. */
export const authDb = () => open('DATABASE_AUTH_URL', 6).db;

/** The same connections as a plain pool, for the limiter, which brings its own statements. */
export const authPool = () => open('DATABASE_AUTH_URL', 6).pool;

/** Jobs, one academy at a time. */
export const jobDb = () => open('DATABASE_JOB_URL', 3).db;

/** Set-up of a new academy and the demo, from the command line only. */
export const ownerDb = () => open('DATABASE_OWNER_URL', 2).db;

/** A pool of the queue's own: whoever makes it ends it, and by that waits for what is still on its way. */
export function makeQueuePool(connectionString: string): pg.Pool {
  const pool = new pg.Pool({ connectionString, max: 4, connectionTimeoutMillis: 4_000 });
  pool.on('error', () => undefined);
  pool.on('connect', (client) => client.on('error', () => undefined));
  return pool;
}

/** Closes every pool that this process opened. */
export async function closeDatabases(): Promise<void> {
  await Promise.all([...opened.values()].map(({ db }) => db.destroy()));
  opened.clear();
}

/**
 * The one door to personal data: opens a transaction, tells the database who is looking (for this transaction only),
 * and hands it to the work. Anything thrown rolls all of it back.
 */
export function asViewer<T>(viewer: Viewer, work: (trx: Tx) => Promise<T>): Promise<T> {
  return appDb()
    .transaction()
    .execute(async (trx) => {
      await sql`select set_config('app.academy', ${viewer.academyId}, true),
                       set_config('app.person', ${viewer.personId}, true),
                       set_config('app.role', ${viewer.role}, true)`.execute(trx);
      return work(trx);
    });
}

/** The same door for a job: rows of one academy, whoever they belong to. */
export function asJob<T>(academyId: string, work: (trx: Tx) => Promise<T>): Promise<T> {
  return jobDb()
    .transaction()
    .execute(async (trx) => {
      await sql`select set_config('app.academy', ${academyId}, true)`.execute(trx);
      return work(trx);
    });
}

/**
 * The door for what happens before there is a viewer and writes in one academy: an invitation accepted, a password
 * reset. Policies of this role say which tables.
 */
export function asAuth<T>(academyId: string, work: (trx: Tx) => Promise<T>): Promise<T> {
  return authDb()
    .transaction()
    .execute(async (trx) => {
      await sql`select set_config('app.academy', ${academyId}, true)`.execute(trx);
      return work(trx);
    });
}
