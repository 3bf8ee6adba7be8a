import type { IncomingHttpHeaders } from 'node:http';
import type { RequestHandler } from 'express';

/**
 * Leaves in the headers only what may be believed of where a request comes from. A stranger's forwarding headers all go.
 * Of a configured proxy stays the last address it appended, and its protocol is the one of our public address.
 */
export function cleanForwarding(
  headers: IncomingHttpHeaders,
  peer: string,
  trusted: ReadonlySet<string>,
  https: boolean,
) {
  const address = trusted.has(peer)
    ? String(headers['x-forwarded-for'] ?? '')
        .split(',')
        .pop()
        ?.trim()
    : '';
  for (const name of Object.keys(headers)) {
    if (name.startsWith('x-forwarded-') || name === 'forwarded' || name === 'x-real-ip') delete headers[name];
  }
  const forwarded = address && /^[0-9a-f.:]{2,45}$/i.test(address) ? address : undefined;
  if (forwarded) headers['x-forwarded-for'] = forwarded;
  // What the limits count by: ours alone, whatever a stranger sent under this name.
  headers['x-marram-client'] = forwarded ?? peer;
  if (https && trusted.has(peer)) headers['x-forwarded-proto'] = 'https';
}

/** Cleans the forwarding headers before anything reads them. */
export function proxyHeaders(trusted: ReadonlySet<string>, https: boolean): RequestHandler {
  return (req, _res, next) => {
    const peer = (req.socket.remoteAddress ?? '').replace(/^::ffff:/, '');
    cleanForwarding(req.headers, peer, trusted, https);
    next();
  };
}
