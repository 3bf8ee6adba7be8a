import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer, type Tx } from '#src/db/client.ts';
import { listAthletesToRecord } from '#src/db/queries/academyTests.ts';
import { addDriverSession, addSessionAthletes, insertShots, listShotsOfSession } from '#src/db/queries/driverWrites.ts';
import { writeAudit } from '#src/services/audit.ts';
import {
  excludedDrives,
  standardCarries,
  type MeasuredDrive,
  type SessionAir,
} from '#src/services/driver/shotVerdicts.ts';
import { rejudgeWithin } from '#src/services/judging/judgeAthletes.ts';
import { sameValue, type Recorded } from '#src/services/testing/recorded.ts';

/** One shot to be recorded, with the id that the client made for it. */
export interface NewShot extends MeasuredDrive {
  id: string;
  athleteId: string;
  /** Unique for the athlete in the session. */
  shotNo: number;
  club: 'driver' | 'other';
  clubLabel: string;
  attackDeg: number | null;
  dynamicLoftDeg: number | null;
  offlineM: number | null;
}

/** A driver session: a date and a place, its air and ground, and its shots. */
export interface NewDriverSession extends SessionAir {
  /** YYYY-MM-DD */
  heldOn: string;
  place: string;
  surface: string;
  ball: string;
  shots: readonly NewShot[];
}

export type RecordedShot = Recorded<'counted' | 'excluded' | 'other club' | 'void'>;

export interface RecordedSession {
  sessionId: string;
  /** One verdict a shot, in the order given. */
  shots: RecordedShot[];
}

/** `recordDriverSession` within another's transaction; it judges nothing. */
export async function recordDriverSessionWithin(
  trx: Tx,
  viewer: Viewer,
  { shots, ...session }: NewDriverSession,
): Promise<RecordedSession> {
  requirePermission(viewer, 'driver:record');
  const inScope = new Set((await listAthletesToRecord(trx)).map(({ id }) => id));
  const row = await addDriverSession(trx, {
    academy_id: viewer.academyId,
    held_on: session.heldOn,
    place: session.place,
    temperature_c: session.temperatureC,
    humidity_pct: session.humidityPct,
    pressure_pa: session.pressurePa,
    altitude_m: session.altitudeM,
    wind_mps: session.windMps,
    surface: session.surface,
    ball: session.ball,
    recorded_by: viewer.personId,
  });
  const air: SessionAir = {
    temperatureC: row.temperature_c,
    humidityPct: row.humidity_pct,
    pressurePa: row.pressure_pa,
    altitudeM: row.altitude_m,
    windMps: row.wind_mps,
  };
  const stored = await listShotsOfSession(trx, row.id);
  const athleteIds = [...new Set(shots.map(({ athleteId }) => athleteId))].filter((id) => inScope.has(id));
  const verdicts: RecordedShot[] = shots.map(() => refused('no such athlete'));
  const fresh: Fresh[] = [];
  for (const athleteId of athleteIds) {
    const own = shots.flatMap((shot, i) => (shot.athleteId === athleteId ? [{ shot, i }] : []));
    const known = stored.filter((one) => one.athlete_id === athleteId);
    const added = addedShots(own, known, verdicts);
    const before = known.filter(({ club, state }) => club === 'driver' && state !== 'void').map(measuredOf);
    const drives = added.filter(({ shot }) => shot.club === 'driver').map(({ shot }) => shot);
    const exclusions = excludedDrives([...before, ...drives], air).slice(before.length);
    const standard = standardCarries(drives, air);
    for (const { shot, i } of added) {
      const at = drives.indexOf(shot);
      const exclusion = at === -1 ? null : exclusions[at]!;
      const state = shot.club === 'other' ? 'other club' : exclusion === null ? 'counted' : 'excluded';
      verdicts[i] = { state, reason: exclusion?.reason ?? null, fresh: true };
      fresh.push({ shot, exclusion, carryStandardM: at === -1 ? null : standard[at]! });
    }
  }
  if (athleteIds.length > 0) {
    await addSessionAthletes(trx, { academyId: viewer.academyId, sessionId: row.id }, athleteIds);
  }
  await insertShots(
    trx,
    fresh.map((one) => shotRow(one, { academyId: viewer.academyId, sessionId: row.id })),
  );
  if (fresh.length > 0) {
    const excluded = fresh.filter(({ exclusion }) => exclusion !== null).length;
    const change = { fresh: fresh.length, excluded };
    await writeAudit(trx, viewer, { action: 'record', subject: 'driver_session', subjectId: row.id, change });
  }
  return { sessionId: row.id, shots: verdicts };
}

/**
 * Records a driver session, or adds to the one at this place on this date, and judges its athletes. Mishits are
 * proposed for exclusion, each with its reason; shots of other clubs are kept apart.
 *
 * @throws {AppError} forbidden
 */
export const recordDriverSession = (viewer: Viewer, session: NewDriverSession): Promise<RecordedSession> =>
  asViewer(viewer, async (trx) => {
    const recorded = await recordDriverSessionWithin(trx, viewer, session);
    const fresh = session.shots.filter((_, i) => recorded.shots[i]!.fresh).map(({ athleteId }) => athleteId);
    await rejudgeWithin(trx, viewer, [...new Set(fresh)], 'a driver session');
    return recorded;
  });

interface Fresh {
  shot: NewShot;
  exclusion: { rule: string; reason: string } | null;
  carryStandardM: number | null;
}

type StoredShot = Awaited<ReturnType<typeof listShotsOfSession>>[number];

const refused = (reason: string): RecordedShot => ({ state: 'refused', reason, fresh: false });

/** The shots that are new; the verdicts of the others are written here. */
function addedShots(
  own: readonly { shot: NewShot; i: number }[],
  known: readonly StoredShot[],
  verdicts: RecordedShot[],
): { shot: NewShot; i: number }[] {
  const numbers = new Map(known.map((shot) => [shot.shot_no, shot]));
  const seen = new Set<number>();
  return own.filter(({ shot, i }) => {
    if (seen.has(shot.shotNo)) {
      verdicts[i] = refused(`shot ${shot.shotNo} a second time`);
      return false;
    }
    const twin = numbers.get(shot.shotNo);
    if (!twin) return seen.add(shot.shotNo);
    const same = sameValue(twin.carry_m, shot.carryM) && sameValue(twin.ball_speed_mps, shot.ballSpeedMps);
    verdicts[i] = same ? knownShot(twin) : refused(`another shot is already recorded as shot ${shot.shotNo}`);
    if (same) seen.add(shot.shotNo);
    return false;
  });
}

function knownShot({ club, state, exclusion_reason: reason }: StoredShot): RecordedShot {
  if (club === 'other') return { state: 'other club', reason: null, fresh: false };
  const known = state === 'excluded' || state === 'void' ? state : 'counted';
  return { state: known, reason: known === 'excluded' ? reason : null, fresh: false };
}

const measuredOf = (shot: StoredShot): MeasuredDrive => ({
  ballSpeedMps: shot.ball_speed_mps,
  clubSpeedMps: shot.club_speed_mps,
  launchDeg: shot.launch_deg,
  spinRpm: shot.spin_rpm,
  carryM: shot.carry_m,
});

function shotRow({ shot, exclusion, carryStandardM }: Fresh, at: { academyId: string; sessionId: string }) {
  return {
    id: shot.id,
    academy_id: at.academyId,
    driver_session_id: at.sessionId,
    athlete_id: shot.athleteId,
    shot_no: shot.shotNo,
    club: shot.club,
    club_label: shot.clubLabel,
    club_speed_mps: shot.clubSpeedMps,
    ball_speed_mps: shot.ballSpeedMps,
    launch_deg: shot.launchDeg,
    spin_rpm: shot.spinRpm,
    attack_deg: shot.attackDeg,
    dynamic_loft_deg: shot.dynamicLoftDeg,
    carry_m: shot.carryM,
    offline_m: shot.offlineM,
    carry_standard_m: carryStandardM,
    state: exclusion === null ? 'counted' : 'excluded',
    exclusion_rule: exclusion?.rule ?? null,
    exclusion_reason: exclusion?.reason ?? null,
  };
}
