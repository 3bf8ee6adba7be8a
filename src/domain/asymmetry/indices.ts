import type { Better } from '#src/domain/asymmetry/differencePercent.ts';
import { symmetryAngle } from '#src/domain/asymmetry/symmetryAngle.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** The published indices in per cent; null where the denominator is 0. D is the larger value, N the smaller. */
export interface AsymmetryIndices {
  /** limb symmetry index, N/D */
  lsi1: number | null;
  /** 1 − N/D */
  lsi2: number | null;
  /** (R − L)/mean, signed */
  lsi3: number | null;
  /** bilateral strength asymmetry, (strong − weak)/strong */
  bsa: number | null;
  /** (D − N)/(D + N) */
  bai1: number | null;
  /** 2(D − N)/(D + N) */
  bai2: number | null;
  /** asymmetry index, (D − N)/((D + N)/2) */
  ai: number | null;
  /** symmetry index, (high − low)/(high + low) */
  si: number | null;
  /** gait symmetry index, (XR − XL)/mean, signed */
  gaitSi: number | null;
  /** symmetry angle, signed */
  symmetryAngle: number | null;
  /** 100 − 100·min/max */
  standardPctDifference: number | null;
}

/**
 * The eleven published asymmetry indices of two limbs. In the signed ones R = lead and L = trail, so that
 * negative = lead weaker; with `better: 'lower'` their signs turn.
 *
 * The asymmetry index is often typeset as (D − N)/(D + N/2); the denominator meant is the mean (D + N)/2.
 *
 * Source: collected in Bishop et al. 2016, Strength Cond J 38(6):27–32; gait index Robinson 1987;
 * symmetry angle Zifchock et al. 2008.
 *
 * @param lead   value of the target-side leg, any unit
 * @param trail  value of the other leg, same unit
 * @param better which way the test improves
 * @throws {RangeError} if a value is not finite
 * @example indices(25, 20).ai // → 22.2222
 */
export function indices(lead: number, trail: number, better: Better = 'higher'): AsymmetryIndices {
  requireFiniteNumber('indices', 'lead', lead);
  requireFiniteNumber('indices', 'trail', trail);
  const larger = Math.max(lead, trail);
  const smaller = Math.min(lead, trail);
  const total = lead + trail;
  const ofLarger = (part: number) => (larger === 0 ? null : (100 * part) / larger);
  const ofTotal = (part: number) => (total === 0 ? null : (100 * part) / total);
  const [right, left] = better === 'higher' ? [lead, trail] : [trail, lead];
  return {
    lsi1: ofLarger(smaller),
    lsi2: ofLarger(larger - smaller),
    lsi3: ofTotal(2 * (right - left)),
    bsa: ofLarger(larger - smaller),
    bai1: ofTotal(larger - smaller),
    bai2: ofTotal(2 * (larger - smaller)),
    ai: ofTotal(2 * (larger - smaller)),
    si: ofTotal(larger - smaller),
    gaitSi: ofTotal(2 * (right - left)),
    symmetryAngle: symmetryAngle(right, left),
    standardPctDifference: larger === 0 ? null : 100 - (100 * smaller) / larger,
  };
}
