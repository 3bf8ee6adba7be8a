import type { RequestHandler } from 'express';
import { refuse } from '#src/server/refuse.ts';

/** The host name of a Host header without its port, or undefined when the header is not one plain name. */
export function hostName(header: string | undefined): string | undefined {
  const match = /^([a-z0-9.-]{1,253})(?::\d{1,5})?$/i.exec(header ?? '');
  return match?.[1]?.toLowerCase();
}

/** Answers only for our own names: 400 without a readable Host, 421 for another's. */
export function hostGuard(hosts: ReadonlySet<string>): RequestHandler {
  return (req, res, next) => {
    const name = hostName(req.headers.host);
    if (name === undefined) refuse(req, res, 400);
    else if (!hosts.has(name)) refuse(req, res, 421);
    else next();
  };
}
