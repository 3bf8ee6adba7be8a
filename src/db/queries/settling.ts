import { sql } from 'kysely';
import type { Tx } from '#src/db/client.ts';

/** A trial in scope with the state of its day, locked. */
export function lockTrial(trx: Tx, id: string) {
  return trx
    .selectFrom('trial')
    .innerJoin('testing_day', 'testing_day.id', 'trial.testing_day_id')
    .leftJoin('person', 'person.id', 'trial.settled_by')
    .select([
      'trial.id',
      'trial.athlete_id as athleteId',
      'trial.state',
      'trial.version',
      'trial.settled_at as settledAt',
      'testing_day.state as dayState',
      sql<string | null>`person.given_name || ' ' || person.family_name`.as('settledBy'),
    ])
    .where('trial.id', '=', id)
    .forUpdate('trial')
    .executeTakeFirst();
}

/** A growth measure in scope, locked. */
export function lockGrowthMeasure(trx: Tx, id: string) {
  return trx
    .selectFrom('growth_measure')
    .leftJoin('person', 'person.id', 'growth_measure.settled_by')
    .select([
      'growth_measure.id',
      'growth_measure.athlete_id as athleteId',
      'growth_measure.state',
      'growth_measure.version',
      'growth_measure.settled_at as settledAt',
      sql<string | null>`person.given_name || ' ' || person.family_name`.as('settledBy'),
    ])
    .where('growth_measure.id', '=', id)
    .forUpdate('growth_measure')
    .executeTakeFirst();
}

interface Settled {
  id: string;
  state: 'valid' | 'void';
  voidReason: string | null;
  by: string;
}

/** Confirms or voids a trial. */
export async function settleTrial(trx: Tx, { id, state, voidReason, by }: Settled): Promise<void> {
  await trx
    .updateTable('trial')
    .set({
      state,
      void_reason: voidReason,
      settled_by: by,
      settled_at: sql<Date>`now()`,
      version: sql<number>`version + 1`,
    })
    .where('id', '=', id)
    .execute();
}

/** Confirms or voids a growth measure. */
export async function settleGrowthMeasure(trx: Tx, { id, state, voidReason, by }: Settled): Promise<void> {
  await trx
    .updateTable('growth_measure')
    .set({
      state,
      void_reason: voidReason,
      settled_by: by,
      settled_at: sql<Date>`now()`,
      version: sql<number>`version + 1`,
    })
    .where('id', '=', id)
    .execute();
}

/** Trials that wait for a yes or no, with the athlete's newest earlier valid values of the same test and side. */
export function listAskedTrials(trx: Tx) {
  return trx
    .selectFrom('trial')
    .innerJoin('testing_day', 'testing_day.id', 'trial.testing_day_id')
    .innerJoin('test', 'test.id', 'trial.test_id')
    .innerJoin('athlete', 'athlete.id', 'trial.athlete_id')
    .select((eb) => [
      'trial.id',
      'trial.version',
      'trial.side',
      'trial.attempt',
      'trial.value_si as valueSi',
      'trial.entered_value as enteredValue',
      'trial.entered_unit as enteredUnit',
      'trial.asked_reason as reason',
      'testing_day.held_on as heldOn',
      'test.name as testName',
      'test.unit',
      'athlete.id as athleteId',
      sql<string>`athlete.given_name || ' ' || athlete.family_name`.as('athleteName'),
      eb
        .selectFrom('trial as other')
        .innerJoin('testing_day as day', 'day.id', 'other.testing_day_id')
        .select(sql<number | null>`percentile_cont(0.5) within group (order by other.value_si)`.as('median'))
        .whereRef('other.athlete_id', '=', 'trial.athlete_id')
        .whereRef('other.test_id', '=', 'trial.test_id')
        .whereRef('other.side', '=', 'trial.side')
        .where('other.state', '=', 'valid')
        .whereRef('day.held_on', '<', 'testing_day.held_on')
        .as('medianBefore'),
    ])
    .where('trial.state', '=', 'asked')
    .orderBy('testing_day.held_on', 'desc')
    .orderBy('athlete.family_name')
    .execute();
}

/** Growth measures that wait for a yes or no. */
export function listAskedGrowth(trx: Tx) {
  return trx
    .selectFrom('growth_measure')
    .innerJoin('athlete', 'athlete.id', 'growth_measure.athlete_id')
    .select([
      'growth_measure.id',
      'growth_measure.version',
      'growth_measure.measured_on as measuredOn',
      'growth_measure.stature_m as statureM',
      'growth_measure.sitting_height_m as sittingHeightM',
      'growth_measure.mass_kg as massKg',
      'growth_measure.asked_reason as reason',
      'athlete.id as athleteId',
      sql<string>`athlete.given_name || ' ' || athlete.family_name`.as('athleteName'),
    ])
    .where('growth_measure.state', '=', 'asked')
    .orderBy('growth_measure.measured_on', 'desc')
    .execute();
}

/** Notes what an athlete plays from now on, and by that for all that was measured before. */
export async function insertHandedness(
  trx: Tx,
  { athleteId, plays, reason, by }: { athleteId: string; plays: 'left' | 'right'; reason: string; by: string },
): Promise<void> {
  await trx
    .insertInto('handedness')
    .values({ academy_id: sql<string>`app.academy_id()`, athlete_id: athleteId, plays, reason, recorded_by: by })
    .execute();
}

/** Adds a restriction and returns its id. */
export async function insertRestriction(
  trx: Tx,
  { athleteId, allowed, by }: { athleteId: string; allowed: string; by: string },
): Promise<string> {
  const { id } = await trx
    .insertInto('restriction')
    .values({ academy_id: sql<string>`app.academy_id()`, athlete_id: athleteId, allowed, set_by: by })
    .returning('id')
    .executeTakeFirstOrThrow();
  return id;
}

/** Clears a restriction that is in force; undefined if there is none of this id in scope. */
export function clearRestriction(trx: Tx, id: string, by: string) {
  return trx
    .updateTable('restriction')
    .set({ cleared_by: by, cleared_at: sql<Date>`now()` })
    .where('id', '=', id)
    .where('cleared_at', 'is', null)
    .returning('athlete_id as athleteId')
    .executeTakeFirst();
}
