import type { Task } from 'graphile-worker';
import { asJob } from '#src/db/client.ts';
import type { Jobs } from '#src/queue/enqueue.ts';
import { listJudgedBefore, rejudgeChanged } from '#src/services/judging/rejudgeOthers.ts';

const CHUNK = 20;

/** Judges the other athletes of an academy again after the programme's figures changed, in chunks. */
export const rejudgeOthers: Task = async (payload) => {
  const { academyId, exceptIds } = payload as Jobs['rejudgeOthers'];
  const others = await asJob(academyId, (trx) => listJudgedBefore(trx, exceptIds));
  for (let i = 0; i < others.length; i += CHUNK) {
    await asJob(academyId, (trx) => rejudgeChanged(trx, others.slice(i, i + CHUNK)));
  }
};
