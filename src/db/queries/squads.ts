import { sql } from 'kysely';
import type { Tx } from '#src/db/client.ts';

/** Squads in scope with how many train there, when they were last tested, and how many wait for the coaches. */
export function listSquads(trx: Tx) {
  return trx
    .selectFrom('squad')
    .select((eb) => [
      'squad.id',
      'squad.name',
      eb
        .selectFrom('athlete')
        .select(sql<number>`count(*)`.as('n'))
        .whereRef('athlete.squad_id', '=', 'squad.id')
        .where('athlete.left_on', 'is', null)
        .as('athletes'),
      eb
        .selectFrom('testing_day')
        .select(sql<string | null>`max(held_on)`.as('on'))
        .whereRef('testing_day.squad_id', '=', 'squad.id')
        .where('testing_day.state', '=', 'closed')
        .as('testedOn'),
      eb
        .selectFrom('outrun')
        .innerJoin('athlete', 'athlete.id', 'outrun.athlete_id')
        .select(sql<number>`count(*)`.as('n'))
        .whereRef('athlete.squad_id', '=', 'squad.id')
        .where('outrun.state', 'in', ['raised', 'discussed', 'in hand'])
        .as('openOutruns'),
    ])
    .orderBy('squad.name')
    .execute();
}

/** One squad in scope. */
export function findSquad(trx: Tx, id: string) {
  return trx
    .selectFrom('squad')
    .select((eb) => [
      'squad.id',
      'squad.name',
      eb
        .selectFrom('testing_day')
        .select(sql<string | null>`max(held_on)`.as('on'))
        .whereRef('testing_day.squad_id', '=', 'squad.id')
        .where('testing_day.state', '=', 'closed')
        .as('testedOn'),
    ])
    .where('squad.id', '=', id)
    .executeTakeFirst();
}
