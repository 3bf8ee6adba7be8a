import type { Tx } from '#src/db/client.ts';
import { addJob } from '#src/db/queries/jobs.ts';

/** Every job with what it carries: ids alone, never what they stand for. */
export interface Jobs {
  rejudgeOthers: { academyId: string; exceptIds: string[] };
  sendMail: { academyId: string };
}

/**
 * Puts a job in the queue, in the transaction of the data that asks for it: both stay or neither. Jobs of one key
 * replace each other while they wait.
 */
export const enqueue = <Name extends keyof Jobs>(
  trx: Tx,
  name: Name,
  payload: Jobs[Name],
  key: string,
): Promise<void> => addJob(trx, name, payload, `${name}:${key}`);
