import { sql } from 'kysely';
import type { Role } from '#src/access/viewer.ts';
import type { Tx } from '#src/db/client.ts';

/** Adds a person with a way to sign in. */
export async function insertAccount(
  trx: Tx,
  account: {
    personId: string;
    givenName: string;
    familyName: string;
    contact: { email: string } | { user_name: string };
    passwordHash: string;
  },
): Promise<void> {
  const { personId, givenName, familyName, contact, passwordHash } = account;
  await trx.insertInto('person').values({ id: personId, given_name: givenName, family_name: familyName }).execute();
  await trx
    .insertInto('person_contact')
    .values({ person_id: personId, ...contact })
    .execute();
  await trx.insertInto('credential').values({ person_id: personId, password_hash: passwordHash }).execute();
}

/** Gives a person a role in an academy, or again the one they had; the membership's id. */
export async function addMembership(trx: Tx, academyId: string, personId: string, role: Role): Promise<string> {
  const { id } = await trx
    .insertInto('membership')
    .values({ academy_id: academyId, person_id: personId, role })
    .onConflict((conflict) => conflict.columns(['academy_id', 'person_id', 'role']).doUpdateSet({ ended_at: null }))
    .returning('id')
    .executeTakeFirstOrThrow();
  return id;
}

/** Gives a coach squads; those they have they keep. */
export async function addCoachSquads(trx: Tx, academyId: string, personId: string, squadIds: readonly string[]) {
  if (squadIds.length === 0) return;
  await trx
    .insertInto('squad_coach')
    .values(squadIds.map((squadId) => ({ academy_id: academyId, squad_id: squadId, person_id: personId })))
    .onConflict((conflict) => conflict.doNothing())
    .execute();
}

/** Links a parent with children, again where the link had ended. */
export async function addChildren(trx: Tx, academyId: string, personId: string, athleteIds: readonly string[]) {
  if (athleteIds.length === 0) return;
  await trx
    .insertInto('guardianship')
    .values(athleteIds.map((athleteId) => ({ academy_id: academyId, athlete_id: athleteId, person_id: personId })))
    .onConflict((conflict) => conflict.columns(['athlete_id', 'person_id']).doUpdateSet({ ended_at: null }))
    .execute();
}

/** Makes a person the athlete's own sign-in; undefined where the athlete has one. */
export function linkAthlete(trx: Tx, academyId: string, athleteId: string, personId: string) {
  return trx
    .updateTable('athlete')
    .set({ person_id: personId })
    .where('id', '=', athleteId)
    .where('academy_id', '=', academyId)
    .where('person_id', 'is', null)
    .returning('id')
    .executeTakeFirst();
}

/** Name, sign-in and password hash of a person. */
export function findAccount(trx: Tx, personId: string) {
  return trx
    .selectFrom('person')
    .innerJoin('person_contact', 'person_contact.person_id', 'person.id')
    .leftJoin('credential', 'credential.person_id', 'person.id')
    .select([
      'person.given_name as givenName',
      'person.family_name as familyName',
      'person_contact.email',
      'person_contact.user_name as userName',
      'credential.password_hash as passwordHash',
    ])
    .where('person.id', '=', personId)
    .executeTakeFirst();
}

/** An active person by e-mail, with one academy that they belong to now. */
export function findMemberByEmail(trx: Tx, email: string) {
  return trx
    .selectFrom('person_contact')
    .innerJoin('person', 'person.id', 'person_contact.person_id')
    .innerJoin('membership', 'membership.person_id', 'person.id')
    .select(['person.id as personId', 'membership.academy_id as academyId'])
    .where('person_contact.email', '=', email)
    .where('person.disabled_at', 'is', null)
    .where('membership.ended_at', 'is', null)
    .orderBy('membership.started_at')
    .limit(1)
    .executeTakeFirst();
}

/** Sets the password of a person. */
export async function setCredential(trx: Tx, personId: string, passwordHash: string): Promise<void> {
  await trx
    .insertInto('credential')
    .values({ person_id: personId, password_hash: passwordHash })
    .onConflict((conflict) =>
      conflict
        .column('person_id')
        .doUpdateSet({ password_hash: passwordHash, changed_at: sql<Date>`clock_timestamp()` }),
    )
    .execute();
}

/** Ends the sessions of a person, but for one to keep. */
export async function revokeSessions(trx: Tx, personId: string, keep?: string): Promise<void> {
  let query = trx
    .updateTable('session')
    .set({ revoked_at: sql<Date>`now()` })
    .where('person_id', '=', personId)
    .where('revoked_at', 'is', null);
  if (keep !== undefined) query = query.where('id', '<>', keep);
  await query.execute();
}
