import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { compressFolder } from '#src/server/launch/compressFolder.mjs';
import { serve, type Served } from '#tests/integration/server/serve.ts';

let folder = '';
let site: Served;
const script = 'export const a = 1;\n'.repeat(200);

beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), 'marram-test-'));
  mkdirSync(join(folder, '_astro'));
  writeFileSync(join(folder, '_astro', 'a.B1x.js'), script);
  writeFileSync(join(folder, 'robots.txt'), 'User-agent: *\n');
  writeFileSync(join(folder, '.secret'), 'x');
  await compressFolder(folder);
  site = await serve(
    async (req, res) => {
      res.setHeader('Content-Type', req.url === '/events' ? 'text/event-stream' : 'text/html');
      res.end('<p>page</p>'.repeat(500));
    },
    { clientFolder: folder },
  );
});
afterAll(async () => {
  await site.close();
  rmSync(folder, { recursive: true, force: true });
});

it('sends a hashed file as it was compressed, for ever', async () => {
  const answer = await fetch(`${site.origin}/_astro/a.B1x.js`, { headers: { 'Accept-Encoding': 'br' } });
  expect(Object.fromEntries(answer.headers)).toMatchObject({
    'cache-control': 'public, max-age=31536000, immutable',
    'content-encoding': 'br',
    'content-security-policy': expect.stringContaining("connect-src 'self'"),
    'x-content-type-options': 'nosniff',
  });
  expect(await answer.text()).toBe(script);
});

it('has any other file asked again', async () => {
  const answer = await fetch(`${site.origin}/robots.txt`);
  expect(answer.headers.get('cache-control')).toBe('no-cache');
  const again = await site.raw(
    `GET /robots.txt HTTP/1.1\r\nHost: localhost\r\nConnection: close\r\nIf-None-Match: ${answer.headers.get('etag')}\r\n\r\n`,
  );
  expect(again).toMatch(/^HTTP\/1\.1 304 /);
});

it('keeps hidden files to itself', async () => {
  expect(await (await fetch(`${site.origin}/.secret`)).text()).toContain('<p>page</p>');
});

it('compresses pages, and never an event stream', async () => {
  const page = await fetch(`${site.origin}/`, { headers: { 'Accept-Encoding': 'br, gzip' } });
  expect(page.headers.get('content-encoding')).toBe('br');
  expect(await page.text()).toBe('<p>page</p>'.repeat(500));
  const events = await fetch(`${site.origin}/events`, { headers: { 'Accept-Encoding': 'br, gzip' } });
  expect(events.headers.get('content-encoding')).toBeNull();
});
