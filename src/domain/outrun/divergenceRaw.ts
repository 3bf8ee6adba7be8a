import { dayNumber } from '#src/domain/calendar/dayNumber.ts';
import type { CarryPair, Day } from '#src/domain/outrun/outrunInput.ts';
import type { OutrunPolicy } from '#src/domain/outrun/policy.ts';
import { mean } from '#src/domain/statistics/mean.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** Windows and minima of divergence, fixed for this version of the rule. */
export const DIVERGENCE_MIN_PAIRS = 3;
export const DIVERGENCE_MIN_SPAN_DAYS = 180;
export const DIVERGENCE_NEWEST_WITHIN_DAYS = 400;

/** The raw gain (% of carry) with the pairs it rests on, oldest first; or why there is none. */
export type DivergenceRaw =
  | { raw: number; earlier: number; pairs: CarryPair[]; reason: null }
  | { raw: null; earlier: 0; pairs: CarryPair[]; reason: string };

/**
 * Day number of a date or of a whole day.
 *
 * @throws {RangeError} if the text is no date or the number not whole
 */
export function wholeDay(day: Day): number {
  if (typeof day === 'string') return dayNumber(day);
  if (!Number.isInteger(day)) throw new RangeError(`wholeDay requires a date or a whole number of days, got ${day}`);
  return day;
}

/** Pairs up to a date, oldest first; within one day by their figures, so that the order of the rows never matters. */
export function pairsInOrder(pairs: readonly CarryPair[], asOf?: Day): CarryPair[] {
  const last = asOf === undefined ? Infinity : wholeDay(asOf);
  return pairs
    .filter(({ day }) => wholeDay(day) <= last)
    .sort(
      (a, b) =>
        wholeDay(a.day) - wholeDay(b.day) ||
        a.carry - b.carry ||
        a.strength - b.strength ||
        a.stature - b.stature ||
        a.age - b.age,
    );
}

/** Carry freed from strength, stature and age, in % (log scale): q = 100(ln C − b·ln F − c·ln S) − learning · age. */
export function carryBeyondGrowth({ carry, strength, stature, age }: CarryPair, policy: OutrunPolicy): number {
  const { strengthExponent, statureExponent, learningPctPerYear } = policy;
  const logs = Math.log(carry) - strengthExponent * Math.log(strength) - statureExponent * Math.log(stature);
  return 100 * logs - learningPctPerYear * age;
}

/**
 * Raw gain of carry over growth and strength: the mean of the newest two q less the mean of all earlier q.
 *
 * @param pairs any order; pairs after `asOf` are left out
 * @param asOf  default the newest day
 * @throws {RangeError} if a figure is negative or not finite, or a day no day
 */
export function divergenceRaw(pairs: readonly CarryPair[], policy: OutrunPolicy, asOf?: Day): DivergenceRaw {
  for (const { carry, strength, stature, age } of pairs) {
    for (const [field, value] of Object.entries({ carry, strength, stature, age })) {
      requireFiniteNumber('divergenceRaw', field, value, { min: 0 });
    }
  }
  const ordered = pairsInOrder(pairs, asOf);
  const none = (reason: string): DivergenceRaw => ({ raw: null, earlier: 0, pairs: ordered, reason });
  if (ordered.some(({ carry, strength, stature }) => carry === 0 || strength === 0 || stature === 0)) {
    return none('A carry, a lead push or a height of 0 cannot be compared.');
  }
  if (ordered.length < DIVERGENCE_MIN_PAIRS) {
    const count = ['none', 'one', 'two'][ordered.length]!;
    return none(
      `Three driver sessions with a strength test close by are needed: there ${count === 'two' ? 'are' : 'is'} ${count}.`,
    );
  }
  const days = ordered.map(({ day }) => wholeDay(day));
  const span = days.at(-1)! - days[0]!;
  if (span < DIVERGENCE_MIN_SPAN_DAYS) {
    return none(`The pairs of carry and strength cover ${span} days: at least ${DIVERGENCE_MIN_SPAN_DAYS} are needed.`);
  }
  const age = (asOf === undefined ? days.at(-1)! : wholeDay(asOf)) - days.at(-2)!;
  if (age > DIVERGENCE_NEWEST_WITHIN_DAYS) {
    return none(
      `The newest two pairs of carry and strength reach back ${age} days: at most ${DIVERGENCE_NEWEST_WITHIN_DAYS} count.`,
    );
  }
  const gains = ordered.map((pair) => carryBeyondGrowth(pair, policy));
  const earlier = gains.length - 2;
  return { raw: mean(gains.slice(-2)) - mean(gains.slice(0, -2)), earlier, pairs: ordered, reason: null };
}
