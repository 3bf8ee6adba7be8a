import { median } from '#src/domain/statistics/median.ts';
import { medianAbsoluteDeviation } from '#src/domain/statistics/medianAbsoluteDeviation.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';
import { Z90 } from '#src/domain/statistics/z90.ts';

/** A session's carry in the unit of the shots, with its standard error and 90 % interval where they can be given. */
export interface RobustCarry {
  n: number;
  median: number;
  standardError: number | null;
  interval90: [number, number] | null;
  reason: string | null;
}

/** √(π/2): how much wider the error of a median is than that of a mean, for normal data. */
const MEDIAN_OVER_MEAN = Math.sqrt(Math.PI / 2);
const FEWEST_FOR_ERROR = 3;

/**
 * The median carry of a session's shots: SE = √(π/2) · 1.4826 · MAD ÷ √n, interval ± 1.644854 · SE. A few mishits move
 * neither the median nor its error.
 *
 * Source: common practice, no source (the large-sample error of a median of normal data).
 *
 * @param carries the shots that stay, one unit, ≥ 0
 * @returns no error for fewer than three shots, or where half of them or more are the same
 * @throws {RangeError} if there is no shot, or a carry is not finite or negative
 * @example robustCarry([150, 152, 154, 156, 158]) // → median 154, SE = 1.253314 · 1.4826 · 2 ÷ √5
 */
export function robustCarry(carries: readonly number[]): RobustCarry {
  if (carries.length === 0) throw new RangeError('robustCarry requires at least one carry, got none');
  for (const carry of carries) requireFiniteNumber('robustCarry', 'carry', carry, { min: 0 });
  const n = carries.length;
  const centre = median(carries);
  const without = (reason: string): RobustCarry => ({
    n,
    median: centre,
    standardError: null,
    interval90: null,
    reason,
  });
  if (n < FEWEST_FOR_ERROR) return without('fewer than three shots: no error can be given');
  const spread = medianAbsoluteDeviation(carries, { scaled: true });
  if (spread === 0) return without('half of the carries or more are the same: no error can be given');
  const standardError = (MEDIAN_OVER_MEAN * spread) / Math.sqrt(n);
  const interval90: [number, number] = [centre - Z90 * standardError, centre + Z90 * standardError];
  return { n, median: centre, standardError, interval90, reason: null };
}
