import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { serve, type Served } from '#tests/integration/server/serve.ts';

let site: Served;
const reached: string[] = [];

beforeAll(async () => {
  site = await serve(async (req, res, _next, locals) => {
    reached.push(`${req.method} ${req.url}`);
    if (req.url === '/broken') throw new Error('secret of Amara');
    res.setHeader('Content-Type', 'application/json');
    const { origin, 'x-forwarded-for': forwarded } = req.headers;
    res.end(JSON.stringify({ forwarded, origin, requestId: locals['requestId'] }));
  });
});
afterAll(() => site.close());

const get = (target: string, host = `127.0.0.1:${site.port}`) =>
  site.raw(`GET ${target} HTTP/1.1\r\nHost: ${host}\r\nConnection: close\r\n\r\n`);

describe('path guard', () => {
  it.each([
    '//squads',
    '/%2e%2e/squads',
    '/squads%2f1',
    '/\\squads',
    '/%2573quads',
    '/./squads',
    '/_image?href=http://x',
    '/_server-islands/A',
    '/_IMAGE',
  ])('answers 404 to %s before anything routes', async (target) => {
    reached.length = 0;
    expect(await get(target)).toMatch(/^HTTP\/1\.1 404 /);
    expect(reached).toEqual([]);
  });

  it('lets a plain path through', async () => {
    expect(await get('/squads/1?x=%2F')).toMatch(/^HTTP\/1\.1 200 /);
  });
});

describe('host guard', () => {
  it.each(['evil.example', '127.0.0.1.evil.example', '0.0.0.0'])('does not answer for %s', async (host) => {
    expect(await get('/', host)).toMatch(/^HTTP\/1\.1 421 /);
  });
  it('cannot read a host with a user', async () => expect(await get('/', 'a@127.0.0.1')).toMatch(/^HTTP\/1\.1 400 /));
  it('wants a host', async () => expect(await site.raw('GET / HTTP/1.0\r\n\r\n')).toMatch(/^HTTP\/1\.1 400 /));
  it('does not follow a forwarded host', async () => {
    const answer = await fetch(site.origin, {
      headers: { 'X-Forwarded-Host': 'evil.example', 'X-Forwarded-For': '9.9.9.9' },
    });
    expect(await answer.json()).not.toHaveProperty('forwarded');
  });
});

describe('origin guard', () => {
  const types = [
    'application/json',
    'text/plain',
    'application/x-www-form-urlencoded',
    'multipart/form-data; boundary=x',
    'application/octet-stream',
    undefined,
  ];
  const methods = ['POST', 'PUT', 'PATCH', 'DELETE'];
  const matrix = methods.flatMap((method) => types.map((type) => ({ method, type })));

  it.each(matrix)('$method with $type: only from our own pages', async ({ method, type }) => {
    const send = (origin?: string) =>
      site.raw(
        [
          `${method} /api/trials HTTP/1.1`,
          `Host: 127.0.0.1:${site.port}`,
          ...(origin ? [`Origin: ${origin}`] : []),
          ...(type ? [`Content-Type: ${type}`] : []),
          'Content-Length: 2',
          'Connection: close',
          '',
          '{}',
        ].join('\r\n'),
      );
    expect(await send(site.origin)).toMatch(/^HTTP\/1\.1 200 /);
    for (const foreign of ['http://evil.example', 'null', `http://127.0.0.1:${site.port + 1}`, undefined]) {
      expect(await send(foreign)).toMatch(/^HTTP\/1\.1 403 /);
    }
  });

  it('names as ours the form of a page that keeps its address to itself, if the browser vouches for it', async () => {
    const send = (from: string) =>
      site.raw(
        `POST /invite HTTP/1.1\r\nHost: 127.0.0.1:${site.port}\r\nOrigin: null\r\nSec-Fetch-Site: ${from}\r\n` +
          'Content-Type: application/x-www-form-urlencoded\r\nContent-Length: 0\r\nConnection: close\r\n\r\n',
      );
    expect(await send('same-origin')).toContain(`"origin":"${site.origin}"`);
    for (const from of ['same-site', 'cross-site', 'none']) expect(await send(from)).toMatch(/^HTTP\/1\.1 403 /);
  });

  it.each(['OPTIONS', 'TRACE', 'PROPFIND'])('does not use %s', async (method) => {
    expect(await site.raw(`${method} / HTTP/1.1\r\nHost: localhost\r\nConnection: close\r\n\r\n`)).toMatch(
      /^HTTP\/1\.1 405 /,
    );
  });
});

describe('answers', () => {
  it('carry the security headers, also when refused', async () => {
    for (const path of ['/', '/%2e', '/broken', '/healthz']) {
      const { headers } = await fetch(`${site.origin}${path}`);
      expect(Object.fromEntries(headers)).toMatchObject({
        'content-security-policy': "default-src 'none'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'",
        'x-content-type-options': 'nosniff',
        'referrer-policy': 'same-origin',
        'cross-origin-opener-policy': 'same-origin',
        'x-frame-options': 'DENY',
        'permissions-policy': expect.stringContaining('geolocation=()'),
        'x-request-id': expect.stringMatching(/^[0-9a-f-]{36}$/),
      });
      expect(headers.get('x-powered-by')).toBeNull();
      expect(headers.get('strict-transport-security')).toBeNull();
    }
  });

  it('promise HTTPS only where the public address is HTTPS', async () => {
    const https = await serve(async (_req, res) => void res.end('x'), { env: { PUBLIC_URL: 'https://club.example' } });
    const { headers } = await fetch(https.origin);
    await https.close();
    expect(headers.get('strict-transport-security')).toBe('max-age=31536000; includeSubDomains');
  });

  it('tell of a failure its reference and nothing else, and the log where it was', async () => {
    const answer = await fetch(`${site.origin}/broken`);
    const text = await answer.text();
    const reference = answer.headers.get('x-request-id');
    expect(answer.status).toBe(500);
    expect(text).toBe(`Something went wrong on our side. Reference: ${reference}\n`);
    const entry = site.log.find((line) => line['msg'] === 'unhandled' && line['requestId'] === reference);
    expect(entry).toMatchObject({ level: 'error', error: { name: 'Error' } });
    expect(JSON.stringify(site.log)).not.toContain('Amara');
  });

  it('are logged once each, without ids, queries or unanswered paths', async () => {
    site.log.length = 0;
    await get('/athletes/0198c1f2-7a7b-7000-8000-000000000001?pain=7');
    await get('/amara//novak');
    const lines = site.log.filter((line) => line['msg'] === 'request');
    expect(lines.map(({ method, route, status }) => ({ method, route, status }))).toEqual([
      { method: 'GET', route: '/athletes/:id', status: 200 },
      { method: 'GET', route: '(none)', status: 404 },
    ]);
  });
});

describe('the calculators', () => {
  it.each(['text/plain', 'application/x-www-form-urlencoded', 'multipart/form-data; boundary=a', ''])(
    'answer 415 as a problem to a body of type "%s"',
    async (type) => {
      reached.length = 0;
      const answer = await fetch(`${site.origin}/api/method/asymmetry`, {
        method: 'POST',
        headers: type === '' ? {} : { 'content-type': type },
        body: new TextEncoder().encode('{}'),
      });
      expect(answer.status).toBe(415);
      expect(answer.headers.get('content-type')).toMatch(/^application\/problem\+json/);
      expect(await answer.json()).toMatchObject({ status: 415, errors: [{ path: '' }] });
      expect(reached).toEqual([]);
    },
  );

  it('are asked as JSON by a program without an Origin', async () => {
    const answer = await fetch(`${site.origin}/api/method/asymmetry`, {
      method: 'POST',
      headers: { 'content-type': 'application/json; charset=utf-8' },
      body: '{}',
    });
    expect(answer.status).toBe(200);
  });
});
