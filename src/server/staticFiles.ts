import type { RequestHandler } from 'express';
import sirv from 'sirv';
import { strictPolicy } from '#src/server/headers.ts';

/** A worker obeys the policy that its own file came with: it may talk to this server and nobody else. */
const scriptPolicy = `${strictPolicy}; connect-src 'self'; script-src 'self'`;

/**
 * The built client files. A name below `/_astro/` holds the hash of its content and never changes; anything else is
 * asked again. Files compressed by the build are sent as they are.
 */
export function staticFiles(folder: string): RequestHandler {
  const serve = sirv(folder, {
    etag: true,
    extensions: [],
    brotli: true,
    gzip: true,
    setHeaders: (res, path) => {
      const hashed = path.startsWith('/_astro/');
      res.setHeader('Cache-Control', hashed ? 'public, max-age=31536000, immutable' : 'no-cache');
      if (path.endsWith('.js')) res.setHeader('Content-Security-Policy', scriptPolicy);
    },
  });
  return (req, res, next) => {
    if (req.method === 'GET' || req.method === 'HEAD') serve(req, res, next);
    else next();
  };
}
