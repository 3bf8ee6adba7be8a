import { sql } from 'kysely';
import { jsonArrayFrom } from 'kysely/helpers/postgres';
import type { Role } from '#src/access/viewer.ts';
import type { Tx } from '#src/db/client.ts';

interface NewInvitation {
  id: string;
  tokenHash: Buffer;
  email: string;
  role: Role;
  squadIds: readonly string[];
  athleteIds: readonly string[];
  by: string;
  days: number;
}

/** Adds an invitation of the academy that the transaction works for. */
export async function insertInvitation(trx: Tx, invitation: NewInvitation): Promise<void> {
  const { id, tokenHash, email, role, squadIds, athleteIds, by, days } = invitation;
  await trx
    .insertInto('token')
    .values({
      ...{ id, kind: 'invite', token_hash: tokenHash, email, role, made_by: by },
      academy_id: sql<string>`app.academy_id()`,
      squad_ids: [...squadIds],
      athlete_ids: [...athleteIds],
      expires_at: sql<Date>`now() + make_interval(days => ${days})`,
    })
    .execute();
}

/** Revokes the invitations of an address and role that wait: a new one takes their place. */
export async function revokeEarlier(trx: Tx, email: string, role: Role): Promise<void> {
  await trx
    .updateTable('token')
    .set({ revoked_at: sql<Date>`now()` })
    .where('kind', '=', 'invite')
    .where('email', '=', email)
    .where('role', '=', role)
    .where('used_at', 'is', null)
    .where('revoked_at', 'is', null)
    .execute();
}

/** Revokes one invitation that waits; undefined if there is none of this id. */
export function revokeInvitation(trx: Tx, id: string) {
  return trx
    .updateTable('token')
    .set({ revoked_at: sql<Date>`now()` })
    .where('kind', '=', 'invite')
    .where('id', '=', id)
    .where('used_at', 'is', null)
    .where('revoked_at', 'is', null)
    .returning('id')
    .executeTakeFirst();
}

/** Invitations that wait, newest first, with the squads or children they are for and what became of their message. */
export function listInvitations(trx: Tx) {
  return trx
    .selectFrom('token')
    .leftJoin('outbox', (join) => join.on('outbox.message_key', '=', sql<string>`'invite:' || token.id`))
    .select((eb) => [
      'token.id',
      'token.email',
      'token.role',
      'token.expires_at as expiresAt',
      'outbox.state as mailState',
      jsonArrayFrom(
        eb
          .selectFrom('squad')
          .select('squad.name')
          .where('squad.id', '=', sql<string>`any (token.squad_ids)`)
          .orderBy('squad.name'),
      ).as('squads'),
      jsonArrayFrom(
        eb
          .selectFrom('athlete')
          .select(sql<string>`athlete.given_name || ' ' || athlete.family_name`.as('name'))
          .where('athlete.id', '=', sql<string>`any (token.athlete_ids)`)
          .orderBy('athlete.family_name')
          .orderBy('athlete.given_name'),
      ).as('athletes'),
    ])
    .where('token.kind', '=', 'invite')
    .where('token.used_at', 'is', null)
    .where('token.revoked_at', 'is', null)
    .where('token.expires_at', '>', sql<Date>`now()`)
    .orderBy('token.made_at', 'desc')
    .execute();
}

const invitationColumns = [
  'token.id',
  'token.academy_id as academyId',
  'token.email',
  'token.role',
  'token.squad_ids as squadIds',
  'token.athlete_ids as athleteIds',
] as const;

/** An invitation that can still be accepted, with the academy and whether its address has a sign-in. Uses nothing up. */
export function findInvitation(trx: Tx, tokenHash: Buffer) {
  return trx
    .selectFrom('token')
    .innerJoin('academy', 'academy.id', 'token.academy_id')
    .leftJoin('person_contact', 'person_contact.email', 'token.email')
    .select([...invitationColumns, 'academy.name as academyName', 'person_contact.person_id as personId'])
    .where('token.kind', '=', 'invite')
    .where('token.token_hash', '=', tokenHash)
    .where('token.used_at', 'is', null)
    .where('token.revoked_at', 'is', null)
    .where('token.expires_at', '>', sql<Date>`now()`)
    .executeTakeFirst();
}

/** Uses a token up: of any number at once, one gets the row and the others undefined. */
export function useToken(trx: Tx, kind: 'invite' | 'reset', tokenHash: Buffer) {
  return trx
    .updateTable('token')
    .set({ used_at: sql<Date>`now()` })
    .where('kind', '=', kind)
    .where('token_hash', '=', tokenHash)
    .where('used_at', 'is', null)
    .where('revoked_at', 'is', null)
    .where('expires_at', '>', sql<Date>`now()`)
    .returning(['token.id', 'token.person_id as personId'])
    .executeTakeFirst();
}

/** Adds a reset of a password. */
export async function insertReset(
  trx: Tx,
  { id, tokenHash, personId, minutes }: { id: string; tokenHash: Buffer; personId: string; minutes: number },
): Promise<void> {
  await trx
    .insertInto('token')
    .values({
      ...{ id, kind: 'reset', token_hash: tokenHash, person_id: personId },
      expires_at: sql<Date>`now() + make_interval(mins => ${minutes})`,
    })
    .execute();
}

/** A reset that can still be used, with the names that its password may not be. */
export function findReset(trx: Tx, tokenHash: Buffer) {
  return trx
    .selectFrom('token')
    .innerJoin('person', 'person.id', 'token.person_id')
    .select(['person.id as personId', 'person.given_name as givenName', 'person.family_name as familyName'])
    .where('token.kind', '=', 'reset')
    .where('token.token_hash', '=', tokenHash)
    .where('token.used_at', 'is', null)
    .where('token.revoked_at', 'is', null)
    .where('token.expires_at', '>', sql<Date>`now()`)
    .where('person.disabled_at', 'is', null)
    .executeTakeFirst();
}

/** Revokes the resets of a person that wait. */
export async function revokeResets(trx: Tx, personId: string): Promise<void> {
  await trx
    .updateTable('token')
    .set({ revoked_at: sql<Date>`now()` })
    .where('kind', '=', 'reset')
    .where('person_id', '=', personId)
    .where('used_at', 'is', null)
    .where('revoked_at', 'is', null)
    .execute();
}
