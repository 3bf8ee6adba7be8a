import { sql } from 'kysely';
import type { Tx } from '#src/db/client.ts';

/** Counted drives of one athlete in one session: a list a quantity, gaps left out. */
export interface DriverSessionRow {
  athleteId: string;
  sessionId: string;
  heldOn: string;
  place: string;
  temperatureC: number | null;
  windMps: number | null;
  surface: string;
  ball: string;
  carryM: number[];
  carryStandardM: number[];
  clubSpeedMps: number[];
  ballSpeedMps: number[];
  launchDeg: number[];
  spinRpm: number[];
  attackDeg: number[];
  dynamicLoftDeg: number[];
  excluded: number;
  otherClubs: number;
}

/** Driver sessions of these athletes, oldest first. */
export function listDriverSessions(trx: Tx, athleteIds: readonly string[]): Promise<DriverSessionRow[]> {
  const counted = (column: string) =>
    sql<
      number[]
    >`coalesce(array_agg(${sql.ref(`shot.${column}`)} order by shot.shot_no) filter (where shot.club = 'driver' and shot.state = 'counted' and ${sql.ref(`shot.${column}`)} is not null), '{}')`;
  return trx
    .selectFrom('shot')
    .innerJoin('driver_session', 'driver_session.id', 'shot.driver_session_id')
    .select([
      'shot.athlete_id as athleteId',
      'driver_session.id as sessionId',
      'driver_session.held_on as heldOn',
      'driver_session.place',
      'driver_session.temperature_c as temperatureC',
      'driver_session.wind_mps as windMps',
      'driver_session.surface',
      'driver_session.ball',
      counted('carry_m').as('carryM'),
      counted('carry_standard_m').as('carryStandardM'),
      counted('club_speed_mps').as('clubSpeedMps'),
      counted('ball_speed_mps').as('ballSpeedMps'),
      counted('launch_deg').as('launchDeg'),
      counted('spin_rpm').as('spinRpm'),
      counted('attack_deg').as('attackDeg'),
      counted('dynamic_loft_deg').as('dynamicLoftDeg'),
      sql<number>`count(*) filter (where shot.club = 'driver' and shot.state = 'excluded')`.as('excluded'),
      sql<number>`count(*) filter (where shot.club = 'other')`.as('otherClubs'),
    ])
    .where('shot.athlete_id', 'in', [...athleteIds])
    .groupBy(['shot.athlete_id', 'driver_session.id'])
    .orderBy('driver_session.held_on')
    .execute();
}

/** Shots left out of one athlete's sessions, each with its reason, newest session first. */
export function listExcludedShots(trx: Tx, athleteId: string) {
  return trx
    .selectFrom('shot')
    .innerJoin('driver_session', 'driver_session.id', 'shot.driver_session_id')
    .select([
      'shot.id',
      'driver_session.held_on as heldOn',
      'shot.shot_no as shotNo',
      'shot.carry_m as carryM',
      'shot.exclusion_reason as reason',
    ])
    .where('shot.athlete_id', '=', athleteId)
    .where('shot.club', '=', 'driver')
    .where('shot.state', '=', 'excluded')
    .orderBy('driver_session.held_on', 'desc')
    .orderBy('shot.shot_no')
    .execute();
}
