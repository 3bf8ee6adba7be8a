import type { Tx } from '#src/db/client.ts';

/** Open outruns with the judgement that last held their level, Act before Look, then by name. */
export function listOpenOutruns(trx: Tx) {
  return trx
    .selectFrom('outrun')
    .innerJoin('athlete', 'athlete.id', 'outrun.athlete_id')
    .innerJoin('judgement', 'judgement.id', 'outrun.level_judgement_id')
    .select([
      'athlete.given_name as givenName',
      'athlete.family_name as familyName',
      'outrun.level',
      'judgement.result',
    ])
    .where('outrun.state', 'in', ['raised', 'discussed', 'in hand'])
    .orderBy('outrun.level')
    .orderBy('athlete.family_name')
    .orderBy('athlete.given_name')
    .execute();
}
