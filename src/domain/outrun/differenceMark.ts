import { differencePercent } from '#src/domain/asymmetry/differencePercent.ts';
import type { StrengthSession } from '#src/domain/outrun/athleteHistory.ts';
import { countedSessions, type CountedSession } from '#src/domain/outrun/countedSessions.ts';
import { fullPolicy, type OutrunPolicy } from '#src/domain/outrun/policy.ts';
import { Z90 } from '#src/domain/statistics/z90.ts';

/** The three difference marks of a lead deficit in one test. */
export type DifferenceMarkName = 'inside noise' | 'beyond noise' | 'same side twice';

/**
 * The mark and the newest counted session's figures: difference, standard error and interval in %, negative = lead
 * weaker; trials of each leg. `mark` is null where the lead leg is not the weaker, or with a reason where nothing counts.
 */
export interface DifferenceMark {
  mark: DifferenceMarkName | null;
  on: string | null;
  differencePct: number | null;
  standardErrorPct: number | null;
  interval90Pct: [number, number] | null;
  nLead: number | null;
  nTrail: number | null;
  reason: string | null;
}

/** Sessions of one test, any order; `asOf` (YYYY-MM-DD) leaves later ones out, default the newest. */
export interface DifferenceMarkInput {
  sessions: readonly StrengthSession[];
  asOf?: string;
  policy?: Partial<OutrunPolicy>;
}

/**
 * The difference mark of one test: a lead deficit whose 90 % upper limit is below 0 is beyond noise; so at the newest
 * two counted sessions, the same side twice. The noise is the typical error between days of each leg's mean:
 * `SE = (min/max)·√(TE_lead² + TE_trail²)`.
 *
 * Source: real only beyond variability, Exell et al. 2012, J Biomech 45:1108–11; the error between days is our own.
 *
 * @throws {RangeError} if the sessions are of more than one test, a date is none or a trial negative
 */
export function differenceMark({ sessions, asOf, policy }: DifferenceMarkInput): DifferenceMark {
  const test = sessions[0]?.test;
  const nothing = { mark: null, on: null, differencePct: null, standardErrorPct: null, interval90Pct: null };
  const none = (reason: string): DifferenceMark => ({ ...nothing, nLead: null, nTrail: null, reason });
  if (test === undefined) return none('Not tested yet.');
  if (sessions.some((session) => session.test !== test)) {
    throw new RangeError('differenceMark requires the sessions of one test, got several tests');
  }
  const newestOn = sessions.reduce((newest, { on }) => (on > newest ? on : newest), sessions[0]!.on);
  const counted = countedSessions(sessions, test, asOf ?? newestOn, fullPolicy(policy));
  const newest = counted.at(-1);
  if (!newest) return none('The first session of a test is for learning it; each leg needs two valid trials after it.');
  const figures = differenceOf(newest);
  if (!figures) return none('Both legs are 0: there is no difference to speak of.');

  const before = counted.at(-2);
  const beyondBefore = before ? isBeyond(differenceOf(before)) : false;
  const beyond = isBeyond(figures);
  const mark =
    figures.differencePct >= 0
      ? null
      : beyond && beyondBefore
        ? 'same side twice'
        : beyond
          ? 'beyond noise'
          : 'inside noise';
  return { mark, on: newest.on, ...figures, nLead: newest.nLead, nTrail: newest.nTrail, reason: null };
}

type Figures = { differencePct: number; standardErrorPct: number; interval90Pct: [number, number] };

function differenceOf({ lead, trail, teLeadPct, teTrailPct }: CountedSession): Figures | null {
  const differencePct = differencePercent(lead, trail);
  if (differencePct === null) return null;
  const standardErrorPct = (Math.min(lead, trail) / Math.max(lead, trail)) * Math.hypot(teLeadPct, teTrailPct);
  const half = Z90 * standardErrorPct;
  return { differencePct, standardErrorPct, interval90Pct: [differencePct - half, differencePct + half] };
}

const isBeyond = (figures: Figures | null) => figures !== null && figures.interval90Pct[1] < 0;
