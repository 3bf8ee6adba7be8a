import { Readable } from 'node:stream';
import type { IncomingMessage } from 'node:http';
import type { PageHandler } from '#src/server/app.ts';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { serve, type Served } from '#tests/integration/server/serve.ts';

const kB = 1024;
let site: Served;
let impatient: Served;
let seen = 0;

beforeAll(async () => {
  site = await serve(readAll);
  impatient = await serve(readAll, {
    server: { requestTimeout: 300, headersTimeout: 300, connectionsCheckingInterval: 50 },
  });
});
afterAll(() => Promise.all([site.close(), impatient.close()]));

/** As the pages do: the body is what `req.body` streams, and a failure to read it is answered by somebody else. */
const readAll: PageHandler = async (req, res) => {
  const { body } = req as IncomingMessage & { body?: AsyncIterable<Buffer> };
  seen = 0;
  try {
    for await (const chunk of body ?? []) seen += chunk.length;
    res.end(String(seen));
  } catch {
    res.statusCode = 500;
    res.end('could not read');
  }
};

const post = (path: string, body: string | ReadableStream, headers: Record<string, string> = {}) =>
  fetch(`${site.origin}${path}`, {
    method: 'POST',
    headers: { Origin: site.origin, 'Content-Type': 'application/json', ...headers },
    body,
    ...(typeof body === 'string' ? {} : { duplex: 'half' as const }),
  });

const chunks = (bytes: number) => Readable.toWeb(Readable.from(pieces(bytes))) as ReadableStream;

function* pieces(bytes: number): Generator<Buffer> {
  for (let left = bytes; left > 0; left -= 16 * kB) yield Buffer.alloc(Math.min(left, 16 * kB), 'a');
}

describe('body cap', () => {
  it('takes a body at the cap whole, announced or in chunks', async () => {
    expect(await (await post('/api/trials', 'a'.repeat(256 * kB))).text()).toBe(String(256 * kB));
    expect(await (await post('/api/trials', chunks(256 * kB))).text()).toBe(String(256 * kB));
  });

  it('refuses an announced body over the cap without reading it', async () => {
    seen = -1;
    const answer = await post('/api/trials', 'a'.repeat(256 * kB + 1));
    expect(answer.status).toBe(413);
    expect(await answer.json()).toMatchObject({ status: 413, reference: answer.headers.get('x-request-id') });
    expect(seen).toBe(-1);
  });

  it('cuts a body in chunks at the cap, whatever the handler then says', async () => {
    const answer = await post('/api/trials', chunks(256 * kB + 1));
    expect(answer.status).toBe(413);
    expect(answer.headers.get('content-type')).toBe('application/problem+json');
    expect(await answer.json()).toMatchObject({ title: 'The body is too large', status: 413 });
    expect(seen).toBeLessThanOrEqual(256 * kB);
  });

  it('has larger caps where curves and files come in', async () => {
    expect((await post('/api/method/jump-curve', chunks(2048 * kB))).status).toBe(200);
    expect((await post('/api/method/jump-curve', chunks(2048 * kB + 1))).status).toBe(413);
    expect((await post('/api/driver-sessions/import', chunks(4096 * kB))).status).toBe(200);
  });

  it('takes no compressed body', async () => {
    expect((await post('/api/trials', '{}', { 'Content-Encoding': 'gzip' })).status).toBe(415);
  });

  it('gives up on a body that does not come', async () => {
    const answer = await impatient.raw(
      `POST /api/trials HTTP/1.1\r\nHost: localhost\r\nOrigin: ${impatient.origin}\r\nContent-Length: 10\r\n\r\n{`,
    );
    expect(answer).toMatch(/^HTTP\/1\.1 408 /);
  });

  it('gives up on headers that do not come', async () => {
    expect(await impatient.raw('GET / HTTP/1.1\r\nHost: localhost\r\nX-Slow: ')).toMatch(/^HTTP\/1\.1 408 /);
  });
});
