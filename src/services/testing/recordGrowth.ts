import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer, type Tx } from '#src/db/client.ts';
import { listAthletesToRecord } from '#src/db/queries/academyTests.ts';
import { insertGrowthMeasures, listMeasuresTaken } from '#src/db/queries/growthWrites.ts';
import { suspectGrowth, type MeasuredBody } from '#src/domain/growth/suspectGrowth.ts';
import { writeAudit } from '#src/services/audit.ts';
import { sameValue, type Recorded } from '#src/services/testing/recorded.ts';

/** One growth measure to be recorded, with the id that the client made for it. */
export interface NewGrowthMeasure {
  id: string;
  athleteId: string;
  /** YYYY-MM-DD */
  measuredOn: string;
  statureM: number | null;
  sittingHeightM: number | null;
  massKg: number | null;
  /** As it was written, by measure. */
  entered: Record<string, string>;
}

export type RecordedGrowth = Recorded<'valid' | 'asked' | 'void'>;

const RANGES = {
  statureM: { name: 'height', lowest: 0.8, highest: 2.3 },
  sittingHeightM: { name: 'sitting height', lowest: 0.4, highest: 1.3 },
  massKg: { name: 'mass', lowest: 12, highest: 180 },
} as const;

/**
 * `recordGrowth` within another's transaction.
 *
 * @returns one verdict a measure, in the order given
 */
export async function recordGrowthWithin(
  trx: Tx,
  viewer: Viewer,
  measures: readonly NewGrowthMeasure[],
): Promise<RecordedGrowth[]> {
  requirePermission(viewer, 'growth:record');
  if (measures.length === 0) return [];
  const athletes = new Map((await listAthletesToRecord(trx)).map((athlete) => [athlete.id, athlete]));
  const taken = await listMeasuresTaken(trx, [...new Set(measures.map(({ athleteId }) => athleteId))]);
  const academy = taken.filter(({ place }) => place === 'academy');
  const batch = new Map<string, NewGrowthMeasure>();
  const verdicts = measures.map((measure): RecordedGrowth => {
    const athlete = athletes.get(measure.athleteId);
    if (!athlete) return refused('no such athlete');
    const key = `${measure.athleteId} ${measure.measuredOn}`;
    const twin = batch.get(key);
    if (twin)
      return refused(sameBody(twin, measure) ? 'the same measure a second time' : 'another measure of that day');
    const own = academy.filter(({ athleteId }) => athleteId === measure.athleteId);
    const known = own.find(({ measuredOn }) => measuredOn === measure.measuredOn);
    if (known) {
      if (!sameBody(known, measure)) return refused('other values are already recorded for that day');
      batch.set(key, measure);
      return { state: known.state, reason: known.state === 'asked' ? known.askedReason : null, fresh: false };
    }
    const outside = outsideRange(measure);
    if (outside !== null) return refused(outside);
    batch.set(key, measure);
    const before = own.findLast(({ measuredOn, state }) => state === 'valid' && measuredOn < measure.measuredOn);
    const reason = suspectGrowth({
      measure: { on: measure.measuredOn, ...bodyOf(measure) },
      birthDate: athlete.birthDate,
      earlier: before ? { on: before.measuredOn, ...bodyOf(before) } : null,
    });
    return { state: reason === null ? 'valid' : 'asked', reason, fresh: true };
  });
  await insertGrowthMeasures(
    trx,
    measures.flatMap((measure, i) => {
      const { state, reason, fresh } = verdicts[i]!;
      if (!fresh || state === 'refused') return [];
      return [
        {
          id: measure.id,
          academy_id: viewer.academyId,
          athlete_id: measure.athleteId,
          measured_on: measure.measuredOn,
          stature_m: measure.statureM,
          sitting_height_m: measure.sittingHeightM,
          mass_kg: measure.massKg,
          entered: JSON.stringify(measure.entered),
          state,
          asked_reason: reason,
          recorded_by: viewer.personId,
        },
      ];
    }),
  );
  const fresh = verdicts.filter((verdict) => verdict.fresh).length;
  if (fresh > 0) await writeAudit(trx, viewer, { action: 'record', subject: 'growth_measure', change: { fresh } });
  return verdicts;
}

/**
 * Records growth measures of the academy. One that stands there already is left as it is; a value that no child has is
 * refused; one that does not follow from the measure before is kept as asked and counts for nothing.
 *
 * @throws {AppError} forbidden
 */
export const recordGrowth = (viewer: Viewer, measures: readonly NewGrowthMeasure[]): Promise<RecordedGrowth[]> =>
  asViewer(viewer, (trx) => recordGrowthWithin(trx, viewer, measures));

const refused = (reason: string): RecordedGrowth => ({ state: 'refused', reason, fresh: false });

type Body = Omit<MeasuredBody, 'on'>;
const bodyOf = ({ statureM, sittingHeightM, massKg }: Body): Body => ({ statureM, sittingHeightM, massKg });

const sameBody = (a: Body, b: Body): boolean =>
  (['statureM', 'sittingHeightM', 'massKg'] as const).every((key) => sameValue(a[key], b[key]));

function outsideRange(measure: Body): string | null {
  for (const key of ['statureM', 'sittingHeightM', 'massKg'] as const) {
    const { name, lowest, highest } = RANGES[key];
    const value = measure[key];
    if (value !== null && (value < lowest || value > highest)) {
      const unit = key === 'massKg' ? 'kg' : 'm';
      return `a ${name} of ${value.toFixed(2)} ${unit} is outside ${lowest} to ${highest} ${unit}`;
    }
  }
  return bodyOf(measure).statureM === null && measure.sittingHeightM === null && measure.massKg === null
    ? 'no measure is given'
    : null;
}
