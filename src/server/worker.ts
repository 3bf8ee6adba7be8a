import { EventEmitter } from 'node:events';
import { Logger, makeWorkerUtils, run, type Runner, type TaskList, type WorkerEvents } from 'graphile-worker';
import { makeQueuePool } from '#src/db/client.ts';
import { describeError, describeText } from '#src/server/describeError.ts';
import type { Log } from '#src/server/log.ts';

export interface WorkerParts {
  connectionString: string;
  tasks: TaskList;
  /** Names the locks of this worker. The same after a restart, and never that of another running worker. */
  workerId: string;
  log: Log;
}

/**
 * Runs the job queue in this process, and again after an outage of the database, until stopped. First it lets go of the
 * locks that an earlier, dead worker of the same name left: nobody else would for four hours.
 */
export function startWorker(parts: WorkerParts): { stop: () => Promise<void> } {
  let stopping = false;
  let runner: Runner | undefined;
  let wake = () => {};
  const loop = (async () => {
    for (let waitMs = 1_000; !stopping; waitMs = Math.min(waitMs * 2, 30_000)) {
      try {
        await releaseLocks(parts);
        await withQueuePool(parts, async (pool) => {
          runner = await runOnce(parts, pool);
          if (stopping) await runner.stop();
          waitMs = 1_000;
          await runner.promise;
        });
      } catch (error) {
        parts.log.warn({ error: describeError(error) }, 'job queue is waiting for the database');
      }
      runner = undefined;
      if (stopping) return;
      await new Promise<void>((resolve) => {
        const timer = setTimeout(resolve, waitMs);
        wake = () => {
          clearTimeout(timer);
          resolve();
        };
      });
    }
  })();
  return {
    stop: async () => {
      stopping = true;
      wake();
      await runner?.stop().catch(() => undefined);
      await loop;
    },
  };
}

async function releaseLocks({ connectionString, workerId, log }: WorkerParts): Promise<void> {
  const utils = await makeWorkerUtils({ connectionString, logger: queueLogger(log) });
  try {
    await utils.forceUnlockWorkers([workerId]);
  } finally {
    await utils.release();
  }
}

type QueuePool = ReturnType<typeof makeQueuePool>;

// The library does not wait until a finished job is marked as done. A turn of the event loop lets that statement take its
// connection, and ending a pool of our own waits until the connection is given back.
async function withQueuePool(
  { connectionString }: WorkerParts,
  work: (pool: QueuePool) => Promise<void>,
): Promise<void> {
  const pool = makeQueuePool(connectionString);
  try {
    await work(pool);
  } finally {
    await new Promise((resolve) => setImmediate(resolve));
    await pool.end();
  }
}

function runOnce({ tasks, workerId, log }: WorkerParts, pgPool: QueuePool): Promise<Runner> {
  const events = new EventEmitter() as WorkerEvents;
  // The locks carry the pool's id, which is random and has no option: it is named here, before its first job.
  events.on('pool:create', ({ workerPool }) => {
    workerPool.id = workerId;
  });
  return run({
    pgPool,
    taskList: tasks,
    events,
    concurrency: 1,
    noHandleSignals: true,
    logger: queueLogger(log),
    preset: { worker: { gracefulShutdownAbortTimeout: 5_000 } },
  });
}

function queueLogger(log: Log): Logger {
  return new Logger(() => (level, message) => {
    const name = level === 'warning' ? 'warn' : level;
    log[name === 'info' ? 'debug' : name]({ from: 'jobs' }, describeText(message));
  });
}
