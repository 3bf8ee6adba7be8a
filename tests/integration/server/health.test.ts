import { expect, it } from 'vitest';
import { drain } from '#src/server/gracefulStop.ts';
import { isReady } from '#src/server/isReady.ts';
import { serve } from '#tests/integration/server/serve.ts';
import { useTestDatabase } from '#tests/config/testDatabase.ts';

useTestDatabase();

it('is ready on a database with every migration', async () => expect(await isReady()).toBe(true));

it('is alive and not ready while the database is away, says when to ask again, and logs the change once', async () => {
  let away = false;
  const site = await serve(async (_req, res) => void res.end(), {
    ready: () => (away ? Promise.reject(new Error('connect failed')) : Promise.resolve(true)),
  });
  expect((await fetch(`${site.origin}/readyz`)).status).toBe(200);
  away = true;
  for (const _ of [1, 2]) {
    const answer = await fetch(`${site.origin}/readyz`);
    expect(answer.status).toBe(503);
    expect(answer.headers.get('retry-after')).toBe('2');
    expect((await fetch(`${site.origin}/healthz`)).status).toBe(200);
  }
  await site.close();
  expect(site.log.filter((line) => line['level'] !== 'debug').map((line) => line['msg'])).toEqual([
    'ready',
    'not ready',
  ]);
});

it('answers what is in flight before it stops, and takes nothing new', async () => {
  let arrived = () => {};
  let release = () => {};
  const inFlight = new Promise<void>((resolve) => (arrived = resolve));
  const held = new Promise<void>((resolve) => (release = resolve));
  const site = await serve(async (_req, res) => {
    arrived();
    await held;
    res.end('saved');
  });
  const answer = fetch(site.origin);
  await inFlight;
  const stopped = drain(site.server, 10_000);
  await expect(fetch(site.origin)).rejects.toThrow();
  release();
  expect(await (await answer).text()).toBe('saved');
  await stopped;
  expect(site.server.listening).toBe(false);
});
