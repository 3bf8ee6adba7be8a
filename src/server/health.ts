import type { RequestHandler } from 'express';
import { describeError } from '#src/server/describeError.ts';
import type { Log } from '#src/server/log.ts';

/** Alive: the process answers. Says nothing of the database, or an outage would have a supervisor kill the process. */
export const healthz: RequestHandler = (_req, res) => {
  res.setHeader('Cache-Control', 'no-store');
  res.json({ status: 'ok', name: 'marram', pid: process.pid });
};

/** Ready: `check` passed within `limitMs`; else 503 with Retry-After. The log hears of each change, not of each probe. */
export function readyz(check: () => Promise<boolean>, log: Log, limitMs = 2_000): RequestHandler {
  let before: boolean | undefined;
  return async (_req, res) => {
    let reason: unknown;
    const ready = await withLimit(
      () =>
        check().catch((error: unknown) => {
          reason = error;
          return false;
        }),
      limitMs,
    );
    if (ready !== before) {
      if (ready) log.info('ready');
      else log.warn({ reason: reason === undefined ? 'check failed or late' : describeError(reason) }, 'not ready');
    }
    before = ready;
    res.setHeader('Cache-Control', 'no-store');
    if (!ready) res.setHeader('Retry-After', '2');
    res.status(ready ? 200 : 503).json({ status: ready ? 'ready' : 'not ready', name: 'marram', pid: process.pid });
  };
}

async function withLimit(check: () => Promise<boolean>, limitMs: number): Promise<boolean> {
  let timer: NodeJS.Timeout | undefined;
  const late = new Promise<boolean>((resolve) => {
    timer = setTimeout(() => resolve(false), limitMs);
  });
  const answer = await Promise.race([check(), late]);
  clearTimeout(timer);
  return answer;
}
