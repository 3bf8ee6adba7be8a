import { dayNumber } from '#src/domain/calendar/dayNumber.ts';
import { pairsInOrder, wholeDay } from '#src/domain/outrun/divergenceRaw.ts';
import { judgeCriteria } from '#src/domain/outrun/judgeCriteria.ts';
import { isClear } from '#src/domain/outrun/level.ts';
import type { LegPair, OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import { dateOfDay } from '#src/domain/outrun/plainDate.ts';
import type { OutrunPolicy } from '#src/domain/outrun/policy.ts';
import { carryBeyondGrowth } from '#src/domain/outrun/divergenceRaw.ts';
import { mean } from '#src/domain/statistics/mean.ts';

/** A driver session and a strength session up to this many days apart are one occasion, so new ones lie further. */
export const PAIR_WITHIN_DAYS = 21;
const MOST_NEW_DAYS = 4;

/** What is known beside the summaries. */
export interface WhatIsKnown {
  /** lead-deficit's values after so many testing days at which the legs were level; default: all values level */
  valuesAfter?: (testingDays: number) => LegPair[];
  /** testing days already planned, YYYY-MM-DD */
  plannedTestingDays?: readonly string[];
}

/** How many new testing days it takes at least, and the date before which data already taken make it impossible. */
export interface ImpossibleBefore {
  testingDays: number;
  date: string | null;
}

/**
 * The least number of new testing days after which there can be no level and at most one point, if from now on the
 * legs are level, each carry is what growth and strength explain, and the swing neither asks too much nor goes back.
 * Data already taken stand until new ones replace them, so before the last of those days it is impossible. The date
 * is that of the planned testing day; without a plan, new occasions lie at least 21 days apart.
 *
 * @returns null where even four such days would not do; `date` null where one new day can be enough and none is planned
 * @throws {RangeError} if `asOf` or a planned day is no date
 */
export function impossibleBefore(
  input: OutrunInput,
  asOf: string,
  { valuesAfter, plannedTestingDays = [] }: WhatIsKnown = {},
): ImpossibleBefore | null {
  const today = dayNumber(asOf);
  const planned = plannedTestingDays
    .map(dayNumber)
    .filter((day) => day > today)
    .sort((a, b) => a - b);
  for (let testingDays = 1; testingDays <= MOST_NEW_DAYS; testingDays += 1) {
    if (!isClear(judgeCriteria(afterGoodDays(input, testingDays, valuesAfter)))) continue;
    const day = planned[testingDays - 1] ?? (testingDays > 1 ? today + PAIR_WITHIN_DAYS * (testingDays - 1) : null);
    return { testingDays, date: day === null ? null : dateOfDay(day) };
  }
  return null;
}

function afterGoodDays(input: OutrunInput, days: number, valuesAfter: WhatIsKnown['valuesAfter']): OutrunInput {
  const { leadDeficit, divergence, demand, lateReturn } = input;
  const { policy } = judgeCriteria(input);
  const level = () => leadDeficit?.values.map((value) => ({ ...value, lead: value.trail })) ?? [];
  return {
    ...input,
    asOf: undefined,
    leadDeficit: leadDeficit && { values: valuesAfter ? valuesAfter(days) : level() },
    divergence: divergence && explainedCarries(input, days, policy),
    demand: demand && { ...demand, peakLead: { ...demand.peakLead, mean: 0 } },
    lateReturn: lateReturn && { ...lateReturn, impact: lateReturn.earlyDownswing },
  };
}

/** The pairs with new ones behind them, whose carry is no further than the earlier pairs explain. */
function explainedCarries(input: OutrunInput, days: number, policy: OutrunPolicy): OutrunInput['divergence'] {
  const { asOf: ownAsOf, ...divergence } = input.divergence!;
  const pairs = pairsInOrder(divergence.pairs, ownAsOf ?? input.asOf);
  const newest = pairs.at(-1);
  if (!newest || pairs.length < 3) return divergence;
  const explained = mean(pairs.slice(0, -2).map((pair) => carryBeyondGrowth(pair, policy)));
  const scale = Math.exp((explained - carryBeyondGrowth(newest, policy)) / 100);
  const added = Array.from({ length: days }, (_, i) => ({
    ...newest,
    day: wholeDay(newest.day) + i + 1,
    carry: newest.carry * scale,
  }));
  return { ...divergence, pairs: [...pairs.map((pair) => ({ ...pair, day: wholeDay(pair.day) })), ...added] };
}
