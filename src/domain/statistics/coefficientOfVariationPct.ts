import { mean } from '#src/domain/statistics/mean.ts';
import { sampleStandardDeviation } from '#src/domain/statistics/sampleStandardDeviation.ts';

/**
 * Coefficient of variation, `100·SD/mean`, with the sample standard deviation.
 *
 * @param values any unit, at least two
 * @returns per cent, or null where the mean is 0
 * @throws {RangeError} if there are fewer than two values or one is not finite
 * @example coefficientOfVariationPct([14.8, 15.2, 15]) // → 1.3333
 */
export function coefficientOfVariationPct(values: ArrayLike<number>): number | null {
  const spread = sampleStandardDeviation(values);
  const centre = mean(values);
  return centre === 0 ? null : (100 * spread) / centre;
}
