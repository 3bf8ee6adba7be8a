import { Auth } from '@auth/core';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { actAs } from '#src/auth/actingAs.ts';
import { SESSION_COOKIE } from '#src/auth/cookies.ts';
import { hashPassword } from '#src/auth/password.ts';
import { hashToken } from '#src/auth/token.ts';
import { viewerOf } from '#src/auth/viewerOf.ts';
import { useTestDatabase } from '#tests/config/testDatabase.ts';

const database = useTestDatabase();
const PASSWORD = 'rope, sand and a low tide';
const BASE = 'http://127.0.0.1:4321';
let superuser: pg.Client;
let auth: (request: Request) => Promise<Response>;
const id = { academy: '', other: '', person: '', asDirector: '', asGuardian: '', stranger: '' };

beforeAll(async () => {
  superuser = new pg.Client({ connectionString: database().superuserUrl });
  await superuser.connect();
  const insert = async (sql: string, values: unknown[]) =>
    (await superuser.query<{ id: string }>(`${sql} returning *`, values)).rows[0]!.id;
  id.academy = await insert(`insert into academy (name) values ($1)`, ['One']);
  id.other = await insert(`insert into academy (name) values ($1)`, ['Two']);
  const person = `insert into person (given_name, family_name) values ($1, 'Person')`;
  id.person = await insert(person, ['Petra']);
  id.stranger = await insert(person, ['Stef']);
  const member = `insert into membership (academy_id, person_id, role) values ($1, $2, $3)`;
  id.asDirector = await insert(member, [id.academy, id.person, 'director']);
  id.asGuardian = await insert(member, [id.other, id.person, 'guardian']);
  await insert(member, [id.academy, id.stranger, 'swing_coach']);
  for (const [who, email] of [
    [id.person, 'petra@example.org'],
    [id.stranger, 'stef@example.org'],
  ]) {
    await superuser.query(`insert into person_contact (person_id, email) values ($1, $2)`, [who, email]);
    const hash = await hashPassword(PASSWORD);
    await superuser.query(`insert into credential (person_id, password_hash) values ($1, $2)`, [who, hash]);
  }
  // Read after the test's environment is set: the configuration takes the secret when it loads.
  const { default: config } = await import('#src/auth/config.ts');
  auth = (request) => Auth(request, config) as Promise<Response>;
});
afterAll(() => superuser.end());

const post = (path: string, fields: Record<string, string>, headers: Record<string, string> = {}) =>
  auth(
    new Request(`${BASE}${path}`, {
      method: 'POST',
      body: new URLSearchParams(fields),
      headers: { 'x-marram-client': '192.0.2.1', ...headers },
    }),
  );
const signInAs = (name: string, password = PASSWORD, headers: Record<string, string> = {}, callbackUrl = '/today') =>
  post('/api/auth/callback/password', { name, password, callbackUrl }, headers);
const cookieOf = (response: Response): string =>
  response.headers
    .getSetCookie()
    .find((cookie) => cookie.startsWith(`${SESSION_COOKIE}=`))
    ?.split(';')[0] ?? '';
const viewer = (cookie: string) => viewerOf(new Request(BASE, { headers: { cookie } }));
const codeOf = (response: Response) => new URL(response.headers.get('location')!, BASE).searchParams.get('code');

describe('sign-in', () => {
  it('opens a session in the first membership, under cookies tied to this host', async () => {
    const response = await signInAs('  Petra@Example.org ');
    expect(response.status).toBe(302);
    expect(response.headers.get('location')).toBe(`${BASE}/today`);
    for (const cookie of response.headers.getSetCookie().filter((line) => !line.includes('=;'))) {
      expect(cookie).toMatch(/^__Host-marram\.[^;]+; .*Path=\/; .*HttpOnly; Secure; SameSite=Lax/i);
    }
    expect(await viewer(cookieOf(response))).toMatchObject({
      personId: id.person,
      academyId: id.academy,
      role: 'director',
      name: 'Petra Person',
      memberships: [
        { membershipId: id.asDirector, academyName: 'One', role: 'director' },
        { membershipId: id.asGuardian, academyName: 'Two', role: 'guardian' },
      ],
    });
  });

  it('gives a fresh session each time, and keeps only the hash of its token', async () => {
    const [first, second] = [
      cookieOf(await signInAs('petra@example.org')),
      cookieOf(await signInAs('petra@example.org')),
    ];
    const [one, two] = [await viewer(first), await viewer(second)];
    expect(one!.sessionId).not.toBe(two!.sessionId);
    const { rows } = await superuser.query<{ token_hash: Buffer }>('select token_hash from session');
    expect(rows.every(({ token_hash: hash }) => hash.length === 32)).toBe(true);
    // What the table holds does not open anything: its hash is another one.
    expect(rows.some(({ token_hash: hash }) => hash.equals(hashToken(hash.toString('base64url'))))).toBe(false);
  });

  it('answers an unknown name and a wrong password alike', async () => {
    const wrong = await signInAs('stef@example.org', 'wrong one');
    const unknown = await signInAs('nobody@example.org', 'wrong one');
    expect(wrong.headers.get('location')).toBe(unknown.headers.get('location'));
    expect(codeOf(wrong)).toBe('wrong');
    expect(cookieOf(wrong)).toBe('');
  });

  it.each(['//evil.example', '/\\evil.example', 'https://evil.example/', 'javascript:alert(1)', '/today\r\nx: y'])(
    'never leads away from this site: %j',
    async (to) => {
      const location = (await signInAs('petra@example.org', PASSWORD, {}, to)).headers.get('location')!;
      expect(new URL(location, BASE).origin).toBe(BASE);
    },
  );

  it('lets exactly the allowed tries through a burst, and forgets them with time or a right password', async () => {
    const burst = await Promise.all(Array.from({ length: 14 }, () => signInAs('burst@example.org', 'wrong one')));
    const codes = burst.map(codeOf);
    expect(codes.filter((code) => code === 'wrong')).toHaveLength(8);
    expect(codes.filter((code) => code === 'too-many')).toHaveLength(6);
    // Another person at the same place is not kept out.
    expect(cookieOf(await signInAs('stef@example.org'))).not.toBe('');
    await superuser.query('update attempt_limit set expire = 1');
    expect(codeOf(await signInAs('burst@example.org', 'wrong one'))).toBe('wrong');
  });

  it('counts by the address that our own server saw, not by one that a stranger claims', async () => {
    await superuser.query('delete from attempt_limit');
    await signInAs('a@example.org', 'wrong one', { 'x-forwarded-for': '9.9.9.9' });
    const { rows } = await superuser.query<{ key: string }>(
      `select key from attempt_limit where key like 'sign-in-address%'`,
    );
    await signInAs('b@example.org', 'wrong one', { 'x-forwarded-for': '8.8.8.8' });
    expect((await superuser.query(`select key from attempt_limit where key like 'sign-in-address%'`)).rows).toEqual(
      rows,
    );
  });
});

describe('a session', () => {
  it('ends at sign-out: the old cookie opens nothing', async () => {
    const cookie = cookieOf(await signInAs('petra@example.org'));
    expect(await viewer(cookie)).not.toBeNull();
    await post('/api/auth/signout', {}, { cookie });
    expect(await viewer(cookie)).toBeNull();
  });

  it('ends when it is revoked, expires, idles, or its person or membership ends, on the next request', async () => {
    for (const [ending, restoring] of [
      ['update session set revoked_at = now()', undefined],
      [`update session set expires_at = now() - interval '1 second'`, undefined],
      [`update session set last_seen_at = now() - interval '12 hours 1 second'`, undefined],
      ['update person set disabled_at = now()', 'update person set disabled_at = null'],
      ['update membership set ended_at = now()', 'update membership set ended_at = null'],
    ]) {
      const cookie = cookieOf(await signInAs('stef@example.org'));
      expect(await viewer(cookie), ending).not.toBeNull();
      await superuser.query(ending!);
      expect(await viewer(cookie), ending).toBeNull();
      if (restoring) await superuser.query(restoring);
    }
  });

  it('opens nothing with a token of another secret, or with rubbish', async () => {
    expect(await viewer(`${SESSION_COOKIE}=rubbish`)).toBeNull();
    expect(await viewer('')).toBeNull();
  });

  it('acts as another of the person’s own memberships under a new token, on the audit; never as a stranger’s', async () => {
    const cookie = cookieOf(await signInAs('petra@example.org'));
    const before = (await viewer(cookie))!;
    const turned = `${SESSION_COOKIE}=${await actAs(before, id.asGuardian)}`;
    expect(await viewer(turned)).toMatchObject({ academyId: id.other, role: 'guardian', sessionId: before.sessionId });
    expect(await viewer(cookie)).toBeNull();
    const { rows } = await superuser.query(`select academy_id, actor_role from audit where action = 'act as'`);
    expect(rows).toEqual([{ academy_id: id.other, actor_role: 'guardian' }]);
    const strangers = await superuser.query<{ id: string }>('select id from membership where person_id = $1', [
      id.stranger,
    ]);
    const now = (await viewer(turned))!;
    await expect(actAs(now, strangers.rows[0]!.id)).rejects.toMatchObject({ code: 'not-found' });
  });
});
