import stdlibCdf from '@stdlib/stats-base-dists-normal-cdf';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/**
 * Distribution function of the standard normal distribution.
 *
 * @param z standard score
 * @returns probability of a value at or below z
 * @throws {RangeError} if z is not finite
 * @example normalCdf(0) // → 0.5
 */
export function normalCdf(z: number): number {
  requireFiniteNumber('normalCdf', 'z', z);
  return stdlibCdf(z, 0, 1);
}
