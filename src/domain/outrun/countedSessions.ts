import type { CapacityTest, StrengthSession } from '#src/domain/outrun/athleteHistory.ts';
import { MIN_TRIALS } from '#src/domain/outrun/demand.ts';
import { upTo } from '#src/domain/outrun/nearestInTime.ts';
import type { OutrunPolicy } from '#src/domain/outrun/policy.ts';
import { typicalErrorPct } from '#src/domain/reliability/typicalErrorPct.ts';
import { mean } from '#src/domain/statistics/mean.ts';

/** Trial-to-trial CV (%) of the catalogue's tests: McCubbine et al.; JSSM 25:556; within published ranges. */
export const CATALOGUE_CV_PCT: Readonly<Record<CapacityTest, number>> = Object.freeze({ push: 4, jump: 5, hop: 4.5 });

/** One session of one test that counts: means of the legs (SI), their trials, their typical errors between days. */
export interface CountedSession {
  on: string;
  test: CapacityTest;
  lead: number;
  trail: number;
  nLead: number;
  nTrail: number;
  teLeadPct: number;
  teTrailPct: number;
}

/**
 * The sessions of one test that count, oldest first. An athlete's first session of a test, whatever its size, is for
 * learning it and counts for nothing; later ones count with at least two valid trials a leg. Rows of one date are one
 * session. A row without a valid trial is no session. The typical error is the programme's own, else
 * √(CV²/n + day²) with the catalogue's CV and each leg's own n.
 *
 * @param sessions all tests, any order
 * @param asOf     later sessions are left out
 * @throws {RangeError} if a date is none or a trial not finite
 */
export function countedSessions(
  sessions: readonly StrengthSession[],
  test: CapacityTest,
  asOf: string,
  policy: OutrunPolicy,
): CountedSession[] {
  const byDate = new Map<string, StrengthSession>();
  for (const session of upTo(sessions, asOf)) {
    if (session.test !== test || session.leadTrials.length + session.trailTrials.length === 0) continue;
    const before = byDate.get(session.on);
    byDate.set(session.on, before ? together(before, session) : session);
  }
  return [...byDate.values()]
    .slice(1)
    .filter(({ leadTrials, trailTrials }) => Math.min(leadTrials.length, trailTrials.length) >= MIN_TRIALS)
    .map(({ on, leadTrials, trailTrials, teLeadPct, teTrailPct }) => {
      const nLead = leadTrials.length;
      const nTrail = trailTrials.length;
      const errorOf = (n: number) => typicalErrorPct({ cvPct: CATALOGUE_CV_PCT[test], n, dayPct: policy.dayForcePct });
      return {
        on,
        test,
        lead: meanInAnyOrder(leadTrials),
        trail: meanInAnyOrder(trailTrials),
        nLead,
        nTrail,
        teLeadPct: teLeadPct ?? errorOf(nLead),
        teTrailPct: teTrailPct ?? errorOf(nTrail),
      };
    });
}

/** The mean from sorted values, so that the order of the rows does not move its last digit. */
const meanInAnyOrder = (values: readonly number[]) => mean([...values].sort((a, b) => a - b));

function together(a: StrengthSession, b: StrengthSession): StrengthSession {
  return {
    ...a,
    leadTrials: [...a.leadTrials, ...b.leadTrials],
    trailTrials: [...a.trailTrials, ...b.trailTrials],
    teLeadPct: a.teLeadPct ?? b.teLeadPct,
    teTrailPct: a.teTrailPct ?? b.teTrailPct,
  };
}
