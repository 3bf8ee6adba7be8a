import { sql } from 'kysely';
import type { Tx } from '#src/db/client.ts';

/** A child in scope, and whether they are younger today than the academy's own-account age. */
export function findChild(trx: Tx, athleteId: string) {
  return trx
    .selectFrom('athlete')
    .innerJoin('academy', 'academy.id', 'athlete.academy_id')
    .select([
      'athlete.person_id as personId',
      'athlete.given_name as givenName',
      'athlete.family_name as familyName',
      'academy.own_account_age as ownAccountAge',
      sql<boolean>`athlete.birth_date > ((now() at time zone academy.time_zone)::date - make_interval(years => academy.own_account_age))`.as(
        'isYoung',
      ),
    ])
    .where('athlete.id', '=', athleteId)
    .where('athlete.left_on', 'is', null)
    .executeTakeFirst();
}
