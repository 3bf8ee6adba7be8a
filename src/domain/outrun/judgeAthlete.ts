import type { AthleteHistory, Built, CapacityTest, DataLine } from '#src/domain/outrun/athleteHistory.ts';
import { clearsWhen, type ClearsWhenDetails } from '#src/domain/outrun/clearsWhen.ts';
import { countedSessions, type CountedSession } from '#src/domain/outrun/countedSessions.ts';
import type { CriterionName } from '#src/domain/outrun/criterion.ts';
import { demandFrom } from '#src/domain/outrun/demandFrom.ts';
import { divergenceFrom } from '#src/domain/outrun/divergenceFrom.ts';
import { divergenceRaw } from '#src/domain/outrun/divergenceRaw.ts';
import { impossibleBefore } from '#src/domain/outrun/impossibleBefore.ts';
import { aheadOfStrengthFrom, contextFrom, deliveryFrom } from '#src/domain/outrun/informationFrom.ts';
import { leadDeficitFrom, newestTwo, valuesAfterLevelDays } from '#src/domain/outrun/leadDeficitFrom.ts';
import { outrun, type OutrunResult } from '#src/domain/outrun/outrun.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import { fullPolicy } from '#src/domain/outrun/policy.ts';
import { latePeakFrom, lateReturnFrom } from '#src/domain/outrun/strategyFrom.ts';
import { TEST_FIGURES } from '#src/domain/outrun/testFigures.ts';
import { mean } from '#src/domain/statistics/mean.ts';

/** A judgement of dated data, with what the programme's other judgements need and the lines of the evidence table. */
export interface AthleteJudgement {
  input: OutrunInput;
  result: OutrunResult;
  /** raw gain of carry, %, for the others' median */
  raw: number | null;
  /** demand ratio and the rig it was measured on, for the others' median */
  demandRatio: { value: number; rig: string | null } | null;
  dataUsed: Record<CriterionName, DataLine[]>;
  /** date before which data already taken make a clear judgement impossible, YYYY-MM-DD */
  impossibleBefore: string | null;
}

/**
 * Judges one athlete's dated raw data as of a date: applies every gate (age of the data, valid trials, the first
 * session of a test, pairing, body mass and stature), builds the summaries and calls `outrun`.
 *
 * The context's reason may tell of pain: for a swing coach put `withoutPain(input.context)` in its place.
 *
 * @throws {RangeError} if a date is none or a figure out of range
 */
export function judgeAthlete(history: AthleteHistory): AthleteJudgement {
  const { asOf } = history;
  const policy = fullPolicy(history.policy);
  const countedOf = (test: CapacityTest) => countedSessions(history.strength, test, asOf, policy);
  const counted = { push: countedOf('push'), jump: countedOf('jump'), hop: countedOf('hop') };

  const demandBlock = demandFrom(history, counted.push, policy);
  const built = {
    'lead-deficit': leadDeficitFrom(counted, asOf),
    divergence: divergenceFrom(history, counted),
    demand: demandBlock,
    'late-return': lateReturnFrom(history),
    'ahead-of-strength': aheadOfStrengthFrom(history, counted.push),
    'late-peak': latePeakFrom(history),
    delivery: deliveryFrom(history, counted.push),
    context: contextFrom(history),
  } satisfies Record<CriterionName, Built<unknown>>;
  const input: OutrunInput = {
    asOf,
    leadDeficit: built['lead-deficit'].block,
    divergence: built.divergence.block,
    demand: built.demand.block,
    lateReturn: built['late-return'].block,
    aheadOfStrength: built['ahead-of-strength'].block,
    latePeak: built['late-peak'].block,
    delivery: built.delivery.block,
    context: built.context.block,
    policy: history.policy,
  };

  const judged = outrun(input);
  const details = detailsOf(history, counted);
  const result: OutrunResult = {
    ...judged,
    criteria: judged.criteria.map((criterion) => ({
      ...criterion,
      reason: built[criterion.name].reason ?? criterion.reason,
    })),
    clearsWhen: clearsWhen(input, details),
  };
  const ratio = result.criteria.find(({ name }) => name === 'demand')?.value ?? null;
  const dataUsed = Object.fromEntries(Object.entries(built).map(([name, { used }]) => [name, used]));
  return {
    input,
    result,
    raw: input.divergence ? divergenceRaw(input.divergence.pairs, policy, asOf).raw : null,
    demandRatio: ratio === null ? null : { value: ratio, rig: demandBlock.rig },
    dataUsed: dataUsed as Record<CriterionName, DataLine[]>,
    impossibleBefore: result.level === null ? null : (impossibleBefore(input, asOf, details)?.date ?? null),
  };
}

/** What the sentences of `clearsWhen` name beside the summaries: dates, and the lead leg's newest means by test. */
function detailsOf(
  { asOf, plannedTestingDays }: AthleteHistory,
  counted: Readonly<Record<CapacityTest, readonly CountedSession[]>>,
): ClearsWhenDetails {
  const newestLead = Object.values(counted).flatMap((ofTest) => {
    const newest = newestTwo(ofTest, asOf);
    if (newest.length === 0) return [];
    const { label, factor, unit, decimals } = TEST_FIGURES[newest[0]!.test];
    return [{ test: label, mean: factor * mean(newest.map(({ lead }) => lead)), unit, decimals }];
  });
  const valuesAfter = (testingDays: number) => valuesAfterLevelDays(counted, asOf, testingDays);
  return { asOf, plannedTestingDays, newestLead, valuesAfter };
}
