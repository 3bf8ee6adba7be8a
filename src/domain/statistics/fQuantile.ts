import stdlibQuantile from '@stdlib/stats-base-dists-f-quantile';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/**
 * Quantile of Snedecor's F distribution.
 *
 * @param p             probability, strictly between 0 and 1
 * @param numeratorDf   degrees of freedom above the line, above 0, need not be whole
 * @param denominatorDf degrees of freedom below the line, above 0, need not be whole
 * @throws {RangeError} if p or a df is outside
 * @example fQuantile(0.975, 5, 15) // → 3.576415
 */
export function fQuantile(p: number, numeratorDf: number, denominatorDf: number): number {
  requireFiniteNumber('fQuantile', 'p', p, { above: 0, max: 1 - Number.EPSILON / 2 });
  requireFiniteNumber('fQuantile', 'numeratorDf', numeratorDf, { above: 0 });
  requireFiniteNumber('fQuantile', 'denominatorDf', denominatorDf, { above: 0 });
  return stdlibQuantile(p, numeratorDf, denominatorDf);
}
