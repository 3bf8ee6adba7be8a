import type { Lms } from '#src/domain/growth/lmsValue.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** Powers below it are 0: the two forms agree to their last digits there, and L·S cannot underflow. */
const NEAR_0 = 1e-12;

/**
 * The standard score of a measure in a growth reference: ((value ÷ M)^L − 1) ÷ (L·S), or ln(value ÷ M) ÷ S where L is
 * 0. `expm1` keeps the digits where L is near 0.
 *
 * Source: Cole & Green 1992, Statistics in Medicine 11:1305–1319 (from memory).
 *
 * @param lms   M in the unit of the measure
 * @param value the measure
 * @returns standard score, without unit
 * @throws {RangeError} if the value, M or S is not positive, or a number is not finite
 * @example lmsZ({ l: 0.505564115, m: 138.8234114, s: 0.047610108 }, 145) // → 0.9245
 */
export function lmsZ({ l, m, s }: Lms, value: number): number {
  requireFiniteNumber('lmsZ', 'l', l);
  requireFiniteNumber('lmsZ', 'm', m, { above: 0 });
  requireFiniteNumber('lmsZ', 's', s, { above: 0 });
  requireFiniteNumber('lmsZ', 'value', value, { above: 0 });
  const logRatio = Math.log(value / m);
  return Math.abs(l) < NEAR_0 ? logRatio / s : Math.expm1(l * logRatio) / (l * s);
}
