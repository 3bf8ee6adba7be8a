import type { ErrorRequestHandler } from 'express';
import { describeError } from '#src/server/describeError.ts';
import type { Log } from '#src/server/log.ts';
import { refuse } from '#src/server/refuse.ts';

/** Whatever nobody caught: the log learns where, the person a reference, nobody a stack. */
export function lastResort(log: Log): ErrorRequestHandler {
  return (error, req, res, next) => {
    log.error({ requestId: res.locals['requestId'], error: describeError(error) }, 'unhandled');
    if (res.headersSent) next(error);
    else refuse(req, res, 500);
  };
}
