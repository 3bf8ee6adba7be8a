import { uuidv7 } from 'uuidv7';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer, type Tx } from '#src/db/client.ts';
import { recordDriverSessionWithin } from '#src/services/driver/recordDriverSession.ts';
import { recordGroundTracesWithin } from '#src/services/driver/recordGroundTraces.ts';
import { driverSessions } from '#src/services/import/driverSessions.ts';
import type { Read, Season } from '#src/services/import/readSeason.ts';
import type { Verdict } from '#src/services/import/seasonReport.ts';
import { rejudgeWithin } from '#src/services/judging/judgeAthletes.ts';
import { markDaysClosedWithin } from '#src/services/testing/closeTestingDays.ts';
import { openTestingDayWithin } from '#src/services/testing/openTestingDay.ts';
import { recordCurvesWithin } from '#src/services/testing/recordCurves.ts';
import type { Recorded } from '#src/services/testing/recorded.ts';
import { recordGrowthWithin } from '#src/services/testing/recordGrowth.ts';
import { recordTrialsWithin } from '#src/services/testing/recordTrials.ts';

/** What the academy has that a date's data need: ids by name. */
export interface AcademyIds {
  batteryId: string;
  testIds: ReadonlyMap<string, string>;
  squadOf: ReadonlyMap<string, string>;
}

/** What committing a date did. */
export interface CommittedDate {
  sessions: number;
  judged: number;
}

/**
 * Commits all that the files hold of one date, closes its testing days and judges the athletes with anything new, once:
 * all of it or nothing. Verdicts go onto the report's lines.
 */
export async function commitDate(viewer: Viewer, season: Season, on: string, ids: AcademyIds): Promise<CommittedDate> {
  const verdicts: (() => void)[] = [];
  const done = await asViewer(viewer, async (trx) => {
    const writer: DateWriter = { trx, viewer, on, ids, affected: new Set(), verdicts };
    await commitGrowth(writer, season);
    const dayIds = await commitTrials(writer, season);
    await commitCurves(writer, season, dayIds);
    const sessions = await commitShots(writer, season);
    await commitTraces(writer, season);
    await markDaysClosedWithin(trx, viewer, [...dayIds.values()]);
    const judged = await rejudgeWithin(trx, viewer, [...writer.affected], 'imported data');
    return { sessions, judged: judged.length };
  });
  // Only what is committed is told.
  for (const tell of verdicts) tell();
  return done;
}

interface DateWriter {
  trx: Tx;
  viewer: Viewer;
  on: string;
  ids: AcademyIds;
  affected: Set<string>;
  verdicts: (() => void)[];
}

const VERDICTS: Readonly<Record<string, Verdict>> = {
  ...{ valid: 'taken', taken: 'taken', counted: 'taken', void: 'void', asked: 'asked', refused: 'refused' },
  ...{ excluded: 'excluded', 'other club': 'other club' },
};

function settle<T extends { athleteId: string }>(
  { affected, verdicts }: DateWriter,
  reads: readonly Read<T>[],
  recorded: readonly Recorded<string>[],
): void {
  reads.forEach(({ value, line }, i) => {
    const { state, reason, fresh } = recorded[i]!;
    if (fresh) affected.add(value.athleteId);
    verdicts.push(() => Object.assign(line, { verdict: VERDICTS[state]!, reason: reason ?? '' }));
  });
}

async function commitGrowth(writer: DateWriter, season: Season): Promise<void> {
  const reads = season.growth.filter(({ value }) => value.measuredOn === writer.on);
  const measures = reads.map(({ value }) => ({ id: uuidv7(), ...value }));
  settle(writer, reads, await recordGrowthWithin(writer.trx, writer.viewer, measures));
}

/** Gives the testing day of each squad that was tested. */
async function commitTrials(writer: DateWriter, season: Season): Promise<Map<string, string>> {
  const { trx, viewer, on, ids } = writer;
  const all = season.trials.filter(({ value }) => value.heldOn === on);
  for (const { value, line } of all) {
    if (value.valueSi !== null) continue;
    const reason = `${value.voidReason ?? ''}; no value to keep`;
    writer.verdicts.push(() => Object.assign(line, { verdict: 'void', reason }));
  }
  const reads = all.filter(({ value }) => value.valueSi !== null);
  const days = new Map<string, string>();
  for (const squadId of new Set(reads.map(({ value }) => ids.squadOf.get(value.athleteId)!))) {
    const day = await openTestingDayWithin(trx, viewer, { squadId, batteryId: ids.batteryId, heldOn: on });
    days.set(squadId, day.id);
  }
  const trials = reads.map(({ value, line }) => ({
    id: uuidv7(),
    testingDayId: days.get(ids.squadOf.get(value.athleteId)!)!,
    athleteId: value.athleteId,
    testId: ids.testIds.get(value.testKey)!,
    side: value.side,
    attempt: value.attempt,
    valueSi: value.valueSi!,
    enteredValue: value.enteredValue,
    enteredUnit: value.enteredUnit,
    voidReason: value.voidReason,
    origin: `${line.file}, row ${line.row}, column ${line.column}`,
  }));
  settle(writer, reads, await recordTrialsWithin(trx, viewer, { trials, closedDaysToo: true }));
  return days;
}

async function commitCurves(writer: DateWriter, season: Season, days: ReadonlyMap<string, string>): Promise<void> {
  const reads = season.curves.filter(({ value }) => value.recordedOn === writer.on);
  const curves = reads.map(({ value }) => ({
    ...value,
    id: uuidv7(),
    testingDayId: days.get(writer.ids.squadOf.get(value.athleteId)!) ?? null,
  }));
  settle(writer, reads, await recordCurvesWithin(writer.trx, writer.viewer, curves));
}

async function commitShots(writer: DateWriter, season: Season): Promise<number> {
  const reads = season.shots.filter(({ value }) => value.heldOn === writer.on);
  const sessions = driverSessions(writer.on, reads, season.conditions);
  for (const { conditions, shots } of sessions) {
    const recorded = await recordDriverSessionWithin(writer.trx, writer.viewer, {
      ...conditions,
      shots: shots.map(({ read, shotNo }) => ({ ...read.value, id: uuidv7(), shotNo })),
    });
    settle(
      writer,
      shots.map(({ read }) => read),
      recorded.shots,
    );
  }
  return sessions.length;
}

async function commitTraces(writer: DateWriter, season: Season): Promise<void> {
  const reads = season.traces.filter(({ value }) => value.recordedOn === writer.on);
  const traces = reads.map(({ value }) => ({ ...value, id: uuidv7() }));
  settle(writer, reads, await recordGroundTracesWithin(writer.trx, writer.viewer, writer.on, traces));
}
