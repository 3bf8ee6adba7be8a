import { beforeAll, describe, expect, inject, it } from 'vitest';
import pg from 'pg';
import { rolesWith, type Permission } from '#src/access/permissions.ts';
import { ROLE_NAMES, ROLES, type Role } from '#src/access/viewer.ts';
import { ROUTES } from '#src/http/routes.ts';

/** Cookies of one demo account a role, taken once. */
const cookies = new Map<Role, string>();
const ids: Record<string, string> = {};

beforeAll(async () => {
  const { baseUrl, accounts, superuserUrl } = inject('product');
  for (const role of ROLES) {
    const account = accounts.find((known) => known.role === ROLE_NAMES[role])!;
    const response = await fetch(`${baseUrl}/api/auth/callback/password`, {
      method: 'POST',
      redirect: 'manual',
      headers: { origin: baseUrl },
      body: new URLSearchParams({ name: account.email, password: account.password, callbackUrl: '/today' }),
    });
    cookies.set(
      role,
      response.headers
        .getSetCookie()
        .map((cookie) => cookie.split(';')[0])
        .join('; '),
    );
  }
  const client = new pg.Client({ connectionString: superuserUrl });
  await client.connect();
  const one = async (sql: string) => (await client.query<{ id: string }>(sql)).rows[0]!.id;
  const parent = accounts.find(({ role }) => role === 'parent')!.email;
  ids['child'] = await one(`select g.athlete_id as id from guardianship g
    join person_contact c on c.person_id = g.person_id where c.email = '${parent}' limit 1`);
  ids['squad'] = await one(`select squad_id as id from athlete where id = '${ids['child']}'`);
  ids['outrun'] = await one(
    `select o.id from outrun o join athlete a on a.id = o.athlete_id where a.squad_id = '${ids['squad']}' limit 1`,
  );
  await client.end();
});

/** A real path for a pattern, in the scope of every demo account that may come here. */
function pathOf(pattern: string): string {
  const id = pattern.startsWith('/squads')
    ? ids['squad']
    : pattern.startsWith('/outruns')
      ? ids['outrun']
      : ids['child'];
  return pattern.replace('[athleteId]', ids['child']!).replace('[id]', id!).replace('[name]', 'asymmetry');
}

const call = (path: string, { method = 'GET', role }: { method?: string; role?: Role }) =>
  fetch(`${inject('product').baseUrl}${path}`, {
    method,
    redirect: 'manual',
    headers: {
      ...(role ? { cookie: cookies.get(role)! } : {}),
      ...(method === 'GET' ? {} : { origin: inject('product').baseUrl, 'content-type': 'application/json' }),
    },
    ...(method === 'GET' ? {} : { body: '{}' }),
  });

const guarded = ROUTES.filter(({ access }) => access !== 'public');

describe('each route, as the map says', () => {
  it.each(
    guarded
      .filter(({ kind }) => kind === 'page')
      .map(({ pattern, access }) => [pattern, access as Permission] as const),
  )('%s', async (pattern, permission) => {
    const stranger = await call(pathOf(pattern), {});
    expect(stranger.status).toBe(303);
    expect(stranger.headers.get('location')).toBe(`/sign-in?to=${encodeURIComponent(pathOf(pattern))}`);
    for (const role of ROLES) {
      const response = await call(pathOf(pattern), { role });
      const expected = rolesWith(permission).includes(role) ? [200, 303] : [403];
      expect(expected, `${role} ${response.status}`).toContain(response.status);
      expect(response.headers.get('cache-control')).toBe('no-store');
    }
  });

  it.each(
    guarded
      .filter(({ kind }) => kind === 'api')
      .map(({ method, pattern, access }) => [method, pattern, access as Permission] as const),
  )('%s %s', async (method, pattern, permission) => {
    expect((await call(pathOf(pattern), { method })).status).toBe(401);
    for (const role of ROLES) {
      const { status } = await call(pathOf(pattern), { method, role });
      // An empty body: whoever may come here is told what is missing, or that there is no such thing.
      const expected = rolesWith(permission).includes(role) ? [422, 404] : [403];
      expect(expected, `${role} ${status}`).toContain(status);
    }
  });

  it('knows no other route or method', async () => {
    for (const path of [
      '/api/nothing',
      '/api/auth/session',
      '/api/auth/csrf',
      '/api/auth/providers',
      '/_image?href=/favicon.svg',
      '/_server-islands/x',
      '/programme/nothing',
    ]) {
      expect((await call(path, { role: 'director' })).status, path).toBe(404);
    }
    expect((await call('/api/session/acting-as', { method: 'DELETE', role: 'director' })).status).toBe(405);
  });

  it('answers an id out of scope exactly as an unknown one', async () => {
    const unknown = '00000000-0000-4000-8000-000000000000';
    const { superuserUrl } = inject('product');
    const client = new pg.Client({ connectionString: superuserUrl });
    await client.connect();
    const other = (
      await client.query<{ id: string }>(
        `select a.id from athlete a where not exists (select from guardianship g where g.athlete_id = a.id) limit 1`,
      )
    ).rows[0]!.id;
    await client.end();
    const [absent, foreign] = await Promise.all(
      [unknown, other].map(async (id) => {
        const response = await call(`/family/${id}`, { role: 'guardian' });
        return { status: response.status, body: (await response.text()).replaceAll(id, 'ID') };
      }),
    );
    expect(foreign).toEqual(absent);
    expect(foreign!.status).toBe(404);
    for (const id of ['not-an-id', unknown])
      expect((await call(`/athletes/${id}`, { role: 'director' })).status).toBe(404);
  });

  // S2: odd spellings of a protected path are refused before anything is routed.
  it.each([
    '//squads',
    '/squads//',
    '/./squads',
    '/%2e/squads',
    '/x/../squads',
    '/%2573quads',
    '/squads%2f',
    '/squads%5c',
    '/\\squads',
    '/squads%00',
    '/squads/..%2fsquads',
  ])('never opens %s', async (path) => {
    const { hostname, port } = new URL(inject('product').baseUrl);
    const { request } = await import('node:http');
    const status = await new Promise<number>((resolve, reject) => {
      request({ hostname, port, path, headers: { cookie: cookies.get('director')! } }, (response) => {
        response.resume();
        resolve(response.statusCode!);
      })
        .on('error', reject)
        .end();
    });
    expect(status).toBeGreaterThanOrEqual(300);
    expect(status).not.toBe(500);
  });
});
