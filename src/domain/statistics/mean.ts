import { requireFiniteList } from '#src/domain/statistics/requireFiniteList.ts';

/**
 * Arithmetic mean. A second pass adds the mean of the residuals, so that a large common offset costs no digits.
 *
 * @param values any unit, at least one
 * @returns the mean, same unit
 * @throws {RangeError} if the list is empty or holds a value that is not finite
 * @example mean([14.8, 15.2, 15]) // → 15
 */
export function mean(values: ArrayLike<number>): number {
  requireFiniteList('mean', values);
  const { length } = values;
  let sum = 0;
  for (let i = 0; i < length; i += 1) sum += values[i]!;
  const first = sum / length;
  let residual = 0;
  for (let i = 0; i < length; i += 1) residual += values[i]! - first;
  return first + residual / length;
}
