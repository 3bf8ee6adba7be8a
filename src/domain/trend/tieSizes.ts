/**
 * Sizes of the groups of equal values, groups of one left out.
 *
 * @param values any unit
 * @example tieSizes([10, 15, 10, 10, 15, 7]) // → [3, 2]
 */
export function tieSizes(values: readonly number[]): number[] {
  const counts = new Map<number, number>();
  for (const value of values) counts.set(value, (counts.get(value) ?? 0) + 1);
  return [...counts.values()].filter((count) => count > 1);
}
