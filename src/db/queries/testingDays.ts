import type { Tx } from '#src/db/client.ts';

/** One testing day as the services that write into it see it. */
export interface TestingDayRow {
  id: string;
  squadId: string;
  batteryId: string;
  heldOn: string;
  state: 'open' | 'closed';
}

const COLUMNS = ['id', 'squad_id as squadId', 'battery_id as batteryId', 'held_on as heldOn', 'state'] as const;

/** Adds a testing day unless the squad has one of this battery on this date; either way gives its row. */
export async function addTestingDay(
  trx: Tx,
  day: { academyId: string; squadId: string; batteryId: string; heldOn: string; recordedBy: string },
): Promise<TestingDayRow & { added: boolean }> {
  const { numInsertedOrUpdatedRows } = await trx
    .insertInto('testing_day')
    .values({
      academy_id: day.academyId,
      squad_id: day.squadId,
      battery_id: day.batteryId,
      held_on: day.heldOn,
      recorded_by: day.recordedBy,
    })
    .onConflict((conflict) => conflict.columns(['squad_id', 'battery_id', 'held_on']).doNothing())
    .executeTakeFirst();
  const row = await trx
    .selectFrom('testing_day')
    .select(COLUMNS)
    .where('squad_id', '=', day.squadId)
    .where('battery_id', '=', day.batteryId)
    .where('held_on', '=', day.heldOn)
    .executeTakeFirstOrThrow();
  return { ...(row as TestingDayRow), added: numInsertedOrUpdatedRows === 1n };
}

/** Testing days in scope, locked until the transaction ends so that none is closed while trials go into it. */
export async function lockTestingDays(trx: Tx, ids: readonly string[]): Promise<TestingDayRow[]> {
  const rows = await trx
    .selectFrom('testing_day')
    .select(COLUMNS)
    .where('id', 'in', [...ids])
    .orderBy('id')
    .forUpdate()
    .execute();
  return rows as TestingDayRow[];
}

/** Closes days; those already closed stay as they are. */
export async function setDaysClosed(trx: Tx, ids: readonly string[], closedBy: string): Promise<void> {
  await trx
    .updateTable('testing_day')
    .set({ state: 'closed', closed_at: new Date(), closed_by: closedBy })
    .where('id', 'in', [...ids])
    .where('state', '=', 'open')
    .execute();
}

/** Athletes with a trial on these days. */
export async function listAthletesTested(trx: Tx, dayIds: readonly string[]): Promise<string[]> {
  const rows = await trx
    .selectFrom('trial')
    .select('athlete_id as athleteId')
    .distinct()
    .where('testing_day_id', 'in', [...dayIds])
    .execute();
  return rows.map(({ athleteId }) => athleteId);
}
