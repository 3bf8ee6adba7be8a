import type { TaskList } from 'graphile-worker';
import { rejudgeOthers } from '#src/jobs/rejudgeOthers.ts';
import { sendMail } from '#src/jobs/sendMail.ts';

/** Every job by its name in the queue. */
export const tasks: TaskList = { rejudgeOthers, sendMail };
