import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Viewer } from '#src/access/viewer.ts';
import { changePassword } from '#src/auth/changePassword.ts';
import { childSignInState, makeChildSignIn, setChildPassword } from '#src/auth/childSignIn.ts';
import { isResetOpen, resetPassword, sendReset } from '#src/auth/resetPassword.ts';
import { signIn } from '#src/auth/signIn.ts';
import { useTestDatabase } from '#tests/config/testDatabase.ts';
import { TestAcademy } from '#tests/integration/judging/academy.ts';
import { memberOf, newestToken, openSession, PASSWORD } from '#tests/integration/people/world.ts';

const database = useTestDatabase();
const NEW = 'heron beside the ninth tee';
let academy: TestAcademy;
let coach: Viewer;
let parent: Viewer;
let child: string;

beforeAll(async () => {
  academy = await TestAcademy.make(database().superuserUrl);
  coach = await memberOf(academy, 'swing_coach', 'coach@example.org');
  parent = await memberOf(academy, 'guardian', 'parent@example.org');
  child = await academy.athlete();
  await academy.rows(`update athlete set birth_date = current_date - interval '11 years' where id = $1`, [child]);
  await academy.insert('guardianship', { ...academy.own, athlete_id: child, person_id: parent.personId });
});
beforeEach(() => academy.rows('delete from attempt_limit'));
afterAll(() => academy.end());

const opens = async (name: string, password: string) =>
  (await signIn(name, password, new Request('http://127.0.0.1'))) !== undefined;
const liveSessions = async ({ personId }: Viewer) =>
  (
    await academy.rows<{ id: string }>('select id from session where person_id = $1 and revoked_at is null', [personId])
  ).map(({ id }) => id);

describe('a reset', () => {
  it('sets the password once and ends every session', async () => {
    await openSession(academy, coach.personId, coach.membershipId);
    await sendReset('coach@example.org');
    const token = await newestToken(academy, 'reset');
    expect(await isResetOpen(token)).toBe(true);
    await resetPassword(token, NEW);
    expect(await liveSessions(coach)).toEqual([]);
    expect(await opens('coach@example.org', NEW)).toBe(true);
    expect(await opens('coach@example.org', PASSWORD)).toBe(false);
    expect(await isResetOpen(token)).toBe(false);
    await expect(resetPassword(token, PASSWORD)).rejects.toMatchObject({ code: 'not-found' });
    expect(await academy.rows(`select subject_id from audit where subject = 'password' and action = 'reset'`)).toEqual([
      { subject_id: coach.personId },
    ]);
  });

  it('gives one of ten at once the right', async () => {
    await sendReset('coach@example.org');
    const token = await newestToken(academy, 'reset');
    const tries = await Promise.allSettled(Array.from({ length: 10 }, () => resetPassword(token, NEW)));
    expect(tries.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
  });

  it('ends after ten minutes, and with the next one that is asked for', async () => {
    await sendReset('coach@example.org');
    const first = await newestToken(academy, 'reset');
    await sendReset('coach@example.org');
    const second = await newestToken(academy, 'reset');
    expect(await isResetOpen(first)).toBe(false);
    expect(
      await academy.rows(
        `select extract(minute from expires_at - made_at)::int as minutes from token order by made_at desc limit 1`,
      ),
    ).toEqual([{ minutes: 10 }]);
    await academy.rows(`update token set expires_at = now() - interval '1 second' where kind = 'reset'`);
    expect(await isResetOpen(second)).toBe(false);
    await expect(resetPassword(second, NEW)).rejects.toMatchObject({ code: 'not-found' });
  });

  it('is not used up by a weak password', async () => {
    await sendReset('coach@example.org');
    const token = await newestToken(academy, 'reset');
    await expect(resetPassword(token, 'password1')).rejects.toMatchObject({ code: 'invalid' });
    expect(await isResetOpen(token)).toBe(true);
  });

  it('sends nothing for an address that is nobody’s, or of someone who has left or is disabled', async () => {
    const gone = await memberOf(academy, 'swing_coach', 'gone@example.org');
    await academy.rows('update membership set ended_at = now() where person_id = $1', [gone.personId]);
    const off = await memberOf(academy, 'swing_coach', 'off@example.org');
    await academy.rows('update person set disabled_at = now() where id = $1', [off.personId]);
    const count = () => academy.rows('select count(*) as n from outbox');
    const before = await count();
    for (const email of ['nobody@example.org', 'gone@example.org', 'off@example.org']) await sendReset(email);
    expect(await count()).toEqual(before);
  });
});

describe('a change of one’s own password', () => {
  it('asks for the present one, keeps this session and ends the others', async () => {
    const viewer = await memberOf(academy, 'strength_coach', 'change@example.org');
    await openSession(academy, viewer.personId, viewer.membershipId);
    await expect(changePassword(viewer, 'not this one', NEW)).rejects.toMatchObject({ code: 'invalid' });
    await expect(changePassword(viewer, PASSWORD, 'Marsh Juniors 1')).rejects.toMatchObject({ code: 'invalid' });
    expect(await liveSessions(viewer)).toHaveLength(2);
    await changePassword(viewer, PASSWORD, NEW);
    expect(await liveSessions(viewer)).toEqual([viewer.sessionId]);
    expect(await opens('change@example.org', NEW)).toBe(true);
  });

  it('lets eight guesses of the present one through, then none', async () => {
    const viewer = await memberOf(academy, 'strength_coach', 'guess@example.org');
    const codes = [];
    for (let i = 0; i < 9; i += 1) {
      codes.push(await changePassword(viewer, 'not this one', NEW).catch((error: { code: string }) => error.code));
    }
    expect(codes).toEqual([...Array.from({ length: 8 }, () => 'invalid'), 'too-many']);
  });

  it('counts every character, to the last', async () => {
    const viewer = await memberOf(academy, 'strength_coach', 'long@example.org');
    const long = (last: string) => `${'Sand and wind and '.repeat(5)}end of it${last}`;
    await changePassword(viewer, PASSWORD, long('a'));
    expect(long('a')).toHaveLength(100);
    expect(await opens('long@example.org', long('b'))).toBe(false);
    expect(await opens('long@example.org', long('a'))).toBe(true);
  });
});

describe('a child’s sign-in', () => {
  const input = { userName: 'little.tern', password: NEW };

  it('is made by the child’s own parent, once, with a user name and no e-mail', async () => {
    expect(await childSignInState(parent, child)).toMatchObject({ state: 'none', ownAccountAge: 13 });
    await makeChildSignIn(parent, child, input);
    expect(await opens('little.tern', NEW)).toBe(true);
    expect(
      await academy.rows(
        `select c.email, m.role from athlete a join person_contact c using (person_id)
         join membership m using (person_id) where a.id = $1`,
        [child],
      ),
    ).toEqual([{ email: null, role: 'athlete' }]);
    expect(await childSignInState(parent, child)).toMatchObject({ state: 'user name', userName: 'little.tern' });
    await expect(makeChildSignIn(parent, child, input)).rejects.toMatchObject({ code: 'conflict' });
  });

  it('gets a new password from the parent, which ends its sessions', async () => {
    await setChildPassword(parent, child, 'a wholly other sentence');
    expect(await opens('little.tern', NEW)).toBe(false);
    expect(await opens('little.tern', 'a wholly other sentence')).toBe(true);
  });

  it('is nobody else’s to make: no other parent, no coach, no stranger to the child', async () => {
    const theirs = await academy.athlete();
    await academy.rows(`update athlete set birth_date = current_date - interval '11 years' where id = $1`, [theirs]);
    await expect(makeChildSignIn(parent, theirs, input)).rejects.toMatchObject({ code: 'not-found' });
    await expect(makeChildSignIn(coach, child, input)).rejects.toMatchObject({ code: 'forbidden' });
    await expect(setChildPassword(parent, theirs, NEW)).rejects.toMatchObject({ code: 'not-found' });
  });

  it('has a user name that nobody has', async () => {
    const sibling = await academy.athlete();
    await academy.rows(`update athlete set birth_date = current_date - interval '9 years' where id = $1`, [sibling]);
    await academy.insert('guardianship', { ...academy.own, athlete_id: sibling, person_id: parent.personId });
    await expect(makeChildSignIn(parent, sibling, input)).rejects.toMatchObject({
      code: 'invalid',
      fields: [{ path: 'userName', message: 'Someone has this user name' }],
    });
  });

  it('is not for a child of the own-account age, to the day', async () => {
    const older = await academy.athlete();
    await academy.insert('guardianship', { ...academy.own, athlete_id: older, person_id: parent.personId });
    const bornOn = (interval: string) =>
      academy.rows(
        `update athlete set birth_date = (now() at time zone 'Europe/London')::date - $2::interval where id = $1`,
        [older, interval],
      );
    await bornOn('13 years');
    expect(await childSignInState(parent, older)).toMatchObject({ state: 'own' });
    await expect(makeChildSignIn(parent, older, { ...input, userName: 'older' })).rejects.toMatchObject({
      code: 'conflict',
    });
    await academy.rows(
      `update athlete set birth_date = ((now() at time zone 'Europe/London')::date - interval '13 years')::date + 1 where id = $1`,
      [older],
    );
    await makeChildSignIn(parent, older, { ...input, userName: 'older' });
    expect(await opens('older', NEW)).toBe(true);
  });
});
