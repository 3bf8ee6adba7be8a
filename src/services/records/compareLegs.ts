import type { TestSession } from '#src/db/queries/testSessions.ts';
import { asymmetry } from '#src/domain/asymmetry/asymmetry.ts';
import { typicalErrorPct } from '#src/domain/reliability/typicalErrorPct.ts';
import { mean } from '#src/domain/statistics/mean.ts';

export type Side = 'left' | 'right';

/** The leg nearer the target: left for a player who swings right-handed. */
export const leadSideOf = (plays: Side): Side => (plays === 'right' ? 'left' : 'right');

export interface LegComparison {
  testKey: string;
  testName: string;
  /** Unit for showing; the means are SI. */
  unit: string;
  quantity: string;
  heldOn: string;
  testingDayId: string;
  leadMean: number;
  trailMean: number;
  leadN: number;
  trailN: number;
  /** Typical error between days of each leg's mean, %; null without a published or agreed noise. */
  typicalErrorPct: { lead: number; trail: number } | null;
  /** Lead minus trail: % of the larger, or degrees. */
  difference: number;
  differenceUnit: '%' | '°';
  /** 90 % limits of the difference. */
  interval: readonly [number, number] | null;
  beyondNoise: boolean | null;
}

/**
 * Lead against trail in one test on one day, with the typical error between days (SCIENCE §9). Null unless both legs
 * have a valid trial; joint angles are compared in degrees and without an interval, which no source gives.
 */
export function compareLegs(session: TestSession, leadSide: Side): LegComparison | null {
  const lead = session[leadSide];
  const trail = session[leadSide === 'left' ? 'right' : 'left'];
  if (lead.length === 0 || trail.length === 0 || session.comparesIn === 'none') return null;
  const common = {
    testKey: session.testKey,
    testName: session.testName,
    unit: session.unit,
    quantity: session.quantity,
    heldOn: session.heldOn,
    testingDayId: session.testingDayId,
    leadMean: mean(lead),
    trailMean: mean(trail),
    leadN: lead.length,
    trailN: trail.length,
  };
  if (session.comparesIn === 'degrees') {
    const degrees = common.leadMean - common.trailMean;
    return {
      ...common,
      typicalErrorPct: null,
      difference: degrees,
      differenceUnit: '°',
      interval: null,
      beyondNoise: null,
    };
  }
  const { cvPct } = session;
  const noise =
    cvPct === null
      ? null
      : { lead: typicalErrorPct({ cvPct, n: lead.length }), trail: typicalErrorPct({ cvPct, n: trail.length }) };
  const compared = asymmetry({
    lead,
    trail,
    better: session.better,
    ...(noise ? { noise: { typicalErrorPct: noise } } : {}),
  });
  if (compared.differencePct === null) return null;
  return {
    ...common,
    typicalErrorPct: noise,
    difference: compared.differencePct,
    differenceUnit: '%',
    interval: noise ? compared.interval90Pct : null,
    beyondNoise: noise ? compared.beyondNoise : null,
  };
}
