import { sql } from 'kysely';
import type { Tx } from '#src/db/client.ts';
import { newestHand, plays } from '#src/db/queries/handedness.ts';

/** Birth date, sex and what they play, of athletes in scope. */
export function listForJudging(trx: Tx, athleteIds: readonly string[]) {
  return trx
    .selectFrom('athlete')
    .leftJoinLateral(newestHand, (join) => join.onTrue())
    .select(['athlete.id', 'athlete.birth_date as birthDate', 'athlete.sex', plays])
    .where('athlete.id', 'in', [...athleteIds])
    .execute();
}

/** Valid ground traces of athletes, oldest first, with what judging needs of them. */
export function listTracesForJudging(trx: Tx, athleteIds: readonly string[]) {
  return trx
    .selectFrom('ground_trace')
    .leftJoin('device', 'device.id', 'ground_trace.device_id')
    .select([
      'ground_trace.athlete_id as athleteId',
      'ground_trace.recorded_on as on',
      'ground_trace.club',
      'ground_trace.measure',
      'ground_trace.sample_rate_hz as sampleRateHz',
      'ground_trace.figures',
      'device.name as rig',
    ])
    .where('ground_trace.athlete_id', 'in', [...athleteIds])
    .where('ground_trace.state', '=', 'valid')
    .orderBy('ground_trace.recorded_on')
    .orderBy('ground_trace.swing_no')
    .execute();
}

/** The policy in force: the newest version. */
export const findPolicy = (trx: Tx) =>
  trx
    .selectFrom('policy_version')
    .select(['id', 'version', 'thresholds'])
    .orderBy('version', 'desc')
    .limit(1)
    .executeTakeFirst();

export interface ProgrammeFigure {
  raw_gain_pct: number | null;
  demand_ratio: number | null;
  demand_rig: string | null;
  lead_push_n: number | null;
  club_speed_mps: number | null;
}

/** The programme's figures of everyone but these athletes, as of a date: numbers without names. */
export async function listProgrammeFigures(
  trx: Tx,
  exceptIds: readonly string[],
  asOf: string,
): Promise<ProgrammeFigure[]> {
  const { rows } = await sql<ProgrammeFigure>`
    select * from app.programme_figures(${sql.val([...exceptIds])}::uuid[], ${asOf}::date)`.execute(trx);
  return rows;
}

export interface NewJudgement {
  athleteId: string;
  asOf: string;
  cause: string;
  testingDayId: string | null;
  policyVersionId: string;
  level: string | null;
  points: number;
  rawGainPct: number | null;
  demandRatio: number | null;
  demandRig: string | null;
  leadPushN: number | null;
  clubSpeedMps: number | null;
  programme: unknown;
  history: unknown;
  result: unknown;
  marks: unknown;
}

/** Keeps judgements; their ids come back in the order given. */
export async function insertJudgements(trx: Tx, rows: readonly NewJudgement[]): Promise<string[]> {
  const added = await trx
    .insertInto('judgement')
    .values(
      rows.map((row) => ({
        academy_id: sql<string>`app.academy_id()`,
        athlete_id: row.athleteId,
        as_of: row.asOf,
        cause: row.cause,
        testing_day_id: row.testingDayId,
        policy_version_id: row.policyVersionId,
        level: row.level,
        points: row.points,
        raw_gain_pct: row.rawGainPct,
        demand_ratio: row.demandRatio,
        demand_rig: row.demandRig,
        lead_push_n: row.leadPushN,
        club_speed_mps: row.clubSpeedMps,
        programme: JSON.stringify(row.programme),
        history: JSON.stringify(row.history),
        result: JSON.stringify(row.result),
        marks: JSON.stringify(row.marks),
      })),
    )
    .returning(['id', 'athlete_id'])
    .execute();
  const byAthlete = new Map(added.map(({ id, athlete_id: athleteId }) => [athleteId, id]));
  return rows.map(({ athleteId }) => byAthlete.get(athleteId)!);
}

/** Level, points and testing day of the newest judgements of athletes, oldest first: enough to say what may be cleared. */
export function listJudgementsInBrief(trx: Tx, athleteIds: readonly string[]) {
  return trx
    .selectFrom('judgement')
    .select(['athlete_id as athleteId', 'level', 'points', 'testing_day_id as testingDayId'])
    .where('athlete_id', 'in', [...athleteIds])
    .orderBy('as_of')
    .orderBy('made_at')
    .execute();
}

/** Open outruns of athletes, locked so that two judgements cannot both raise one. */
export function lockOpenOutruns(trx: Tx, athleteIds: readonly string[]) {
  return trx
    .selectFrom('outrun')
    .select([
      'id',
      'athlete_id as athleteId',
      'state',
      'level',
      'may_be_cleared as mayBeCleared',
      'latest_judgement_id as latestJudgementId',
    ])
    .where('athlete_id', 'in', [...athleteIds])
    .where('state', 'in', ['raised', 'discussed', 'in hand'])
    .forUpdate()
    .execute();
}

/** Raises an outrun. */
export async function insertOutrun(
  trx: Tx,
  { athleteId, level, judgementId, on }: { athleteId: string; level: string; judgementId: string; on: string },
): Promise<string> {
  const { id } = await trx
    .insertInto('outrun')
    .values({
      academy_id: sql<string>`app.academy_id()`,
      athlete_id: athleteId,
      level,
      level_judgement_id: judgementId,
      latest_judgement_id: judgementId,
      raised_on: on,
      level_since: on,
    })
    .returning('id')
    .executeTakeFirstOrThrow();
  return id;
}

export interface OutrunChange {
  level?: string;
  level_since?: string;
  level_judgement_id?: string;
  latest_judgement_id: string;
  state?: string;
  may_be_cleared: boolean;
}

/** Changes an open outrun after a judgement. */
export async function updateOutrun(trx: Tx, outrunId: string, change: OutrunChange): Promise<void> {
  await trx
    .updateTable('outrun')
    .set({ ...change, version: sql<number>`version + 1` })
    .where('id', '=', outrunId)
    .execute();
}

export interface NewOutrunEvent {
  outrunId: string;
  athleteId: string;
  kind: string;
  on: string;
  level: string | null;
  judgementId: string;
  actorId: string | null;
}

/** Adds events to outruns. */
export async function insertOutrunEvents(trx: Tx, events: readonly NewOutrunEvent[]): Promise<void> {
  if (events.length === 0) return;
  await trx
    .insertInto('outrun_event')
    .values(
      events.map(({ outrunId, athleteId, kind, on, level, judgementId, actorId }) => ({
        academy_id: sql<string>`app.academy_id()`,
        outrun_id: outrunId,
        athlete_id: athleteId,
        kind,
        happened_on: on,
        level,
        judgement_id: judgementId,
        actor_id: actorId,
      })),
    )
    .execute();
}

/** The date of the newest data of each athlete: a closed testing day, a driver session, a trace or a measure. */
export async function listNewestDataDates(
  trx: Tx,
  athleteIds: readonly string[],
): Promise<{ athleteId: string; on: string }[]> {
  const { rows } = await sql<{ athleteId: string; on: string }>`
    select athlete_id as "athleteId", max(on_date) as on from (
      select t.athlete_id, max(d.held_on) as on_date from trial t join testing_day d on d.id = t.testing_day_id
        where d.state = 'closed' and t.athlete_id = any (${sql.val([...athleteIds])}::uuid[]) group by 1
      union all
      select sa.athlete_id, max(s.held_on) from driver_session_athlete sa join driver_session s on s.id = sa.driver_session_id
        where sa.athlete_id = any (${sql.val([...athleteIds])}::uuid[]) group by 1
      union all
      select g.athlete_id, max(g.recorded_on) from ground_trace g
        where g.state = 'valid' and g.athlete_id = any (${sql.val([...athleteIds])}::uuid[]) group by 1
    ) data group by athlete_id`.execute(trx);
  return rows;
}
