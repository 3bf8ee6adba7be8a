import type { Built, CapacityTest, DataLine } from '#src/domain/outrun/athleteHistory.ts';
import type { CountedSession } from '#src/domain/outrun/countedSessions.ts';
import { daysBetween } from '#src/domain/outrun/nearestInTime.ts';
import type { LegPair, OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import { TEST_FIGURES, testFigure } from '#src/domain/outrun/testFigures.ts';

/** How far lead-deficit reaches back, days before the judgement, inclusive. */
export const DEFICIT_WITHIN_DAYS = 400;
const NEWEST_SESSIONS = 2;

/** Newest two counted sessions of a test, or fewer, within 400 days before the judgement, oldest first. */
export function newestTwo(counted: readonly CountedSession[], asOf: string): CountedSession[] {
  return counted.filter(({ on }) => daysBetween(on, asOf) <= DEFICIT_WITHIN_DAYS).slice(-NEWEST_SESSIONS);
}

/**
 * lead-deficit's block from the counted sessions of push, jump and hop.
 *
 * @param counted counted sessions of each test, oldest first
 */
export function leadDeficitFrom(
  counted: Readonly<Record<CapacityTest, readonly CountedSession[]>>,
  asOf: string,
): Built<NonNullable<OutrunInput['leadDeficit']>> {
  const sessions = Object.values(counted).flatMap((ofTest) => newestTwo(ofTest, asOf));
  const used = sessions.map(({ test, on, lead, trail, nLead, nTrail }): DataLine => ({
    what: `${TEST_FIGURES[test].label}, lead and trail (means of ${nLead} and ${nTrail})`,
    on,
    value: `${testFigure(test, lead)} and ${testFigure(test, trail)}`,
  }));
  if (sessions.length === 0) {
    return {
      block: undefined,
      reason: `No push, jump or hop within ${DEFICIT_WITHIN_DAYS} days counts: an athlete’s first session of a test is for learning it, and each leg needs two valid trials.`,
      used,
    };
  }
  return { block: { values: sessions.map(asPair) }, reason: null, used };
}

/** lead-deficit's values after so many new testing days at which both legs of every test were level. */
export function valuesAfterLevelDays(
  counted: Readonly<Record<CapacityTest, readonly CountedSession[]>>,
  asOf: string,
  testingDays: number,
): LegPair[] {
  return Object.values(counted).flatMap((ofTest) => {
    const kept = newestTwo(ofTest, asOf).map(asPair);
    const newest = kept.at(-1);
    if (!newest) return [];
    const level = Array.from({ length: testingDays }, () => ({ ...newest, lead: newest.trail }));
    return [...kept, ...level].slice(-NEWEST_SESSIONS);
  });
}

const asPair = ({ lead, trail, teLeadPct, teTrailPct }: CountedSession): LegPair => ({
  lead,
  trail,
  teLeadPct,
  teTrailPct,
});
