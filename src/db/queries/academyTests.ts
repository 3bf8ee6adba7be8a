import { sql } from 'kysely';
import type { Tx } from '#src/db/client.ts';
import { newestHand, plays } from '#src/db/queries/handedness.ts';

/** Tests of the viewer's academy as recording needs them, values in SI. */
export function listAcademyTests(trx: Tx) {
  return trx
    .selectFrom('test')
    .select([
      'id',
      'key',
      'name',
      sql<'force' | 'length' | 'angle' | 'time' | 'count' | 'mass' | 'torque'>`quantity`.as('quantity'),
      'unit',
      'sided',
      'lowest_si as lowestSi',
      'highest_si as highestSi',
      'first_medians_si as firstMediansSi',
    ])
    .orderBy('name')
    .execute();
}

export type AcademyTest = Awaited<ReturnType<typeof listAcademyTests>>[number];

/** Batteries of the viewer's academy, with the tests of each. */
export function listBatteries(trx: Tx) {
  return trx.selectFrom('battery').select(['id', 'name']).orderBy('name').execute();
}

/** Athletes in scope as recording needs them: name, birth, squad, what they play now. */
export function listAthletesToRecord(trx: Tx) {
  return trx
    .selectFrom('athlete')
    .leftJoinLateral(newestHand, (join) => join.onTrue())
    .select([
      'athlete.id',
      'athlete.given_name as givenName',
      'athlete.family_name as familyName',
      'athlete.birth_date as birthDate',
      'athlete.squad_id as squadId',
      plays,
    ])
    .orderBy('athlete.family_name')
    .orderBy('athlete.given_name')
    .execute();
}
