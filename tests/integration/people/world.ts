import { hashPassword } from '#src/auth/password.ts';
import type { Role, Viewer } from '#src/access/viewer.ts';
import { unsealToken } from '#src/services/mail/sealToken.ts';
import type { TestAcademy } from '#tests/integration/judging/academy.ts';

export const PASSWORD = 'rope, sand and a low tide';

/** A member with an address, a password and a live session. */
export async function memberOf(academy: TestAcademy, role: Role, email: string): Promise<Viewer> {
  const viewer = await academy.staff(role);
  const { personId, membershipId } = viewer;
  await academy.insert('person_contact', { person_id: personId, email });
  await academy.insert('credential', { person_id: personId, password_hash: await hashPassword(PASSWORD) });
  const sessionId = await openSession(academy, personId, membershipId);
  return { ...viewer, sessionId, academyName: 'Marsh Juniors' };
}

/** Opens a session and gives its id. */
export async function openSession(academy: TestAcademy, personId: string, membershipId: string): Promise<string> {
  const [row] = await academy.rows<{ id: string }>(
    `insert into session (token_hash, person_id, membership_id, expires_at)
     values (sha256(gen_random_uuid()::text::bytea), $1, $2, now() + interval '1 day') returning id`,
    [personId, membershipId],
  );
  return row!.id;
}

/** The token in the newest message of a kind, as its link would carry it. */
export async function newestToken(academy: TestAcademy, kind: 'invite' | 'reset'): Promise<string> {
  const [row] = await academy.rows<{ payload: { sealed: string } }>(
    'select payload from outbox where kind = $1 order by made_at desc limit 1',
    [kind],
  );
  return unsealToken(row!.payload.sealed);
}
