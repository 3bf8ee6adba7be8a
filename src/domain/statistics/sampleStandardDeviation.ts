import { mean } from '#src/domain/statistics/mean.ts';
import { requireFiniteList } from '#src/domain/statistics/requireFiniteList.ts';

/**
 * Sample standard deviation, divisor n − 1, in two passes about the mean.
 *
 * @param values any unit, at least two
 * @returns the standard deviation, same unit, ≥ 0
 * @throws {RangeError} if there are fewer than two values or one is not finite
 * @example sampleStandardDeviation([14.8, 15.2, 15]) // → 0.2
 */
export function sampleStandardDeviation(values: ArrayLike<number>): number {
  requireFiniteList('sampleStandardDeviation', values, 2);
  const centre = mean(values);
  let squares = 0;
  let alike = true;
  for (let i = 0; i < values.length; i += 1) {
    squares += (values[i]! - centre) ** 2;
    if (values[i] !== values[0]) alike = false;
  }
  // equal values can leave a mean one digit off, and so a spread that is not there
  if (alike) return 0;
  return Math.sqrt(squares / (values.length - 1));
}
