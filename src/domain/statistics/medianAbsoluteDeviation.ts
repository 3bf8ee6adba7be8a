import { median } from '#src/domain/statistics/median.ts';

/** 1/Φ⁻¹(3/4), rounded as the trade does: makes the deviation estimate a normal standard deviation. */
const NORMAL_SCALE = 1.4826;

/** Options of `medianAbsoluteDeviation`. */
export interface MedianAbsoluteDeviationOptions {
  /** multiply by 1.4826, so that it estimates the standard deviation of normal data */
  scaled?: boolean;
}

/**
 * Median absolute deviation about the median.
 *
 * @param values  any unit, at least one
 * @param options `scaled` multiplies by 1.4826
 * @returns the deviation, same unit, ≥ 0
 * @throws {RangeError} if the list is empty or holds a value that is not finite
 * @example medianAbsoluteDeviation([1, 1, 2, 2, 4, 6, 9]) // → 1
 */
export function medianAbsoluteDeviation(
  values: ArrayLike<number>,
  { scaled = false }: MedianAbsoluteDeviationOptions = {},
): number {
  const centre = median(values);
  const deviation = median(Float64Array.from(values, (value) => Math.abs(value - centre)));
  return scaled ? NORMAL_SCALE * deviation : deviation;
}
