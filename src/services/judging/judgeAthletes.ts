import type { Viewer } from '#src/access/viewer.ts';
import type { Tx } from '#src/db/client.ts';
import { findPolicy, insertJudgements, listNewestDataDates, listProgrammeFigures } from '#src/db/queries/judging.ts';
import type { ProgrammeFigure } from '#src/db/queries/judging.ts';
import { differenceMark, type DifferenceMarkName } from '#src/domain/outrun/differenceMark.ts';
import { judgeAthlete, type AthleteJudgement } from '#src/domain/outrun/judgeAthlete.ts';
import type { AthleteHistory } from '#src/domain/outrun/athleteHistory.ts';
import type { OutrunPolicy } from '#src/domain/outrun/policy.ts';
import { mean } from '#src/domain/statistics/mean.ts';
import { AppError } from '#src/errors/appError.ts';
import { enqueue } from '#src/queue/enqueue.ts';
import { loadHistories, type LoadedHistory } from '#src/services/judging/loadHistories.ts';
import { moveOutruns } from '#src/services/judging/moveOutruns.ts';

export interface JudgeInput {
  athleteIds: readonly string[];
  /** The date of the data that caused the judgement; later data are left out. */
  asOf: string;
  /** What caused it, in words for the evidence page. */
  cause: string;
}

export interface Judged {
  athleteId: string;
  level: 'look' | 'act' | null;
  points: number;
}

const NOBODY: AthleteHistory['programme'] = { othersRaw: [], othersDemand: [], others: [] };

/**
 * Judges athletes as of a date in the caller's transaction, keeps each judgement with its inputs, and moves their
 * outruns. First every athlete's own figures, then each against the others: of this set as they are now, of the rest
 * of the academy as their newest judgement has them. The others are judged again by a job.
 */
export async function judgeAthletesWithin(
  trx: Tx,
  viewer: Viewer | null,
  { athleteIds, asOf, cause }: JudgeInput,
): Promise<Judged[]> {
  const loaded = await loadHistories(trx, athleteIds);
  if (loaded.length === 0) return [];
  const policy = await findPolicy(trx);
  if (!policy) throw new AppError('unavailable', 'The academy has no policy yet');
  const thresholds = policy.thresholds as unknown as OutrunPolicy;
  const alone = loaded.map((one) => ({
    one,
    figures: programmeFigure(one, judgeAthlete({ ...one.history, asOf, programme: NOBODY, policy: thresholds }), asOf),
  }));
  const elsewhere = await listProgrammeFigures(trx, athleteIds, asOf);
  const rows = alone.map(({ one, figures }) => {
    const others = [...alone.filter((other) => other.one !== one).map((other) => other.figures), ...elsewhere];
    const programme = programmeOf(others, figures.demand_rig);
    const history: AthleteHistory = { ...one.history, asOf, programme, policy: thresholds };
    const { result, dataUsed, impossibleBefore } = judgeAthlete(history);
    return {
      athleteId: one.athleteId,
      asOf,
      cause,
      testingDayId: one.testingDays.findLast(({ on }) => on <= asOf)?.id ?? null,
      policyVersionId: policy.id,
      level: result.level,
      points: result.points,
      rawGainPct: figures.raw_gain_pct,
      demandRatio: figures.demand_ratio,
      demandRig: figures.demand_rig,
      leadPushN: figures.lead_push_n,
      clubSpeedMps: figures.club_speed_mps,
      programme,
      history: one.history,
      result: { ...result, dataUsed, impossibleBefore },
      marks: marksOf(one, asOf, thresholds),
    };
  });
  const judgementIds = await insertJudgements(trx, rows);
  const judged = rows.map((row, i) => ({
    athleteId: row.athleteId,
    judgementId: judgementIds[i]!,
    asOf,
    level: row.level,
    points: row.points,
  }));
  await moveOutruns(trx, viewer, judged);
  if (viewer)
    await enqueue(trx, 'rejudgeOthers', { academyId: viewer.academyId, exceptIds: [...athleteIds] }, viewer.academyId);
  return judged.map(({ athleteId, level, points }) => ({ athleteId, level, points }));
}

/** Judges athletes again, each as of the date of their own newest data. */
export async function rejudgeWithin(
  trx: Tx,
  viewer: Viewer | null,
  athleteIds: readonly string[],
  cause: string,
): Promise<Judged[]> {
  const dates = await listNewestDataDates(trx, athleteIds);
  const judged: Judged[] = [];
  for (const asOf of [...new Set(dates.map(({ on }) => on))].sort()) {
    const own = dates.filter(({ on }) => on === asOf).map(({ athleteId }) => athleteId);
    judged.push(...(await judgeAthletesWithin(trx, viewer, { athleteIds: own, asOf, cause })));
  }
  return judged;
}

function programmeFigure({ history }: LoadedHistory, alone: AthleteJudgement, asOf: string): ProgrammeFigure {
  const push = history.strength
    .filter(({ test, on, leadTrials }) => test === 'push' && on <= asOf && leadTrials.length >= 2)
    .at(-1);
  const drive = history.driver.filter(({ on, clubSpeed }) => on <= asOf && clubSpeed !== null).at(-1);
  return {
    raw_gain_pct: alone.raw,
    demand_ratio: alone.demandRatio?.value ?? null,
    demand_rig: alone.demandRatio?.rig ?? null,
    lead_push_n: push ? mean(push.leadTrials) : null,
    club_speed_mps: drive?.clubSpeed ?? null,
  };
}

function programmeOf(others: readonly ProgrammeFigure[], rig: string | null): AthleteHistory['programme'] {
  return {
    othersRaw: others.flatMap(({ raw_gain_pct: raw }) => raw ?? []),
    othersDemand: others.flatMap((other) => (other.demand_rig === rig ? (other.demand_ratio ?? []) : [])),
    others: others.flatMap(({ lead_push_n: strength, club_speed_mps: clubSpeed }) =>
      strength === null || clubSpeed === null ? [] : [{ strength, clubSpeed }],
    ),
  };
}

const MARKED = { push: 'Push', jump: 'Jump', hop: 'Hop' } as const;

/** The difference marks of the capacity tests that have one, as staff's squad list shows them. */
function marksOf(
  { history }: LoadedHistory,
  asOf: string,
  policy: OutrunPolicy,
): { test: string; mark: DifferenceMarkName }[] {
  return (Object.keys(MARKED) as (keyof typeof MARKED)[]).flatMap((test) => {
    const { mark } = differenceMark({
      sessions: history.strength.filter((session) => session.test === test),
      asOf,
      policy,
    });
    return mark === null ? [] : [{ test: MARKED[test], mark }];
  });
}
