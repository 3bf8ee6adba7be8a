import pg from 'pg';
import { expect, it } from 'vitest';
import { createLog } from '#src/server/log.ts';
import { startWorker } from '#src/server/worker.ts';
import { useTestDatabase } from '#tests/config/testDatabase.ts';

const database = useTestDatabase();
const silent = createLog('silent');

async function query(text: string, values: unknown[] = []): Promise<Record<string, unknown>[]> {
  const client = new pg.Client({ connectionString: database().env['DATABASE_JOB_URL'] });
  await client.connect();
  try {
    return (await client.query<Record<string, unknown>>(text, values)).rows;
  } finally {
    await client.end();
  }
}

const work = (done: (payload: unknown) => void | Promise<void>, workerId = 'marram-1') =>
  startWorker({
    connectionString: database().env['DATABASE_JOB_URL'] ?? '',
    tasks: { probe: async (payload) => void (await done(payload)) },
    workerId,
    log: silent,
  });

it('runs a job under the name of its worker, and at a stop finishes it', async () => {
  let lockedBy: unknown;
  await query(`select graphile_worker.add_job('probe', '{"a":1}')`);
  let finished = () => {};
  const ran = new Promise<void>((resolve) => (finished = resolve));
  const worker = work(async () => {
    [{ locked_by: lockedBy } = { locked_by: undefined }] = await query('select locked_by from graphile_worker.jobs');
    finished();
  });
  await ran;
  await worker.stop();
  expect(lockedBy).toBe('marram-1');
  expect(await query('select from graphile_worker.jobs')).toEqual([]);
});

it('marks as done the job that ends while the worker is stopping', async () => {
  for (let i = 0; i < 10; i += 1) {
    await query(`select graphile_worker.add_job('probe', '{"a":1}')`);
    let stopped: Promise<void> | undefined;
    let finished = () => {};
    const ran = new Promise<void>((resolve) => (finished = resolve));
    const worker = work(async () => {
      stopped = worker.stop();
      await query('select 1');
      finished();
    });
    await ran;
    await stopped;
    expect(await query('select from graphile_worker.jobs')).toEqual([]);
  }
});

it('takes up at once the job that a killed worker of its name held, and leaves that of another', async () => {
  await query(
    `select graphile_worker.add_job('probe', '{"of":"mine"}'), graphile_worker.add_job('probe', '{"of":"other"}')`,
  );
  const held = `update graphile_worker._private_jobs set locked_at = now(), attempts = 1, locked_by = $1 where payload->>'of' = $2`;
  await query(held, ['marram-1', 'mine']);
  await query(held, ['marram-2', 'other']);
  const ran: unknown[] = [];
  let finished = () => {};
  const first = new Promise<void>((resolve) => (finished = resolve));
  const worker = work((payload) => {
    ran.push(payload);
    finished();
  });
  await first;
  await worker.stop();
  expect(ran).toEqual([{ of: 'mine' }]);
  expect(await query('select locked_by from graphile_worker.jobs')).toEqual([{ locked_by: 'marram-2' }]);
});
