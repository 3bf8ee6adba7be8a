import type { Insertable } from 'kysely';
import type { Tx } from '#src/db/client.ts';
import { inParts } from '#src/db/queries/inParts.ts';
import type { DriverSession, Shot } from '#src/db/types.ts';

/** Adds a driver session unless the academy has one at this place on this date; either way gives its row. */
export async function addDriverSession(trx: Tx, row: Insertable<DriverSession>) {
  await trx
    .insertInto('driver_session')
    .values(row)
    .onConflict((conflict) => conflict.columns(['academy_id', 'held_on', 'place']).doNothing())
    .execute();
  return trx
    .selectFrom('driver_session')
    .selectAll()
    .where('academy_id', '=', row.academy_id)
    .where('held_on', '=', row.held_on)
    .where('place', '=', row.place ?? '')
    .executeTakeFirstOrThrow();
}

/** Every shot of a session. */
export const listShotsOfSession = (trx: Tx, sessionId: string) =>
  trx.selectFrom('shot').selectAll().where('driver_session_id', '=', sessionId).execute();

/** Says who took part in a session. */
export async function addSessionAthletes(
  trx: Tx,
  session: { academyId: string; sessionId: string },
  athleteIds: readonly string[],
): Promise<void> {
  await trx
    .insertInto('driver_session_athlete')
    .values(
      athleteIds.map((athleteId) => ({
        academy_id: session.academyId,
        driver_session_id: session.sessionId,
        athlete_id: athleteId,
      })),
    )
    .onConflict((conflict) => conflict.columns(['driver_session_id', 'athlete_id']).doNothing())
    .execute();
}

/** Adds shots. */
export const insertShots = (trx: Tx, rows: readonly Insertable<Shot>[]): Promise<void> =>
  inParts(rows, (part) => trx.insertInto('shot').values(part).execute());
