import { randomUUID } from 'node:crypto';
import type { RequestHandler } from 'express';
import type { Log } from '#src/server/log.ts';
import { routeName } from '#src/server/routeName.ts';

/** Asked every few seconds for as long as the product runs: only their changes are news. */
const probes = new Set(['/healthz', '/readyz']);

/**
 * Gives each request an id (also in the answer, as the reference that a person can quote) and writes one line when it is
 * over. A path that nothing answers is not written: it is a stranger's text.
 */
export function accessLog(log: Log): RequestHandler {
  return (req, res, next) => {
    const start = process.hrtime.bigint();
    const requestId = randomUUID();
    res.locals['requestId'] = requestId;
    res.setHeader('X-Request-Id', requestId);
    res.once('close', () => {
      const ms = Number(process.hrtime.bigint() - start) / 1e6;
      const status = res.statusCode;
      const refused = status === 400 || status === 404 || status === 421;
      const route = refused ? '(none)' : routeName(req.originalUrl);
      const line = { requestId, method: req.method, route, status, ms: Math.round(ms * 10) / 10 };
      if (probes.has(route)) log.debug(line, 'request');
      else if (!res.writableFinished) log.info({ ...line, cut: true }, 'request');
      else log[status >= 500 ? 'error' : 'info'](line, 'request');
    });
    next();
  };
}
