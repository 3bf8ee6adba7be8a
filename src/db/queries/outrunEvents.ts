import { jsonArrayFrom } from 'kysely/helpers/postgres';
import type { Tx } from '#src/db/client.ts';

/**
 * What a record shows of one athlete's outruns: the days of their changes, oldest first, and the result of the judgement
 * that last gave the open one its level. Families have none of it here.
 */
export function findOutrunLane(trx: Tx, athleteId: string) {
  return trx
    .selectNoFrom((eb) => [
      jsonArrayFrom(
        eb
          .selectFrom('outrun_event')
          .select([
            'outrun_event.outrun_id as outrunId',
            'outrun_event.kind',
            'outrun_event.happened_on as on',
            'outrun_event.level',
          ])
          .where('outrun_event.athlete_id', '=', athleteId)
          .orderBy('outrun_event.happened_on')
          .orderBy('outrun_event.made_at'),
      ).as('events'),
      eb
        .selectFrom('outrun')
        .innerJoin('judgement', 'judgement.id', 'outrun.level_judgement_id')
        .select('judgement.result')
        .where('outrun.athlete_id', '=', athleteId)
        .where('outrun.state', 'in', ['raised', 'discussed', 'in hand'])
        .as('openResult'),
    ])
    .executeTakeFirstOrThrow();
}
