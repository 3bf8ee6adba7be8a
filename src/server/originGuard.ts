import type { IncomingHttpHeaders } from 'node:http';
import type { RequestHandler } from 'express';
import { refuse } from '#src/server/refuse.ts';

const safe = new Set(['GET', 'HEAD']);
const unsafe = new Set(['POST', 'PUT', 'PATCH', 'DELETE']);

/** Calculators: no session, no personal data, nothing stored. Programs, which send no Origin, may call them. */
const open = /^\/api\/method\//;

/**
 * Whether an unsafe request comes from one of our own pages: its Origin is exactly ours, or, where the browser hides the
 * origin, it vouches for same-origin itself (a page cannot set that header). Whatever the content type.
 */
export function isFromOwnPage(headers: IncomingHttpHeaders, path: string, origins: ReadonlySet<string>): boolean {
  const { origin } = headers;
  const site = headers['sec-fetch-site'];
  if (site !== undefined && site !== 'same-origin') return false;
  if (origin !== undefined && origin !== 'null') return origins.has(origin);
  if (site === 'same-origin') return true;
  return origin === undefined && open.test(path);
}

/** Unsafe requests of other sites get 403, methods that nothing here uses 405. */
export function originGuard(origins: ReadonlySet<string>): RequestHandler {
  return (req, res, next) => {
    if (safe.has(req.method)) next();
    else if (!unsafe.has(req.method)) refuse(req, res, 405);
    else if (isFromOwnPage(req.headers, req.path, origins)) {
      nameOwnOrigin(req.headers, origins);
      next();
    } else refuse(req, res, 403);
  };
}

/**
 * A page whose address holds a token sends no Referer, and so its form has the origin `null`. Once the browser has
 * vouched for it, it is named as ours: what routes behind this guard compares the origin again, by name alone.
 */
function nameOwnOrigin(headers: IncomingHttpHeaders, origins: ReadonlySet<string>): void {
  if (headers.origin !== 'null') return;
  const own = [...origins].find((origin) => new URL(origin).host === headers.host);
  if (own) headers.origin = own;
}
