import { sql } from 'kysely';
import { jsonArrayFrom } from 'kysely/helpers/postgres';
import type { Tx } from '#src/db/client.ts';

/** Present members of the academy by role and name, with address or user name, squads coached and children. */
export function listMembers(trx: Tx) {
  return trx
    .selectFrom('membership')
    .innerJoin('person', 'person.id', 'membership.person_id')
    .leftJoin('person_contact', 'person_contact.person_id', 'person.id')
    .select((eb) => [
      'membership.id',
      'membership.role',
      'person.id as personId',
      sql<string>`person.given_name || ' ' || person.family_name`.as('name'),
      sql<string | null>`coalesce(person_contact.email, person_contact.user_name)`.as('signIn'),
      jsonArrayFrom(
        eb
          .selectFrom('squad_coach')
          .innerJoin('squad', 'squad.id', 'squad_coach.squad_id')
          .select('squad.name')
          .whereRef('squad_coach.person_id', '=', 'person.id')
          .where('membership.role', 'in', ['strength_coach', 'swing_coach'])
          .orderBy('squad.name'),
      ).as('squads'),
      jsonArrayFrom(
        eb
          .selectFrom('guardianship')
          .innerJoin('athlete', 'athlete.id', 'guardianship.athlete_id')
          .select(sql<string>`athlete.given_name || ' ' || athlete.family_name`.as('name'))
          .whereRef('guardianship.person_id', '=', 'person.id')
          .where('guardianship.ended_at', 'is', null)
          .where('membership.role', '=', 'guardian')
          .orderBy('athlete.family_name'),
      ).as('children'),
    ])
    .where('membership.ended_at', 'is', null)
    .where('person.disabled_at', 'is', null)
    .orderBy('membership.role')
    .orderBy('person.family_name')
    .orderBy('person.given_name')
    .execute();
}

/** Parents' addresses that came with a list and were not invited yet, with their children. */
export function listUninvited(trx: Tx) {
  return trx
    .selectFrom('guardian_address')
    .innerJoin('athlete', 'athlete.id', 'guardian_address.athlete_id')
    .select([
      'guardian_address.email',
      sql<string[]>`array_agg(athlete.id order by athlete.family_name, athlete.given_name)`.as('athleteIds'),
      sql<string[]>`array_agg(athlete.given_name || ' ' || athlete.family_name
        order by athlete.family_name, athlete.given_name)`.as('athletes'),
    ])
    .where('guardian_address.invited_at', 'is', null)
    .where('athlete.left_on', 'is', null)
    .groupBy('guardian_address.email')
    .orderBy('guardian_address.email')
    .execute();
}

/** Notes that a parent's address was invited for these children. */
export async function markInvited(trx: Tx, email: string, athleteIds: readonly string[]): Promise<void> {
  if (athleteIds.length === 0) return;
  await trx
    .updateTable('guardian_address')
    .set({ invited_at: sql<Date>`now()` })
    .where('email', '=', email)
    .where('athlete_id', 'in', [...athleteIds])
    .execute();
}

/** Present athletes by squad and name; whether each has a sign-in, or may have one of their own by age. */
export function listRoster(trx: Tx) {
  return trx
    .selectFrom('athlete')
    .innerJoin('squad', 'squad.id', 'athlete.squad_id')
    .innerJoin('academy', 'academy.id', 'athlete.academy_id')
    .select([
      'athlete.id',
      'athlete.squad_id as squadId',
      'squad.name as squadName',
      sql<string>`athlete.given_name || ' ' || athlete.family_name`.as('name'),
      sql<boolean>`athlete.person_id is not null`.as('hasSignIn'),
      sql<boolean>`athlete.birth_date <= ((now() at time zone academy.time_zone)::date - make_interval(years => academy.own_account_age))`.as(
        'mayHaveOwn',
      ),
    ])
    .where('athlete.left_on', 'is', null)
    .orderBy('squad.name')
    .orderBy('athlete.family_name')
    .orderBy('athlete.given_name')
    .execute();
}

/** Squads of the academy with the ids of their coaches. */
export function listSquadsWithCoaches(trx: Tx) {
  return trx
    .selectFrom('squad')
    .select((eb) => [
      'squad.id',
      'squad.name',
      jsonArrayFrom(
        eb
          .selectFrom('squad_coach')
          .select('squad_coach.person_id as personId')
          .whereRef('squad_coach.squad_id', '=', 'squad.id'),
      ).as('coaches'),
    ])
    .orderBy('squad.name')
    .execute();
}
