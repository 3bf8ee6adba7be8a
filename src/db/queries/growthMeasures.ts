import type { Tx } from '#src/db/client.ts';

/** Valid growth measures of these athletes, oldest first, in SI. */
export function listGrowthMeasures(trx: Tx, athleteIds: readonly string[]) {
  return trx
    .selectFrom('growth_measure')
    .select([
      'athlete_id as athleteId',
      'measured_on as measuredOn',
      'place',
      'stature_m as statureM',
      'sitting_height_m as sittingHeightM',
      'mass_kg as massKg',
    ])
    .where('athlete_id', 'in', [...athleteIds])
    .where('state', '=', 'valid')
    .orderBy('measured_on')
    .execute();
}
