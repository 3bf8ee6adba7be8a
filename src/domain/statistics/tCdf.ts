import stdlibCdf from '@stdlib/stats-base-dists-t-cdf';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/**
 * Distribution function of Student's t distribution.
 *
 * @param t  value
 * @param df degrees of freedom, above 0, need not be whole
 * @returns probability of a value at or below t
 * @throws {RangeError} if t is not finite or df is not above 0
 * @example tCdf(0, 7) // → 0.5
 */
export function tCdf(t: number, df: number): number {
  requireFiniteNumber('tCdf', 't', t);
  requireFiniteNumber('tCdf', 'df', df, { above: 0 });
  return stdlibCdf(t, df);
}
