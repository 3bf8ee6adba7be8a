import type { NextFunction, Request, Response } from 'express';
import { refuse } from '#src/server/refuse.ts';

const longestPath = 2048;

/**
 * Whether a request target is written in a way that routers read differently: doubled or back slashes, encoded slashes,
 * dots, per cents, letters or controls, dot segments, a broken encoding, an absolute form. No link of ours is.
 */
export function isOddTarget(target: string): boolean {
  if (target.length > longestPath) return true;
  const path = target.split('?', 1)[0] ?? '';
  if (!path.startsWith('/') || path.includes('//') || /[\\#\u0000-\u0020\u007f-\uffff]/.test(path)) return true;
  for (const [, hex] of path.matchAll(/%(.{0,2})/g)) {
    if (!/^[0-9a-f]{2}$/i.test(hex ?? '')) return true;
    const character = String.fromCharCode(Number.parseInt(hex ?? '', 16));
    // Slash, backslash, per cent, and everything that needs no encoding.
    if (/[\u0000-\u001f\u007f/\\%A-Za-z0-9._~-]/.test(character)) return true;
  }
  if (path.split('/').some((segment) => segment === '.' || segment === '..')) return true;
  try {
    decodeURIComponent(path);
    return false;
  } catch {
    return true;
  }
}

/** Paths that the framework would answer by itself and that this product does not use. */
const closed = /^\/(_image|_server-islands)(\/|$)/i;

/** Answers 404 to odd targets and closed paths, before anything routes. */
export function pathGuard(req: Request, res: Response, next: NextFunction): void {
  if (isOddTarget(req.originalUrl) || closed.test(req.path)) refuse(req, res, 404);
  else next();
}
