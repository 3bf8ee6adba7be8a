import type { RequestHandler } from 'express';

/** Alive: the process answers. Says nothing of the database, or an outage would have a supervisor kill the process. */
export const healthz: RequestHandler = (_req, res) => {
  res.setHeader('Cache-Control', 'no-store');
  res.json({ status: 'ok', name: 'marram', pid: process.pid });
};

/** Ready: `check` passed within `limitMs`; else 503 with Retry-After. */
export function readyz(check: () => Promise<boolean>, limitMs = 2_000): RequestHandler {
  return async (_req, res) => {
    const ready = await withLimit(check, limitMs);
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
  const checked = check().catch(() => false);
  const answer = await Promise.race([checked, late]);
  clearTimeout(timer);
  return answer;
}
