import { sql, type Kysely } from 'kysely';
import { jsonArrayFrom } from 'kysely/helpers/postgres';
import type { Membership, Role } from '#src/access/viewer.ts';
import type { DB } from '#src/db/types.ts';

/** Person and password hash behind a sign-in name (e-mail or user name), if both exist and the person is active. */
export function findCredential(db: Kysely<DB>, name: string) {
  return db
    .selectFrom('person_contact')
    .innerJoin('person', 'person.id', 'person_contact.person_id')
    .innerJoin('credential', 'credential.person_id', 'person.id')
    .select(['person.id as personId', 'credential.password_hash as passwordHash'])
    .where((eb) => eb.or([eb('person_contact.email', '=', name), eb('person_contact.user_name', '=', name)]))
    .where('person.disabled_at', 'is', null)
    .executeTakeFirst();
}

/** Present memberships of a person, in a steady order: staff roles first, then by academy. */
export function listMemberships(db: Kysely<DB>, personId: string) {
  return db
    .selectFrom('membership')
    .innerJoin('academy', 'academy.id', 'membership.academy_id')
    .select(['membership.id', 'membership.role', 'academy.id as academyId', 'academy.name as academyName'])
    .where('membership.person_id', '=', personId)
    .where('membership.ended_at', 'is', null)
    .orderBy('membership.role')
    .orderBy('academy.name')
    .execute();
}

interface NewSession {
  tokenHash: Buffer;
  personId: string;
  membershipId: string;
  expiresAt: Date;
}

/** Adds a session and says so on the audit. */
export async function insertSession(db: Kysely<DB>, session: NewSession): Promise<string> {
  const { id } = await db
    .insertInto('session')
    .values({
      token_hash: session.tokenHash,
      person_id: session.personId,
      membership_id: session.membershipId,
      expires_at: session.expiresAt,
    })
    .returning('id')
    .executeTakeFirstOrThrow();
  await sql`
    insert into audit (academy_id, actor_id, actor_role, action, subject, subject_id)
    select academy_id, person_id, role, 'sign in', 'session', ${id}::uuid from membership where id = ${session.membershipId}
  `.execute(db);
  return id;
}

export interface LiveSession {
  sessionId: string;
  membershipId: string;
  personId: string;
  academyId: string;
  academyName: string;
  timeZone: string;
  role: Role;
  name: string;
  safeguarding: string;
  memberships: Membership[];
  lastSeenAt: Date;
}

/** The session behind a token with the person's present role, unless revoked, expired or idle for too long. */
export function findLiveSession(db: Kysely<DB>, tokenHash: Buffer): Promise<LiveSession | undefined> {
  return db
    .selectFrom('session')
    .innerJoin('membership', 'membership.id', 'session.membership_id')
    .innerJoin('person', 'person.id', 'session.person_id')
    .innerJoin('academy', 'academy.id', 'membership.academy_id')
    .select((eb) => [
      'session.id as sessionId',
      'membership.id as membershipId',
      'person.id as personId',
      'academy.id as academyId',
      'academy.name as academyName',
      'academy.time_zone as timeZone',
      'membership.role',
      'academy.safeguarding_contact as safeguarding',
      jsonArrayFrom(
        eb
          .selectFrom('membership as own')
          .innerJoin('academy as ownAcademy', 'ownAcademy.id', 'own.academy_id')
          .select(['own.id as membershipId', 'ownAcademy.name as academyName', 'own.role'])
          .whereRef('own.person_id', '=', 'session.person_id')
          .where('own.ended_at', 'is', null)
          .orderBy('ownAcademy.name')
          .orderBy('own.role'),
      ).as('memberships'),
      'session.last_seen_at as lastSeenAt',
      sql<string>`person.given_name || ' ' || person.family_name`.as('name'),
    ])
    .where('session.token_hash', '=', tokenHash)
    .where('session.revoked_at', 'is', null)
    .where('session.expires_at', '>', sql<Date>`now()`)
    .where(
      'session.last_seen_at',
      '>',
      sql<Date>`now() - case when membership.role in ('guardian', 'athlete') then interval '14 days' else interval '12 hours' end`,
    )
    .where('membership.ended_at', 'is', null)
    .where('person.disabled_at', 'is', null)
    .executeTakeFirst();
}

/** Notes that the session was used; at most once a minute, so that reading a page seldom writes. */
export async function touchSession(db: Kysely<DB>, sessionId: string): Promise<void> {
  await db
    .updateTable('session')
    .set({ last_seen_at: sql<Date>`now()` })
    .where('id', '=', sessionId)
    .where('last_seen_at', '<', sql<Date>`now() - interval '1 minute'`)
    .execute();
}

/** Gives the session another token and another (academy, role); undefined if that membership is not the person's. */
export async function turnSession(
  db: Kysely<DB>,
  { sessionId, personId, membershipId, tokenHash }: Omit<NewSession, 'expiresAt'> & { sessionId: string },
) {
  const turned = await db
    .updateTable('session')
    .from('membership')
    .set({ token_hash: tokenHash, membership_id: membershipId })
    .whereRef('membership.person_id', '=', 'session.person_id')
    .where('membership.id', '=', membershipId)
    .where('membership.ended_at', 'is', null)
    .where('session.id', '=', sessionId)
    .where('session.person_id', '=', personId)
    .returning(['membership.academy_id as academyId', 'membership.role'])
    .executeTakeFirst();
  if (!turned) return undefined;
  await sql`
    insert into audit (academy_id, actor_id, actor_role, action, subject, subject_id)
    values (${turned.academyId}, ${personId}, ${turned.role}, 'act as', 'session', ${sessionId})
  `.execute(db);
  return turned;
}

/** Ends the session behind a token: an old cookie no longer opens anything. */
export async function revokeSession(db: Kysely<DB>, tokenHash: Buffer): Promise<void> {
  await db
    .updateTable('session')
    .set({ revoked_at: sql<Date>`now()` })
    .where('token_hash', '=', tokenHash)
    .where('revoked_at', 'is', null)
    .execute();
}
