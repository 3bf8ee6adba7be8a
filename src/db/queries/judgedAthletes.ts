import type { Tx } from '#src/db/client.ts';

/** Ids of the athletes that have a judgement, in scope of the transaction. */
export async function listJudgedAthletes(trx: Tx): Promise<string[]> {
  const rows = await trx.selectFrom('judgement').select('athlete_id').distinct().execute();
  return rows.map(({ athlete_id: id }) => id);
}
