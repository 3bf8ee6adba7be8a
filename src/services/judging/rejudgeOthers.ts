import type { Tx } from '#src/db/client.ts';
import { listJudgedAthletes } from '#src/db/queries/judgedAthletes.ts';
import { rejudgeWithin } from '#src/services/judging/judgeAthletes.ts';

/** Athletes of the academy that have been judged, except these. */
export async function listJudgedBefore(trx: Tx, exceptIds: readonly string[]): Promise<string[]> {
  const excepted = new Set(exceptIds);
  return (await listJudgedAthletes(trx)).filter((id) => !excepted.has(id));
}

/** Judges athletes again with the programme's figures as they are now; it asks for no further judging. */
export async function rejudgeChanged(trx: Tx, athleteIds: readonly string[]): Promise<void> {
  await rejudgeWithin(trx, null, athleteIds, 'the programme’s figures changed');
}
