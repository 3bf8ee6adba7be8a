import type { Insertable } from 'kysely';
import type { Tx } from '#src/db/client.ts';
import { inParts } from '#src/db/queries/inParts.ts';
import type { Curve } from '#src/db/types.ts';

/** Which of these contents are already kept as curves. */
export function listCurveHashes(trx: Tx, hashes: readonly Buffer[]): Promise<{ source_hash: Buffer }[]> {
  return trx
    .selectFrom('curve')
    .select('source_hash')
    .where('source_hash', 'in', [...hashes])
    .execute();
}

/** Adds curves. */
export const insertCurves = (trx: Tx, rows: readonly Insertable<Curve>[]): Promise<void> =>
  inParts(rows, (part) => trx.insertInto('curve').values(part).execute());
