import { sql } from 'kysely';
import type { Tx } from '#src/db/client.ts';

/** Adds a listed job through the owner's function; the application's role has no right on the queue itself. */
export async function addJob(trx: Tx, task: string, payload: unknown, key: string): Promise<void> {
  await sql`select app.enqueue(${task}, ${JSON.stringify(payload)}::jsonb, ${key})`.execute(trx);
}
