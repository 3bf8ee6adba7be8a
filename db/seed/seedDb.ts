import type { Kysely } from 'kysely';
import type { DB } from '#src/db/types.ts';

/** The owner's connection, which set-up alone uses. */
export type SeedDb = Kysely<DB>;

/** Inserts rows in slices that one statement can carry. */
export async function inSlices<T>(
  rows: readonly T[],
  insert: (slice: T[]) => Promise<unknown>,
  size = 500,
): Promise<void> {
  for (let i = 0; i < rows.length; i += size) await insert(rows.slice(i, i + size));
}
