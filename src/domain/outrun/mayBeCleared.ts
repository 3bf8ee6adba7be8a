import { isClear, type OutrunLevel } from '#src/domain/outrun/level.ts';

/** One judgement of an athlete; `testingDayId` is null where no testing day caused it (a driver session, say). */
export interface JudgementInBrief {
  level: OutrunLevel | null;
  points: number;
  testingDayId: string | null;
}

/**
 * Whether an outrun may be cleared: no level and at most one point at two judgements running, made from two different
 * testing days. Judging the same data again does not count, and the latest judgement of a testing day replaces the
 * earlier ones. A judgement without a testing day cannot clear, but breaks the run where it is not clear. People
 * still decide.
 *
 * @param judgements in the order in which they were made, newest last
 */
export function mayBeCleared(judgements: readonly JudgementInBrief[]): boolean {
  const seen = new Set<string>();
  for (const judgement of [...judgements].reverse()) {
    const { testingDayId } = judgement;
    if (testingDayId !== null && seen.has(testingDayId)) continue;
    if (!isClear(judgement)) return false;
    if (testingDayId !== null) seen.add(testingDayId);
    if (seen.size === 2) return true;
  }
  return false;
}
