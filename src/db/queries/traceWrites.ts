import type { Insertable } from 'kysely';
import type { Tx } from '#src/db/client.ts';
import { inParts } from '#src/db/queries/inParts.ts';
import type { GroundChannel, GroundTrace } from '#src/db/types.ts';

/** Which of these contents are already kept as ground traces. */
export function listTraceHashes(trx: Tx, hashes: readonly Buffer[]): Promise<{ source_hash: Buffer }[]> {
  return trx
    .selectFrom('ground_trace')
    .select('source_hash')
    .where('source_hash', 'in', [...hashes])
    .execute();
}

/** Swing numbers in use, by athlete and date. */
export function listSwingNumbers(trx: Tx, athleteIds: readonly string[], recordedOn: string) {
  return trx
    .selectFrom('ground_trace')
    .select(['athlete_id as athleteId', 'swing_no as swingNo'])
    .where('athlete_id', 'in', [...athleteIds])
    .where('recorded_on', '=', recordedOn)
    .execute();
}

/** Driver sessions of a date with who took part, first added first. */
export function listSessionsOn(trx: Tx, heldOn: string) {
  return trx
    .selectFrom('driver_session')
    .leftJoin('driver_session_athlete as part', 'part.driver_session_id', 'driver_session.id')
    .select(['driver_session.id', 'part.athlete_id as athleteId'])
    .where('driver_session.held_on', '=', heldOn)
    .orderBy('driver_session.recorded_at')
    .execute();
}

/** Adds traces, then the samples of their plates. */
export async function insertTraces(
  trx: Tx,
  traces: readonly Insertable<GroundTrace>[],
  channels: readonly Insertable<GroundChannel>[],
): Promise<void> {
  await inParts(traces, (part) => trx.insertInto('ground_trace').values(part).execute());
  await inParts(channels, (part) => trx.insertInto('ground_channel').values(part).execute());
}
