import type { Tx } from '#src/db/client.ts';
import { listDriverSessions, type DriverSessionRow } from '#src/db/queries/driverSessions.ts';
import { listGrowthMeasures } from '#src/db/queries/growthMeasures.ts';
import { listForJudging, listTracesForJudging } from '#src/db/queries/judging.ts';
import { listTestSessions, type TestSession } from '#src/db/queries/testSessions.ts';
import { robustCarry } from '#src/domain/driver/robustCarry.ts';
import type { GroundTraceResult } from '#src/domain/ground/groundTrace.ts';
import type { AthleteHistory, GroundSession, StrengthSession } from '#src/domain/outrun/athleteHistory.ts';
import { median } from '#src/domain/statistics/median.ts';
import { Z90 } from '#src/domain/statistics/z90.ts';
import { leadSideOf, type Side } from '#src/services/records/compareLegs.ts';

/** An athlete's dated raw data, before a date and the programme's figures are chosen. */
export interface LoadedHistory {
  athleteId: string;
  history: Omit<AthleteHistory, 'asOf' | 'programme' | 'policy'>;
  /** Testing days with a valid trial of a judged test, oldest first. */
  testingDays: { id: string; on: string }[];
}

/** Everything that judging needs of these athletes, in five statements. Athletes out of scope are left out. */
export async function loadHistories(trx: Tx, athleteIds: readonly string[]): Promise<LoadedHistory[]> {
  if (athleteIds.length === 0) return [];
  const athletes = await listForJudging(trx, athleteIds);
  const tests = groupByAthlete(await listTestSessions(trx, athleteIds));
  const growth = groupByAthlete(await listGrowthMeasures(trx, athleteIds));
  const drives = groupByAthlete(await listDriverSessions(trx, athleteIds));
  const traces = groupByAthlete(await listTracesForJudging(trx, athleteIds));
  return athletes.map(({ id, birthDate, sex, plays }) => {
    const leadSide = leadSideOf(plays);
    const judged = (tests.get(id) ?? []).filter(({ capacity }) => capacity !== null);
    const days = new Map(judged.map(({ testingDayId, heldOn }) => [testingDayId, heldOn]));
    return {
      athleteId: id,
      testingDays: [...days].map(([dayId, on]) => ({ id: dayId, on })),
      history: {
        birthDate,
        sex,
        strength: judged.map((session) => strengthOf(session, leadSide)),
        growth: (growth.get(id) ?? []).map(({ measuredOn, statureM, massKg, place }) => ({
          on: measuredOn,
          statureCm: statureM === null || place === 'home' ? null : statureM * 100,
          massKg,
        })),
        driver: (drives.get(id) ?? []).map(driverOf),
        ground: groundOf(traces.get(id) ?? [], leadSide),
        hipRotation: hipRotationOf(tests.get(id) ?? [], leadSide),
      },
    };
  });
}

function strengthOf(session: TestSession, leadSide: Side): StrengthSession {
  return {
    on: session.heldOn,
    test: session.capacity!,
    leadTrials: session[leadSide],
    trailTrials: session[leadSide === 'left' ? 'right' : 'left'],
  };
}

const STRONGEST_WIND_MPS = 3;
const medianOf = (values: readonly number[]): number | null => (values.length === 0 ? null : median(values));

function driverOf(row: DriverSessionRow) {
  const carry = row.carryStandardM.length === 0 ? null : robustCarry(row.carryStandardM);
  const speed = row.clubSpeedMps.length === 0 ? null : robustCarry(row.clubSpeedMps);
  // Smallest change that two such medians can show: √2 of one median's error at 90 %.
  const mdc = (standardError: number | null | undefined) => (standardError ? Z90 * Math.SQRT2 * standardError : null);
  return {
    on: row.heldOn,
    carryStandardM: carry?.median ?? null,
    windTooStrong: row.windMps !== null && Math.abs(row.windMps) > STRONGEST_WIND_MPS,
    clubSpeed: speed?.median ?? null,
    attackDeg: medianOf(row.attackDeg),
    dynamicLoftDeg: medianOf(row.dynamicLoftDeg),
    carryMdcM: mdc(carry?.standardError),
    clubSpeedMdc: mdc(speed?.standardError),
  };
}

type TraceRow = Awaited<ReturnType<typeof listTracesForJudging>>[number];

function groundOf(rows: readonly TraceRow[], leadSide: Side): GroundSession[] {
  const keyOf = ({ on, club, rig }: TraceRow) => `${on} ${club} ${rig ?? ''}`;
  return [...new Set(rows.map(keyOf))].map((key) => {
    const own = rows.filter((row) => keyOf(row) === key);
    const { on, club, rig } = own[0]!;
    return { on, club, rig, swings: own.map((row) => swingOf(row, leadSide)) };
  });
}

function swingOf(row: TraceRow, leadSide: Side): GroundSession['swings'][number] {
  const figures = (row.figures as unknown as Record<Side, GroundTraceResult>)[leadSide];
  const isForce = row.measure === 'force';
  const after = figures.peakLead.afterLeadArmParallel;
  return {
    peakLeadTimesBodyWeight: null,
    peakLeadForceN: isForce ? figures.peakLead.force : null,
    earlyDownswingPct: figures.leadSharePctAt.earlyDownswing ?? null,
    impactPct: figures.leadSharePctAt.impact ?? null,
    afterLeadArmParallelMs: after === null ? null : after * 1000,
    sampleRateHz: row.sampleRateHz,
    bothPlates: true,
    measure: isForce ? 'force' : 'pressure',
  };
}

function hipRotationOf(sessions: readonly TestSession[], leadSide: Side) {
  const trailSide = leadSide === 'left' ? 'right' : 'left';
  return sessions
    .filter(
      (session) => session.testKey === 'hip-internal-rotation' && session.left.length > 0 && session.right.length > 0,
    )
    .map((session) => ({ on: session.heldOn, lead: median(session[leadSide]), trail: median(session[trailSide]) }));
}

function groupByAthlete<T extends { athleteId: string }>(rows: readonly T[]): Map<string, T[]> {
  const groups = new Map<string, T[]>();
  for (const row of rows) {
    const group = groups.get(row.athleteId);
    if (group) group.push(row);
    else groups.set(row.athleteId, [row]);
  }
  return groups;
}
