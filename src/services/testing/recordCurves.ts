import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer, type Tx } from '#src/db/client.ts';
import { listAcademyTests } from '#src/db/queries/academyTests.ts';
import { insertCurves, listCurveHashes } from '#src/db/queries/curveWrites.ts';
import { addDevice } from '#src/db/queries/devices.ts';
import { jumpCurve, type JumpCurve } from '#src/domain/jump/jumpCurve.ts';
import { pushCurve, type PushCurve } from '#src/domain/push/pushCurve.ts';
import { writeAudit } from '#src/services/audit.ts';
import { contentHash, packSamples } from '#src/services/testing/contentHash.ts';
import type { Recorded } from '#src/services/testing/recorded.ts';

/** One leg's force curve, with the id that the client made for it. */
export interface NewCurve {
  id: string;
  athleteId: string;
  testingDayId: string | null;
  testKey: 'jump' | 'push';
  side: 'left' | 'right';
  /** YYYY-MM-DD */
  recordedOn: string;
  device: string | null;
  sampleRateHz: number;
  /** N */
  samples: Float64Array;
}

export type RecordedCurve = Recorded<'taken'>;

/**
 * `recordCurves` within another's transaction.
 *
 * @returns one verdict a curve, in the order given
 */
export async function recordCurvesWithin(
  trx: Tx,
  viewer: Viewer,
  curves: readonly NewCurve[],
): Promise<RecordedCurve[]> {
  requirePermission(viewer, 'trial:record');
  if (curves.length === 0) return [];
  const tests = new Map((await listAcademyTests(trx)).map(({ key, id }) => [key, id]));
  const hashes = curves.map((curve) =>
    contentHash(
      ['curve', curve.athleteId, curve.testKey, curve.side, curve.recordedOn, curve.sampleRateHz],
      [curve.samples],
    ),
  );
  const stored = new Set((await listCurveHashes(trx, hashes)).map(({ source_hash: hash }) => hash.toString('hex')));
  const batch = new Set<string>();
  const figures = curves.map(curveFigures);
  const verdicts = curves.map((curve, i): RecordedCurve => {
    const hash = hashes[i]!.toString('hex');
    if (batch.has(hash)) return { state: 'refused', reason: 'the same curve a second time', fresh: false };
    if (!tests.has(curve.testKey)) return { state: 'refused', reason: 'the academy has no such test', fresh: false };
    const { quality } = figures[i]!;
    if (!quality.ok) return { state: 'refused', reason: quality.problems.join('; '), fresh: false };
    batch.add(hash);
    return { state: 'taken', reason: quality.problems.join('; ') || null, fresh: !stored.has(hash) };
  });
  const devices = new Map<string, string>();
  for (const name of new Set(curves.flatMap(({ device }) => device ?? []))) {
    devices.set(name, await addDevice(trx, viewer.academyId, name));
  }
  const fresh = curves.flatMap((curve, i) => (verdicts[i]!.fresh ? [{ curve, i }] : []));
  await insertCurves(
    trx,
    fresh.map(({ curve, i }) => ({
      id: curve.id,
      academy_id: viewer.academyId,
      athlete_id: curve.athleteId,
      testing_day_id: curve.testingDayId,
      test_id: tests.get(curve.testKey)!,
      side: curve.side,
      recorded_on: curve.recordedOn,
      device_id: curve.device === null ? null : (devices.get(curve.device) ?? null),
      sample_rate_hz: curve.sampleRateHz,
      samples: packSamples(curve.samples),
      figures: JSON.stringify(figures[i]!),
      quality_ok: true,
      problems: figures[i]!.quality.problems,
      source_hash: hashes[i]!,
      recorded_by: viewer.personId,
    })),
  );
  if (fresh.length > 0) {
    await writeAudit(trx, viewer, { action: 'record', subject: 'curve', change: { fresh: fresh.length } });
  }
  return verdicts;
}

/**
 * Records force curves with their figures. A curve that cannot be read rightly is refused with its problems; nothing
 * wrong is kept. Curves are no trials: the trial is what was written down on the day.
 *
 * @throws {AppError} forbidden
 */
export const recordCurves = (viewer: Viewer, curves: readonly NewCurve[]): Promise<RecordedCurve[]> =>
  asViewer(viewer, (trx) => recordCurvesWithin(trx, viewer, curves));

function curveFigures({ testKey, sampleRateHz, samples }: NewCurve): JumpCurve | PushCurve {
  const input = { sampleRate: sampleRateHz, force: samples };
  return testKey === 'jump' ? jumpCurve(input) : pushCurve(input);
}
