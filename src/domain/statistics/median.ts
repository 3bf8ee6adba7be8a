import { requireFiniteList } from '#src/domain/statistics/requireFiniteList.ts';

/**
 * Median: the middle value, or the mean of the two middle values.
 *
 * @param values any unit, at least one; left as they are
 * @returns the median, same unit
 * @throws {RangeError} if the list is empty or holds a value that is not finite
 * @example median([5, 1, 3]) // → 3
 */
export function median(values: ArrayLike<number>): number {
  requireFiniteList('median', values);
  const sorted = Float64Array.from(values).sort();
  const upper = sorted.length >> 1;
  return sorted.length % 2 === 1 ? sorted[upper]! : (sorted[upper - 1]! + sorted[upper]!) / 2;
}
