import type { OutrunPolicy } from '#src/domain/outrun/policy.ts';

/** A calendar date YYYY-MM-DD, or a whole number of days from any origin that is the same for all. */
export type Day = string | number;

/** Means of the two legs in one session of one test, and the typical error between days of each (%). */
export interface LegPair {
  lead: number;
  trail: number;
  teLeadPct: number;
  teTrailPct: number;
}

/** Carry (m, standard conditions), lead push peak (N), stature (cm) and age (years) of one driver session. */
export interface CarryPair {
  day: Day;
  carry: number;
  strength: number;
  stature: number;
  age: number;
}

/** The mean of several tries, their CV (%) and their number. */
export interface Summary {
  mean: number;
  cvPct: number;
  n: number;
}

/** Lead push (N, absolute) and club speed (m/s) of one athlete. */
export interface StrengthAndSpeed {
  strength: number;
  clubSpeed: number;
}

/** One judgement's summaries; a block left out makes its criterion "cannot say". */
export interface OutrunInput {
  /** date of the judgement; default the newest day of the pairs */
  asOf?: Day;
  leadDeficit?: { values: readonly LegPair[] };
  divergence?: { pairs: readonly CarryPair[]; othersRaw?: readonly number[]; asOf?: Day };
  /** forces in times body weight; `programmeMedian` is a ratio */
  demand?: { peakLead: Summary; capacity: Summary; programmeMedian?: number | null };
  /** lead share (%) of each swing at the two events, in the same order; `typicalErrorPct` in points of share */
  lateReturn?: {
    earlyDownswing: readonly number[];
    impact: readonly number[];
    typicalErrorPct?: number | null;
  };
  aheadOfStrength?: { others: readonly StrengthAndSpeed[]; athlete: StrengthAndSpeed };
  latePeak?: { afterLeadArmParallelMs: readonly number[] };
  /** carry in m, club speed in m/s, angles in degrees; changes are newest − before */
  delivery?: {
    carryChange: number;
    carryMdc: number;
    clubSpeedChange: number;
    clubSpeedMdc: number;
    attackChangeDeg?: number | null;
    loftChangeDeg?: number | null;
    strengthRisen: boolean;
  };
  /** hip internal rotation in degrees, a row for each time it was measured */
  context?: {
    hipRotation?: readonly { lead: number; trail: number }[];
    pain?: number | null;
    velocityInSpurtBand?: boolean | null;
    driverBallsChangePct?: number | null;
  };
  policy?: Partial<OutrunPolicy>;
}
