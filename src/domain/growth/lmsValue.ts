import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** Box–Cox power, median and coefficient of variation of a growth reference at one age. */
export interface Lms {
  l: number;
  m: number;
  s: number;
}

/** Powers below it are 0: the two forms agree to their last digits there, and L·S cannot underflow. */
const NEAR_0 = 1e-12;

/**
 * The measure at a z score of a growth reference, M·(1 + L·S·z)^(1/L), or M·e^(S·z) where L is 0: the curves of a
 * centile chart.
 *
 * Source: Cole & Green 1992, Statistics in Medicine 11:1305–1319 (from memory).
 *
 * @param lms M in the unit of the measure
 * @param z   standard score
 * @returns the measure in the unit of M; null where the reference does not reach so far (1 + L·S·z ≤ 0)
 * @throws {RangeError} if M or S is not positive, or a number is not finite
 * @example lmsValue({ l: 0.505564115, m: 138.8234114, s: 0.047610108 }, −1.880793608) // → 126.6677753
 */
export function lmsValue({ l, m, s }: Lms, z: number): number | null {
  requireFiniteNumber('lmsValue', 'l', l);
  requireFiniteNumber('lmsValue', 'm', m, { above: 0 });
  requireFiniteNumber('lmsValue', 's', s, { above: 0 });
  requireFiniteNumber('lmsValue', 'z', z);
  if (Math.abs(l) < NEAR_0) return finite(m * Math.exp(s * z));
  const power = l * s * z;
  return power > -1 ? finite(m * Math.exp(Math.log1p(power) / l)) : null;
}

function finite(value: number): number | null {
  return Number.isFinite(value) ? value : null;
}
