import type { Sex } from '#src/domain/growth/sex.ts';
import type { StrengthAndSpeed } from '#src/domain/outrun/outrunInput.ts';
import type { OutrunPolicy } from '#src/domain/outrun/policy.ts';

/** The capacity tests that a lead deficit is judged on; the reach is never one of them. */
export type CapacityTest = 'push' | 'jump' | 'hop';

/**
 * One test on one date: the valid trials of each leg (push N, jump m, hop m), void, blank and asked ones left out.
 * `teLeadPct` and `teTrailPct` come from the programme's own two-day study of the test, if there is one.
 */
export interface StrengthSession {
  on: string;
  test: CapacityTest;
  leadTrials: readonly number[];
  trailTrials: readonly number[];
  teLeadPct?: number | null;
  teTrailPct?: number | null;
}

/** Stature and body mass of one date. */
export interface GrowthMeasure {
  on: string;
  statureCm: number | null;
  massKg: number | null;
}

/** One driver session: robust carry at standard conditions, club speed (m/s), delivery, minimal detectable changes. */
export interface DriverSession {
  on: string;
  carryStandardM: number | null;
  windTooStrong: boolean;
  clubSpeed: number | null;
  attackDeg: number | null;
  dynamicLoftDeg: number | null;
  carryMdcM?: number | null;
  clubSpeedMdc?: number | null;
  ballsWeekChangePct?: number | null;
}

/** One swing's ground trace in figures; shares in % of lead + trail. */
export interface GroundSwing {
  peakLeadTimesBodyWeight: number | null;
  earlyDownswingPct: number | null;
  impactPct: number | null;
  afterLeadArmParallelMs: number | null;
  sampleRateHz: number;
  bothPlates: boolean;
  measure: 'force' | 'pressure';
  peakLeadForceN: number | null;
}

/** The swings of one club in one ground session; `rig` is the device named on it. */
export interface GroundSession {
  on: string;
  rig: string | null;
  club: string;
  swings: readonly GroundSwing[];
}

/** Hip internal rotation of one date, degrees. */
export interface HipRotation {
  on: string;
  lead: number;
  trail: number;
}

/**
 * One athlete's dated raw data, sides already turned into lead and trail, with the programme's figures of the other
 * athletes at this judgement (`othersDemand`: same rig, newest each). Data after `asOf` are left out.
 */
export interface AthleteHistory {
  asOf: string;
  birthDate: string;
  sex: Sex;
  strength: readonly StrengthSession[];
  growth: readonly GrowthMeasure[];
  driver: readonly DriverSession[];
  ground: readonly GroundSession[];
  hipRotation?: readonly HipRotation[];
  pain?: number | null;
  programme: {
    othersRaw: readonly number[];
    othersDemand: readonly number[];
    others: readonly StrengthAndSpeed[];
  };
  /** testing days already planned, YYYY-MM-DD: they date what data already taken make impossible */
  plannedTestingDays?: readonly string[];
  policy?: Partial<OutrunPolicy>;
}

/** One line of the evidence table: what was used, of which date, its figure as text. */
export interface DataLine {
  what: string;
  on: string;
  value: string;
}

/** A block of the outrun's input made from dated data; or why there is none. */
export type Built<Block> =
  { block: Block; reason: null; used: DataLine[] } | { block: undefined; reason: string; used: DataLine[] };
