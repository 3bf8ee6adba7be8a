import stdlibQuantile from '@stdlib/stats-base-dists-chisquare-quantile';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/**
 * Quantile of the chi-square distribution.
 *
 * @param p  probability, strictly between 0 and 1
 * @param df degrees of freedom, above 0
 * @throws {RangeError} if p or df is outside
 * @example chiSquareQuantile(0.95, 7) // → 14.067140
 */
export function chiSquareQuantile(p: number, df: number): number {
  requireFiniteNumber('chiSquareQuantile', 'p', p, { above: 0, max: 1 - Number.EPSILON / 2 });
  requireFiniteNumber('chiSquareQuantile', 'df', df, { above: 0 });
  return stdlibQuantile(p, df);
}
