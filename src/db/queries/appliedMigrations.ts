import { sql, type Kysely } from 'kysely';

/** Names of the migrations that have run on this database, in the order of their names. */
export async function appliedMigrations<T>(db: Kysely<T>): Promise<string[]> {
  const { rows } = await sql<{ name: string }>`select name from public.kysely_migration order by name`.execute(db);
  return rows.map((row) => row.name);
}
