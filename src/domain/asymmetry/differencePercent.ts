import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** Which way a test's value improves: higher (force, height) or lower (a contact or sit-to-stand time). */
export type Better = 'higher' | 'lower';

/**
 * Signed difference between the legs, `100·(lead − trail)/max(lead, trail)`: negative = lead weaker.
 * Where the lower value is the better one the sign is turned, so that negative still means lead weaker.
 * The larger-of-two denominator gives the same size whichever leg is larger.
 *
 * Source: the standard percentage difference with a direction multiplier, Bishop et al. 2018,
 * Strength Cond J 40(4):1–6 (paper read, detail from memory); Parkinson et al. 2021, JSSM 20:594–617.
 *
 * @param lead   value of the target-side leg, any unit, ≥ 0
 * @param trail  value of the other leg, same unit, ≥ 0
 * @param better which way the test improves
 * @returns per cent, −100 to 100, or null where both are 0
 * @throws {RangeError} if a value is negative or not finite
 * @example differencePercent(500, 560) // → −10.714286
 */
export function differencePercent(lead: number, trail: number, better: Better = 'higher'): number | null {
  requireFiniteNumber('differencePercent', 'lead', lead, { min: 0 });
  requireFiniteNumber('differencePercent', 'trail', trail, { min: 0 });
  const larger = Math.max(lead, trail);
  if (larger === 0) return null;
  const surplus = better === 'higher' ? lead - trail : trail - lead;
  return (100 * surplus) / larger;
}
