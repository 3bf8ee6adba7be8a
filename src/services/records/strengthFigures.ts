import type { TestSession } from '#src/db/queries/testSessions.ts';
import { compareLegs, type LegComparison, type Side } from '#src/services/records/compareLegs.ts';
import { massNear, type GrowthRow } from '#src/services/records/growthFigures.ts';
import { Z90 } from '#src/domain/statistics/z90.ts';

export interface LegsPoint {
  on: string;
  lead: number;
  trail: number;
  /** Half of the 90 % interval of each leg's mean, from the typical error between days; null without one. */
  leadHalf: number | null;
  trailHalf: number | null;
}

// A mass within a month is the mass of the day for showing N per kg; judging asks for a fortnight.
const MASS_WITHIN_DAYS = 31;

/** Every comparison of an athlete, oldest first. */
export const comparisons = (sessions: readonly TestSession[], leadSide: Side): LegComparison[] =>
  sessions.flatMap((session) => compareLegs(session, leadSide) ?? []);

/** Push of each leg per kilogram of body mass, N/kg, on days with a mass within a month. */
export function pushPerKg(all: readonly LegComparison[], growth: readonly GrowthRow[]): LegsPoint[] {
  return all
    .filter(({ testKey }) => testKey === 'push')
    .flatMap((compared) => {
      const massKg = massNear(growth, compared.heldOn, MASS_WITHIN_DAYS);
      return massKg === null ? [] : [legsPoint(compared, 1 / massKg)];
    });
}

/** A comparison as a point of a line, in SI times `scale`. */
export function legsPoint(compared: LegComparison, scale = 1): LegsPoint {
  const half = (value: number, pct: number | undefined) =>
    pct === undefined ? null : (Z90 * value * scale * pct) / 100;
  return {
    on: compared.heldOn,
    lead: compared.leadMean * scale,
    trail: compared.trailMean * scale,
    leadHalf: half(compared.leadMean, compared.typicalErrorPct?.lead),
    trailHalf: half(compared.trailMean, compared.typicalErrorPct?.trail),
  };
}

/** The comparisons of the newest day that has any, in the order of the battery's tests. */
export function newestDay(all: readonly LegComparison[]): LegComparison[] {
  const newest = all.at(-1)?.heldOn;
  return all.filter(({ heldOn }) => heldOn === newest);
}
