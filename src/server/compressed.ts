import { constants } from 'node:zlib';
import compression from 'compression';
import type { RequestHandler } from 'express';

/** Brotli 4 or gzip for text over 1 kB. Event streams are left alone: compression would hold every event back. */
export function compressed(): RequestHandler {
  return compression({
    threshold: 1024,
    brotli: { params: { [constants.BROTLI_PARAM_QUALITY]: 4 } },
    filter: (req, res) => {
      if (String(res.getHeader('Content-Type') ?? '').startsWith('text/event-stream')) return false;
      return compression.filter(req, res);
    },
  });
}
