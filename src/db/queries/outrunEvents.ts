import type { Tx } from '#src/db/client.ts';

/** Outruns of one athlete, open and closed, with the days of their changes, oldest first. Families have none here. */
export function listOutrunEvents(trx: Tx, athleteId: string) {
  return trx
    .selectFrom('outrun_event')
    .innerJoin('outrun', 'outrun.id', 'outrun_event.outrun_id')
    .select([
      'outrun.id as outrunId',
      'outrun_event.kind',
      'outrun_event.happened_on as on',
      'outrun_event.level',
      'outrun.state',
      'outrun.closed_on as closedOn',
    ])
    .where('outrun_event.athlete_id', '=', athleteId)
    .orderBy('outrun_event.happened_on')
    .orderBy('outrun_event.made_at')
    .execute();
}

/** Result of the judgement that last gave the open outrun of an athlete its level. */
export function findOpenOutrunResult(trx: Tx, athleteId: string) {
  return trx
    .selectFrom('outrun')
    .innerJoin('judgement', 'judgement.id', 'outrun.level_judgement_id')
    .select(['outrun.id', 'judgement.result', 'judgement.as_of as asOf'])
    .where('outrun.athlete_id', '=', athleteId)
    .where('outrun.state', 'in', ['raised', 'discussed', 'in hand'])
    .executeTakeFirst();
}
