import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ROLES, type Viewer } from '#src/access/viewer.ts';
import { acceptInvitation, showInvitation } from '#src/auth/acceptInvitation.ts';
import { asViewer } from '#src/db/client.ts';
import { listOwnAthletes } from '#src/db/queries/athletes.ts';
import { invitation as schema } from '#src/schemas/people.ts';
import { invite, listPeople, revokeInvitation } from '#src/services/people/invite.ts';
import { useTestDatabase } from '#tests/config/testDatabase.ts';
import { TestAcademy } from '#tests/integration/judging/academy.ts';
import { memberOf, newestToken, PASSWORD } from '#tests/integration/people/world.ts';

const database = useTestDatabase();
let academy: TestAcademy;
let other: TestAcademy;
let director: Viewer;
let child: string;
let made = 0;

beforeAll(async () => {
  academy = await TestAcademy.make(database().superuserUrl);
  other = await TestAcademy.make(database().superuserUrl);
  director = await memberOf(academy, 'director', 'director@example.org');
  child = await academy.athlete('first');
});
afterAll(() => Promise.all([academy.end(), other.end()]));

const newAddress = () => `new${(made += 1)}@example.org`;
const inviteAs = async (more: Record<string, unknown>, email = newAddress()) => {
  const { id } = await invite(director, schema.parse({ email, ...more }));
  return { id, email, token: await newestToken(academy, 'invite') };
};
const swingCoach = () => inviteAs({ role: 'swing_coach', squadIds: [academy.squads.first] });
const self = { givenName: 'Wren', familyName: 'Halloran', password: PASSWORD };
const viewerFor = async (personId: string, membershipId: string): Promise<Viewer> => {
  const [row] = await academy.rows<{ role: Viewer['role'] }>('select role from membership where id = $1', [
    membershipId,
  ]);
  return { ...director, personId, membershipId, role: row!.role };
};

describe('an invitation', () => {
  it('keeps the hash of its token alone, for seven days', async () => {
    const { id, token } = await swingCoach();
    expect(token).toMatch(/^[\w-]{43}$/);
    const [row] = await academy.rows<{ hash: string; days: number }>(
      `select encode(token_hash, 'hex') as hash, extract(day from expires_at - made_at)::int as days from token where id = $1`,
      [id],
    );
    expect(row!.days).toBe(7);
    const dump = JSON.stringify(await academy.rows('select t::text, o::text from token t, outbox o'));
    expect(dump).not.toContain(token);
  });

  it('makes a swing coach who sees their squad and no other', async () => {
    const second = await academy.athlete('second');
    const { token } = await swingCoach();
    const { personId, membershipId } = await acceptInvitation(null, { token, ...self });
    const coach = await viewerFor(personId, membershipId);
    const seen = (await asViewer(coach, listOwnAthletes)).map(({ id }) => id);
    expect(seen).toContain(child);
    expect(seen).not.toContain(second);
  });

  it('makes a parent who sees their child and no other', async () => {
    const { token } = await inviteAs({ role: 'guardian', athleteIds: [child] });
    const { personId, membershipId } = await acceptInvitation(null, { token, ...self });
    const seen = await asViewer(await viewerFor(personId, membershipId), listOwnAthletes);
    expect(seen.map(({ id }) => id)).toEqual([child]);
  });

  it('is shown as often as one likes and accepted once', async () => {
    const { token } = await swingCoach();
    for (let i = 0; i < 3; i += 1) expect(await showInvitation(token)).toMatchObject({ role: 'swing_coach' });
    await acceptInvitation(null, { token, ...self });
    expect(await showInvitation(token)).toBeUndefined();
    await expect(acceptInvitation(null, { token, ...self })).rejects.toMatchObject({ code: 'not-found' });
  });

  it('gives one of ten at once the place, and makes nobody else', async () => {
    const { token, email } = await swingCoach();
    const tries = await Promise.allSettled(
      Array.from({ length: 10 }, () => acceptInvitation(null, { token, ...self })),
    );
    expect(tries.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    expect(await academy.rows('select from person_contact where email = $1', [email])).toHaveLength(1);
  });

  it('opens nothing when it is past, revoked, replaced or unknown', async () => {
    const past = await swingCoach();
    await academy.rows(`update token set expires_at = now() - interval '1 second' where id = $1`, [past.id]);
    const revoked = await swingCoach();
    await revokeInvitation(director, revoked.id);
    const replaced = await swingCoach();
    await inviteAs({ role: 'swing_coach' }, replaced.email);
    for (const token of [past.token, revoked.token, replaced.token, 'x'.repeat(43)]) {
      expect(await showInvitation(token)).toBeUndefined();
      await expect(acceptInvitation(null, { token, ...self })).rejects.toMatchObject({ code: 'not-found' });
    }
    await expect(revokeInvitation(director, revoked.id)).rejects.toMatchObject({ code: 'not-found' });
  });

  it('is for its own address: a signed-in stranger cannot take it, and does not use it up', async () => {
    const stranger = await memberOf(academy, 'swing_coach', newAddress());
    const { token } = await swingCoach();
    await expect(acceptInvitation(stranger, { token })).rejects.toMatchObject({ code: 'conflict' });
    expect(await showInvitation(token)).toBeDefined();
  });

  it('to an address with a sign-in is accepted by that person signed in, who keeps their name and password', async () => {
    const email = newAddress();
    const known = await memberOf(academy, 'swing_coach', email);
    const { token } = await inviteAs({ role: 'guardian', athleteIds: [child] }, email);
    await expect(acceptInvitation(null, { token, ...self })).rejects.toMatchObject({ code: 'conflict' });
    const { personId } = await acceptInvitation(known, { token, ...self });
    expect(personId).toBe(known.personId);
    expect(await academy.rows('select given_name from person where id = $1', [personId])).toEqual([
      { given_name: 'Some' },
    ]);
  });

  it('takes up again a role and a link that had ended', async () => {
    const email = newAddress();
    const known = await memberOf(academy, 'guardian', email);
    await academy.insert('guardianship', {
      ...{ ...academy.own, athlete_id: child, person_id: known.personId, ended_at: '2026-01-01' },
    });
    await academy.rows('update membership set ended_at = now() where person_id = $1', [known.personId]);
    const { token } = await inviteAs({ role: 'guardian', athleteIds: [child] }, email);
    const { membershipId } = await acceptInvitation(known, { token });
    expect(membershipId).toBe(known.membershipId);
    expect((await asViewer(known, listOwnAthletes)).map(({ id }) => id)).toEqual([child]);
  });

  it.each([
    ['short', 'invalid'],
    ['password1', 'invalid'],
    ['Wren-2026', 'invalid'],
  ])('refuses the password %s and is not used up', async (password, code) => {
    const { token } = await swingCoach();
    await expect(acceptInvitation(null, { token, ...self, password })).rejects.toMatchObject({ code });
    expect(await showInvitation(token)).toBeDefined();
  });
});

describe('inviting', () => {
  it('is the director’s alone', async () => {
    for (const role of ROLES.filter((each) => each !== 'director')) {
      const viewer = { ...director, role };
      expect(() => invite(viewer, schema.parse({ email: newAddress(), role: 'director' }))).toThrow(
        expect.objectContaining({ code: 'forbidden' }),
      );
      expect(() => listPeople(viewer)).toThrow(expect.objectContaining({ code: 'forbidden' }));
      expect(() => revokeInvitation(viewer, director.personId)).toThrow(expect.objectContaining({ code: 'forbidden' }));
    }
  });

  it('reaches no squad and no child of another academy', async () => {
    const foreign = await other.athlete();
    await expect(inviteAs({ role: 'swing_coach', squadIds: [other.squads.first] })).rejects.toMatchObject({
      code: 'not-found',
    });
    await expect(inviteAs({ role: 'guardian', athleteIds: [foreign] })).rejects.toMatchObject({ code: 'not-found' });
    const abroad = await memberOf(other, 'director', newAddress());
    const { id } = await swingCoach();
    await expect(revokeInvitation(abroad, id)).rejects.toMatchObject({ code: 'not-found' });
  });

  it('gives an athlete below the own-account age no sign-in by e-mail, and an older one theirs', async () => {
    const young = await academy.athlete();
    const old = await academy.athlete();
    await academy.rows(`update athlete set birth_date = current_date - interval '12 years' where id = $1`, [young]);
    await academy.rows(`update athlete set birth_date = current_date - interval '14 years' where id = $1`, [old]);
    await expect(inviteAs({ role: 'athlete', athleteIds: [young] })).rejects.toMatchObject({ code: 'invalid' });
    const { token } = await inviteAs({ role: 'athlete', athleteIds: [old] });
    const { personId, membershipId } = await acceptInvitation(null, { token, ...self });
    const seen = await asViewer(await viewerFor(personId, membershipId), listOwnAthletes);
    expect(seen.map(({ id }) => id)).toEqual([old]);
    await expect(inviteAs({ role: 'athlete', athleteIds: [old] })).rejects.toMatchObject({ code: 'conflict' });
  });

  it('shows addresses of a list until they are invited, and the invitation until it is accepted', async () => {
    const email = newAddress();
    await academy.insert('guardian_address', { ...academy.own, athlete_id: child, email });
    expect((await listPeople(director)).uninvited).toMatchObject([{ email, athleteIds: [child] }]);
    const { id, token } = await inviteAs({ role: 'guardian', athleteIds: [child] }, email);
    const waiting = await listPeople(director);
    expect(waiting.uninvited).toEqual([]);
    expect(waiting.invitations.find((each) => each.id === id)).toMatchObject({ email, mailState: 'queued' });
    await acceptInvitation(null, { token, ...self });
    const after = await listPeople(director);
    expect(after.invitations.some((each) => each.id === id)).toBe(false);
    expect(after.members.find((each) => each.signIn === email)).toMatchObject({ role: 'guardian' });
  });

  it.each([
    { role: 'guardian' },
    { role: 'swing_coach', athleteIds: ['0198c1f2-7a7b-7000-8000-000000000001'] },
    { role: 'director', squadIds: ['0198c1f2-7a7b-7000-8000-000000000001'] },
    { role: 'owner' },
    { role: 'director', academyId: '0198c1f2-7a7b-7000-8000-000000000001' },
    { role: 'director', email: 'a@b@example.org' },
    { role: 'director', email: 'a@example.org\r\nBcc: b@example.org' },
  ])('refuses %j', (input) => {
    expect(schema.safeParse({ email: 'a@example.org', ...input }).success).toBe(false);
  });
});
