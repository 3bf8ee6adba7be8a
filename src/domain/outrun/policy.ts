import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** The thresholds of the outrun rule that an academy may set, versioned with each judgement. */
export interface OutrunPolicy {
  /** % lead deficit from which lead-deficit is met; negative = lead weaker */
  deficitMet: number;
  /** % lead deficit from which it is strong */
  deficitStrong: number;
  /** % of carry beyond growth and strength from which divergence is met */
  gainMet: number;
  /** the same for strong */
  gainStrong: number;
  /** share of a % of lead force that is expected as a % of carry */
  strengthExponent: number;
  /** share of a % of stature that is expected as a % of carry */
  statureExponent: number;
  /** % of carry a year expected from practice alone */
  learningPctPerYear: number;
  /** % noise of one pair of carry and strength (standard deviation) */
  pairNoisePct: number;
  /** demand ratio whose lower limit must be exceeded to be met */
  demandMet: number;
  /** the same for strong */
  demandStrong: number;
  /** times the programme's median demand ratio that must be exceeded to be met */
  overMedianMet: number;
  /** the same for strong */
  overMedianStrong: number;
  /** % between days of one leg's force */
  dayForcePct: number;
  /** % between sessions of the swing's peak force */
  daySwingPct: number;
  /** points of lead share by which the pressure must move back */
  lateReturn: number;
  /** points from which the gate gives Look */
  look: number;
  /** points from which the gate gives Act */
  act: number;
  /** fewest other athletes whose raw gain makes a programme median */
  minOthersGain: number;
  /** fewest other athletes whose demand ratio makes a programme median */
  minOthersDemand: number;
}

/** The defaults. Our own rule: no published cut-off exists; tuned on a simulated academy. */
export const DEFAULT_POLICY: Readonly<OutrunPolicy> = Object.freeze({
  deficitMet: -4,
  deficitStrong: -8,
  gainMet: 3.5,
  gainStrong: 8,
  strengthExponent: 0.5,
  statureExponent: 1,
  learningPctPerYear: 2,
  pairNoisePct: 4,
  demandMet: 0.85,
  demandStrong: 0.95,
  overMedianMet: 1.1,
  overMedianStrong: 1.25,
  dayForcePct: 2.5,
  daySwingPct: 3,
  lateReturn: 5,
  look: 3,
  act: 5,
  minOthersGain: 8,
  minOthersDemand: 10,
});

/**
 * The full policy: the defaults, with the given thresholds in their place. A key given as undefined keeps its default.
 *
 * @param partial any of the policy's keys
 * @throws {RangeError} on a key that the policy does not have, or a threshold that is not finite
 */
export function fullPolicy(partial: Partial<OutrunPolicy> = {}): OutrunPolicy {
  const policy = { ...DEFAULT_POLICY };
  for (const [key, value] of Object.entries(partial)) {
    if (!Object.hasOwn(DEFAULT_POLICY, key)) throw new RangeError(`fullPolicy requires a known threshold, got ${key}`);
    if (value === undefined) continue;
    requireFiniteNumber('fullPolicy', key, value);
    policy[key as keyof OutrunPolicy] = value;
  }
  return policy;
}
