import stdlibQuantile from '@stdlib/stats-base-dists-normal-quantile';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/**
 * Quantile of the standard normal distribution.
 *
 * @param p probability, strictly between 0 and 1
 * @throws {RangeError} if p is outside
 * @example normalQuantile(0.95) // → 1.6448536269514722
 */
export function normalQuantile(p: number): number {
  requireFiniteNumber('normalQuantile', 'p', p, { above: 0, max: 1 - Number.EPSILON / 2 });
  return stdlibQuantile(p, 0, 1);
}
