import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer, type Tx } from '#src/db/client.ts';
import { listAcademyTests, listAthletesToRecord, type AcademyTest } from '#src/db/queries/academyTests.ts';
import { lockTestingDays, type TestingDayRow } from '#src/db/queries/testingDays.ts';
import { insertTrials, listEarlierMedians, listTrialsOfDays, type StoredTrial } from '#src/db/queries/trialWrites.ts';
import { firstMedian } from '#src/domain/catalogue/firstMedian.ts';
import { suspectValue } from '#src/domain/catalogue/suspectValue.ts';
import { ageYears } from '#src/domain/growth/ageYears.ts';
import { AppError, notFound } from '#src/errors/appError.ts';
import { writeAudit } from '#src/services/audit.ts';
import { sameValue, type Recorded } from '#src/services/testing/recorded.ts';

/** One trial to be recorded, with the id that the client made for it. */
export interface NewTrial {
  id: string;
  testingDayId: string;
  athleteId: string;
  testId: string;
  /** The leg or hand; null for a test without sides. */
  side: 'left' | 'right' | null;
  /** 1 to 9 */
  attempt: number;
  valueSi: number;
  enteredValue: string;
  enteredUnit: string;
  voidReason?: string | null;
  /** Where it came from, for an imported one. */
  origin?: string | null;
}

export interface RecordTrials {
  trials: readonly NewTrial[];
  /** An import may add to a day that is closed; the day is judged again. */
  closedDaysToo?: boolean;
}

export type RecordedTrial = Recorded<'valid' | 'asked' | 'void'>;

/**
 * `recordTrials` within another's transaction.
 *
 * @returns one verdict a trial, in the order given
 */
export async function recordTrialsWithin(
  trx: Tx,
  viewer: Viewer,
  { trials, closedDaysToo = false }: RecordTrials,
): Promise<RecordedTrial[]> {
  requirePermission(viewer, 'trial:record');
  if (trials.length === 0) return [];
  const dayIds = [...new Set(trials.map(({ testingDayId }) => testingDayId))];
  const days = new Map((await lockTestingDays(trx, dayIds)).map((day) => [day.id, day]));
  if (days.size !== dayIds.length) notFound('testing day');
  if (!closedDaysToo && [...days.values()].some(({ state }) => state === 'closed')) {
    throw new AppError('conflict', 'This testing day is closed');
  }
  const judge = await judgeOfTrials(trx, trials, days);
  const verdicts = trials.map((trial) => judge(trial));
  await insertTrials(
    trx,
    trials.flatMap((trial, i) => {
      const { state, reason, fresh } = verdicts[i]!;
      if (!fresh || state === 'refused') return [];
      return [
        {
          id: trial.id,
          academy_id: viewer.academyId,
          testing_day_id: trial.testingDayId,
          athlete_id: trial.athleteId,
          test_id: trial.testId,
          side: trial.side,
          attempt: trial.attempt,
          value_si: trial.valueSi,
          entered_value: trial.enteredValue,
          entered_unit: trial.enteredUnit,
          state,
          asked_reason: state === 'asked' ? reason : null,
          void_reason: state === 'void' ? reason : null,
          recorded_by: viewer.personId,
          origin: trial.origin ?? null,
        },
      ];
    }),
  );
  const fresh = verdicts.filter((verdict) => verdict.fresh);
  if (fresh.length > 0) {
    const count = (state: string) => fresh.filter((verdict) => verdict.state === state).length;
    const change = { valid: count('valid'), asked: count('asked'), void: count('void'), testingDays: dayIds };
    await writeAudit(trx, viewer, { action: 'record', subject: 'trial', change });
  }
  return verdicts;
}

/**
 * Records trials. One that stands there already with the same value is left as it is; another value for the same
 * trial, and a value that the test cannot give, are refused; a suspect one is kept as asked and counts for nothing.
 *
 * @returns one verdict a trial, in the order given
 * @throws {AppError} forbidden; not-found for a day out of scope; conflict for a closed one
 */
export const recordTrials = (viewer: Viewer, input: RecordTrials): Promise<RecordedTrial[]> =>
  asViewer(viewer, (trx) => recordTrialsWithin(trx, viewer, input));

const refused = (reason: string): RecordedTrial => ({ state: 'refused', reason, fresh: false });
const slot = (trial: Pick<NewTrial, 'testingDayId' | 'athleteId' | 'testId' | 'side' | 'attempt'>): string =>
  [trial.testingDayId, trial.athleteId, trial.testId, trial.side ?? '', trial.attempt].join(' ');
const leg = (of: { athleteId: string; testId: string; side: string | null }): string =>
  [of.athleteId, of.testId, of.side ?? ''].join(' ');

async function judgeOfTrials(trx: Tx, trials: readonly NewTrial[], days: ReadonlyMap<string, TestingDayRow>) {
  const tests = new Map((await listAcademyTests(trx)).map((test) => [test.id, test]));
  const athletes = new Map((await listAthletesToRecord(trx)).map((athlete) => [athlete.id, athlete]));
  const stored = new Map((await listTrialsOfDays(trx, [...days.keys()])).map((trial) => [slot(trial), trial]));
  const medians = new Map<string, Map<string, number>>();
  const athleteIds = [...new Set(trials.map(({ athleteId }) => athleteId))];
  for (const heldOn of new Set([...days.values()].map((day) => day.heldOn))) {
    const rows = await listEarlierMedians(trx, athleteIds, heldOn);
    medians.set(heldOn, new Map(rows.map((row) => [leg(row), row.medianSi])));
  }
  const taken = new Map<string, NewTrial>();
  return (trial: NewTrial): RecordedTrial => {
    const test = tests.get(trial.testId);
    const athlete = athletes.get(trial.athleteId);
    if (!test) return refused('no such test');
    if (!athlete) return refused('no such athlete');
    if (test.sided !== (trial.side !== null))
      return refused(test.sided ? 'no side is given' : 'this test has no sides');
    const twin = taken.get(slot(trial));
    if (twin) {
      const same = sameValue(twin.valueSi, trial.valueSi);
      return refused(same ? 'the same trial a second time' : 'another value for the same trial stands before it');
    }
    const known = stored.get(slot(trial));
    if (known) return knownTrial(trial, known, taken);
    const { heldOn } = days.get(trial.testingDayId)!;
    const age = ageYears(athlete.birthDate, heldOn);
    const reference = medians.get(heldOn)?.get(leg(trial)) ?? firstMedian(test.firstMediansSi, age);
    const verdict = verdictOn(trial, test, reference);
    if (verdict.state !== 'refused') taken.set(slot(trial), trial);
    return verdict;
  };
}

function knownTrial(trial: NewTrial, known: StoredTrial, taken: Map<string, NewTrial>): RecordedTrial {
  if (!sameValue(known.valueSi, trial.valueSi)) return refused('another value is already recorded for this trial');
  taken.set(slot(trial), trial);
  const reason = { valid: null, asked: known.askedReason, void: known.voidReason }[known.state];
  return { state: known.state, reason, fresh: false };
}

function verdictOn(trial: NewTrial, test: AcademyTest, reference: number | null): RecordedTrial {
  if (!(trial.valueSi >= 0 && trial.valueSi < 1e6)) return refused('no value that can be kept');
  if (trial.voidReason) return { state: 'void', reason: trial.voidReason, fresh: true };
  const { lowestSi: lowest, highestSi: highest } = test;
  const { verdict, reason } = suspectValue({ value: trial.valueSi, lowest, highest, reference });
  if (verdict === 'refused') return refused(reason!);
  return { state: verdict === 'asked' ? 'asked' : 'valid', reason, fresh: true };
}
