import type { NextFunction, Request, Response } from 'express';
import { refusal, refuse } from '#src/server/refuse.ts';

const kB = 1024;
const MB = 1024 * kB;

/** How many bytes a body may have, by path; the first match counts. Uploads are listed here and nowhere else. */
export const bodyCaps: readonly { path: RegExp; maxBytes: number }[] = [
  { path: /^\/api\/method\//, maxBytes: 2 * MB },
  { path: /^\/api\/(imports|uploads|driver-sessions\/import|ground-traces|curves)(\/|$)/, maxBytes: 12 * MB },
  { path: /^\//, maxBytes: 256 * kB },
];

/** The cap of a path, in bytes. */
export function bodyCapOf(path: string): number {
  return bodyCaps.find((each) => each.path.test(path))?.maxBytes ?? 0;
}

/**
 * Caps bodies in front of whoever parses them, by announced length and by count while streaming. `req.body` becomes a
 * stream that throws at the cap; whatever the handler then answers is replaced by 413. Compressed bodies are not taken.
 */
export function bodyCap(req: Request, res: Response, next: NextFunction): void {
  const encoding = req.headers['content-encoding'];
  if (encoding !== undefined && encoding !== 'identity') {
    closeAfter(req, res);
    return refuse(req, res, 415);
  }
  const maxBytes = bodyCapOf(req.path);
  if (Number(req.headers['content-length'] ?? 0) > maxBytes) {
    closeAfter(req, res);
    return refuse(req, res, 413);
  }
  if (req.headers['content-length'] !== undefined || req.headers['transfer-encoding'] !== undefined) {
    req.body = counted(req, maxBytes, () => answerTooLarge(req, res));
  }
  res.once('finish', () => {
    if (!req.complete) linger(req);
  });
  next();
}

async function* counted(req: Request, maxBytes: number, onTooLarge: () => void): AsyncGenerator<Buffer> {
  let bytes = 0;
  for await (const chunk of req as AsyncIterable<Buffer>) {
    bytes += chunk.length;
    if (bytes > maxBytes) {
      onTooLarge();
      throw new Error(`The body is larger than ${maxBytes} bytes`);
    }
    yield chunk;
  }
}

/** Turns whatever is answered from now on into 413. */
function answerTooLarge(req: Request, res: Response): void {
  if (res.headersSent) return;
  const body = JSON.stringify(refusal(413, String(res.locals['requestId'] ?? '')));
  const writeHead = res.writeHead.bind(res) as (status: number, headers: Record<string, string | number>) => Response;
  const end = res.end.bind(res) as (body?: string) => Response;
  let done = false;
  const finish = () => {
    if (done) return res;
    done = true;
    for (const name of res.getHeaderNames()) if (name.startsWith('content-')) res.removeHeader(name);
    closeAfter(req, res);
    writeHead(413, {
      'Content-Type': 'application/problem+json',
      'Content-Security-Policy': "default-src 'none'",
      'Content-Length': Buffer.byteLength(body),
      'Cache-Control': 'no-store',
    });
    return end(body);
  };
  Object.assign(res, { writeHead: () => res, flushHeaders: () => undefined, write: () => true, end: finish });
}

function closeAfter(req: Request, res: Response): void {
  res.setHeader('Connection', 'close');
  res.once('finish', () => linger(req));
}

/** Reads on for two seconds at most: closing at once would reset the connection before the answer is read. */
function linger(req: Request): void {
  const { socket } = req;
  req.resume();
  setTimeout(() => socket.destroy(), 2_000).unref();
}
