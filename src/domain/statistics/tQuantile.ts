import stdlibQuantile from '@stdlib/stats-base-dists-t-quantile';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/**
 * Quantile of Student's t distribution.
 *
 * @param p  probability, strictly between 0 and 1
 * @param df degrees of freedom, above 0, need not be whole
 * @throws {RangeError} if p or df is outside
 * @example tQuantile(0.95, 7) // → 1.894579
 */
export function tQuantile(p: number, df: number): number {
  requireFiniteNumber('tQuantile', 'p', p, { above: 0, max: 1 - Number.EPSILON / 2 });
  requireFiniteNumber('tQuantile', 'df', df, { above: 0 });
  return stdlibQuantile(p, df);
}
