import { sql } from 'kysely';
import type { Tx } from '#src/db/client.ts';

/** How much waits for the viewer: asked values and open testing days in scope. */
export function countWaiting(trx: Tx) {
  return trx
    .selectNoFrom((eb) => [
      eb
        .selectFrom('trial')
        .select(sql<number>`count(*)`.as('n'))
        .where('state', '=', 'asked')
        .as('askedTrials'),
      eb
        .selectFrom('growth_measure')
        .select(sql<number>`count(*)`.as('n'))
        .where('state', '=', 'asked')
        .as('askedGrowth'),
    ])
    .executeTakeFirstOrThrow();
}

/** Testing days not closed yet, oldest first. */
export const listOpenDays = (trx: Tx) =>
  trx
    .selectFrom('testing_day')
    .innerJoin('squad', 'squad.id', 'testing_day.squad_id')
    .select(['testing_day.id', 'testing_day.held_on as heldOn', 'squad.name as squadName'])
    .where('testing_day.state', '=', 'open')
    .orderBy('testing_day.held_on')
    .execute();
