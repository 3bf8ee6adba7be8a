import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer, type Tx } from '#src/db/client.ts';
import { addDevice } from '#src/db/queries/devices.ts';
import { listMeasuresTaken } from '#src/db/queries/growthWrites.ts';
import { insertTraces, listSessionsOn, listSwingNumbers, listTraceHashes } from '#src/db/queries/traceWrites.ts';
import { dayNumber } from '#src/domain/calendar/dayNumber.ts';
import type { GroundEventTimes } from '#src/domain/ground/groundEvents.ts';
import { groundTrace, type GroundTraceResult } from '#src/domain/ground/groundTrace.ts';
import { writeAudit } from '#src/services/audit.ts';
import { rejudgeWithin } from '#src/services/judging/judgeAthletes.ts';
import { contentHash, packSamples } from '#src/services/testing/contentHash.ts';
import type { Recorded } from '#src/services/testing/recorded.ts';

/** One swing's ground trace, with the id that the client made for it. */
export interface NewGroundTrace {
  id: string;
  athleteId: string;
  /** YYYY-MM-DD */
  recordedOn: string;
  /** 0 where nothing numbers it: it takes the next number. */
  swingNo: number;
  club: string;
  rig: string;
  measure: 'force' | 'pressure';
  sampleRateHz: number;
  /** Seconds from the first sample. */
  events: GroundEventTimes;
  /** N, or the unit of the mat */
  left: Float64Array;
  right: Float64Array;
}

export type RecordedTrace = Recorded<'taken'>;

/** A mass of about this age still weighs what the plates read. */
const MASS_WITHIN_DAYS = 60;

/**
 * `recordGroundTraces` within another's transaction; it judges nothing.
 *
 * @param traces all of one date
 * @returns one verdict a trace, in the order given
 */
export async function recordGroundTracesWithin(
  trx: Tx,
  viewer: Viewer,
  recordedOn: string,
  traces: readonly NewGroundTrace[],
): Promise<RecordedTrace[]> {
  requirePermission(viewer, 'ground:record');
  if (traces.length === 0) return [];
  const athleteIds = [...new Set(traces.map(({ athleteId }) => athleteId))];
  const masses = await massesNear(trx, athleteIds, recordedOn);
  const hashes = traces.map((trace) =>
    contentHash(['ground', trace.athleteId, recordedOn, trace.club, trace.sampleRateHz], [trace.left, trace.right]),
  );
  const stored = new Set((await listTraceHashes(trx, hashes)).map(({ source_hash: hash }) => hash.toString('hex')));
  const batch = new Set<string>();
  const verdicts = traces.map((trace, i): RecordedTrace => {
    const hash = hashes[i]!.toString('hex');
    if (batch.has(hash)) return { state: 'refused', reason: 'the same trace a second time', fresh: false };
    const problems = rejecting(trace, masses.get(trace.athleteId));
    if (problems !== null) return { state: 'refused', reason: problems, fresh: false };
    batch.add(hash);
    return { state: 'taken', reason: null, fresh: !stored.has(hash) };
  });
  const fresh = traces.flatMap((trace, i) => (verdicts[i]!.fresh ? [{ trace, hash: hashes[i]! }] : []));
  if (fresh.length > 0) await insertFresh(trx, viewer, recordedOn, fresh);
  return verdicts;
}

/**
 * Records the ground traces of one date with their figures for either leg as lead, and judges the athletes. A trace
 * with a moment outside it, an empty plate, or plates that do not weigh the athlete is refused.
 *
 * @throws {AppError} forbidden
 */
export const recordGroundTraces = (
  viewer: Viewer,
  recordedOn: string,
  traces: readonly NewGroundTrace[],
): Promise<RecordedTrace[]> =>
  asViewer(viewer, async (trx) => {
    const recorded = await recordGroundTracesWithin(trx, viewer, recordedOn, traces);
    const fresh = traces.filter((_, i) => recorded[i]!.fresh).map(({ athleteId }) => athleteId);
    await rejudgeWithin(trx, viewer, [...new Set(fresh)], 'ground traces');
    return recorded;
  });

function rejecting(
  { sampleRateHz, left, right, events, measure }: NewGroundTrace,
  mass: number | undefined,
): string | null {
  const weighed = measure === 'force' && mass !== undefined ? { mass } : {};
  const { quality } = groundTrace({ sampleRate: sampleRateHz, lead: left, trail: right, events, ...weighed });
  return quality.ok ? null : quality.problems.join('; ');
}

/** Figures without a mass: what a later corrected mass would change is worked out when it is read. */
export function traceFigures(trace: Pick<NewGroundTrace, 'sampleRateHz' | 'left' | 'right' | 'events'>) {
  const { sampleRateHz: sampleRate, left, right, events } = trace;
  return {
    left: groundTrace({ sampleRate, lead: left, trail: right, events }),
    right: groundTrace({ sampleRate, lead: right, trail: left, events }),
  } satisfies Record<'left' | 'right', GroundTraceResult>;
}

async function insertFresh(
  trx: Tx,
  viewer: Viewer,
  recordedOn: string,
  fresh: readonly { trace: NewGroundTrace; hash: Buffer }[],
): Promise<void> {
  const rigs = new Map<string, string>();
  for (const name of new Set(fresh.map(({ trace }) => trace.rig))) {
    rigs.set(name, await addDevice(trx, viewer.academyId, name));
  }
  const sessions = await listSessionsOn(trx, recordedOn);
  const sessionOf = (athleteId: string) =>
    (sessions.find((session) => session.athleteId === athleteId) ?? sessions[0])?.id ?? null;
  const used = new Set(
    (
      await listSwingNumbers(
        trx,
        fresh.map(({ trace }) => trace.athleteId),
        recordedOn,
      )
    ).map(({ athleteId, swingNo }) => `${athleteId} ${swingNo}`),
  );
  const numberOf = ({ athleteId, swingNo }: NewGroundTrace): number => {
    let number = Math.max(1, swingNo);
    while (used.has(`${athleteId} ${number}`)) number += 1;
    used.add(`${athleteId} ${number}`);
    return number;
  };
  const rows = fresh.map(({ trace, hash }) => {
    const figures = traceFigures(trace);
    return {
      id: trace.id,
      academy_id: viewer.academyId,
      athlete_id: trace.athleteId,
      driver_session_id: sessionOf(trace.athleteId),
      recorded_on: recordedOn,
      swing_no: numberOf(trace),
      club: trace.club,
      device_id: rigs.get(trace.rig)!,
      measure: trace.measure,
      sample_rate_hz: trace.sampleRateHz,
      events: JSON.stringify(trace.events),
      figures: JSON.stringify(figures),
      problems: figures.left.quality.problems,
      source_hash: hash,
      recorded_by: viewer.personId,
    };
  });
  const channels = fresh.flatMap(({ trace }) =>
    (['left', 'right'] as const).map((side) => ({
      academy_id: viewer.academyId,
      athlete_id: trace.athleteId,
      ground_trace_id: trace.id,
      side,
      samples: packSamples(trace[side]),
    })),
  );
  await insertTraces(trx, rows, channels);
  const change = { fresh: fresh.length, recordedOn };
  await writeAudit(trx, viewer, { action: 'record', subject: 'ground_trace', change });
}

/** The valid mass nearest to a date, by athlete, kg. */
async function massesNear(trx: Tx, athleteIds: readonly string[], on: string): Promise<Map<string, number>> {
  const day = dayNumber(on);
  const nearest = new Map<string, { days: number; massKg: number }>();
  for (const { athleteId, measuredOn, massKg, state } of await listMeasuresTaken(trx, athleteIds)) {
    const days = Math.abs(dayNumber(measuredOn) - day);
    const known = nearest.get(athleteId);
    if (massKg === null || state !== 'valid' || days > MASS_WITHIN_DAYS || (known && known.days <= days)) continue;
    nearest.set(athleteId, { days, massKg });
  }
  return new Map([...nearest].map(([id, { massKg }]) => [id, massKg]));
}
