import type { listGroundTraces } from '#src/db/queries/groundTraces.ts';
import type { GroundTraceResult } from '#src/domain/ground/groundTrace.ts';
import { mean } from '#src/domain/statistics/mean.ts';
import type { Side } from '#src/services/records/compareLegs.ts';
import { massNear, type GrowthRow } from '#src/services/records/growthFigures.ts';

export type GroundTraceRow = Awaited<ReturnType<typeof listGroundTraces>>[number];

/** The events of a swing in order, as they are named on screen. */
export const SWING_EVENT_NAMES = {
  takeaway: 'takeaway',
  lateBackswing: 'late backswing',
  top: 'top',
  earlyDownswing: 'early downswing',
  leadArmParallel: 'lead arm parallel',
  midDownswing: 'mid-downswing',
  impact: 'impact',
  finish: 'finish',
} as const;
export type SwingEvent = keyof typeof SWING_EVENT_NAMES;

export interface GroundSwing {
  id: string;
  swingNo: number;
  sharePctAt: Partial<Record<SwingEvent, number | null>>;
  style: GroundTraceResult['style'];
  peakLeadN: number | null;
  peakLeadTimesBodyWeight: number | null;
  /** Seconds from the lead peak to impact, and from lead arm parallel to the lead peak. */
  beforeImpactS: number | null;
  afterLeadArmParallelS: number | null;
  problems: string[];
}

export interface GroundSession {
  recordedOn: string;
  club: string;
  rig: string | null;
  measure: string;
  swings: GroundSwing[];
  /** Mean lead share of the swings at each event (% of both feet) and its mean time from takeaway (s). */
  meanShare: { event: SwingEvent; pct: number; timeS: number }[];
}

const MASS_WITHIN_DAYS = 31;
const G = 9.81;

/** Traces grouped by day and club, newest day first; `leadSide` picks the figures of the leg that leads now. */
export function groundSessions(
  rows: readonly GroundTraceRow[],
  leadSide: Side,
  growth: readonly GrowthRow[],
): GroundSession[] {
  const keys = [...new Set(rows.map(({ recordedOn, club }) => `${recordedOn} ${club}`))];
  return keys.map((key) => {
    const own = rows.filter(({ recordedOn, club }) => `${recordedOn} ${club}` === key);
    const { recordedOn, club, rig, measure } = own[0]!;
    const swings = own.map((row) => swingOf(row, leadSide, massNear(growth, recordedOn, MASS_WITHIN_DAYS)));
    return { recordedOn, club, rig, measure, swings, meanShare: meanShares(swings, own) };
  });
}

function swingOf(row: GroundTraceRow, leadSide: Side, massKg: number | null): GroundSwing {
  const figures = (row.figures as unknown as Record<Side, GroundTraceResult>)[leadSide];
  const peak = figures.peakLead;
  const isForce = row.measure === 'force';
  const peakLeadN = isForce ? (peak?.force ?? null) : null;
  return {
    id: row.id,
    swingNo: row.swingNo,
    sharePctAt: figures.leadSharePctAt,
    style: figures.style,
    peakLeadN,
    peakLeadTimesBodyWeight: peakLeadN === null || massKg === null ? null : peakLeadN / (massKg * G),
    beforeImpactS: peak?.beforeImpact ?? null,
    afterLeadArmParallelS: peak?.afterLeadArmParallel ?? null,
    problems: row.problems,
  };
}

function meanShares(swings: readonly GroundSwing[], rows: readonly GroundTraceRow[]): GroundSession['meanShare'] {
  const times = rows.map(({ events }) => events as Partial<Record<SwingEvent, number>>);
  return (Object.keys(SWING_EVENT_NAMES) as SwingEvent[]).flatMap((event) => {
    const values = swings.flatMap(({ sharePctAt }) => sharePctAt[event] ?? []);
    const after = times.flatMap((known) => (known[event] === undefined ? [] : known[event] - (known.takeaway ?? 0)));
    return values.length === 0 || after.length === 0 ? [] : [{ event, pct: mean(values), timeS: mean(after) }];
  });
}
