import { closeDatabases } from '#src/db/client.ts';
import { tasks } from '#src/jobs/index.ts';
import { startDemoMail } from '#src/server/demoMail.ts';
import { stopOnSignals } from '#src/server/gracefulStop.ts';
import { createLog } from '#src/server/log.ts';
import { readSettings } from '#src/server/settings.ts';
import { startWorker } from '#src/server/worker.ts';

/** The job queue beside the development server, which has no room for it. */
const settings = readSettings(process.env);
const log = createLog(settings.logLevel);
// Its messages stay in this process: the development server's own /dev/mail page says so.
const demoMail = await startDemoMail(process.env);
const connectionString = process.env['DATABASE_JOB_URL'] ?? '';
const worker = startWorker({ connectionString, tasks, workerId: `marram-${settings.port}`, log });
// Keeps the process alive while the queue has nothing to wait on.
const alive = setInterval(() => undefined, 60_000);

stopOnSignals(async () => {
  clearInterval(alive);
  await worker.stop();
  await demoMail?.close();
  await closeDatabases();
}, 18_000);
