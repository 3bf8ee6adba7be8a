import type { Insertable } from 'kysely';
import type { Tx } from '#src/db/client.ts';
import { inParts } from '#src/db/queries/inParts.ts';
import type { GrowthMeasure } from '#src/db/types.ts';

/** Every growth measure of these athletes taken at the academy, oldest first, whatever its state. */
export function listMeasuresTaken(trx: Tx, athleteIds: readonly string[]) {
  return trx
    .selectFrom('growth_measure')
    .select([
      'athlete_id as athleteId',
      'measured_on as measuredOn',
      'place',
      'stature_m as statureM',
      'sitting_height_m as sittingHeightM',
      'mass_kg as massKg',
      'state',
      'asked_reason as askedReason',
    ])
    .where('athlete_id', 'in', [...athleteIds])
    .orderBy('measured_on')
    .execute();
}

/** Adds growth measures. */
export const insertGrowthMeasures = (trx: Tx, rows: readonly Insertable<GrowthMeasure>[]): Promise<void> =>
  inParts(rows, (part) => trx.insertInto('growth_measure').values(part).execute());
