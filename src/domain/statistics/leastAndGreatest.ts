import { requireFiniteList } from '#src/domain/statistics/requireFiniteList.ts';

/**
 * The least and the greatest value, in one pass: a million samples do not fit on the argument stack of `Math.max`.
 *
 * @param values any unit, at least one
 * @throws {RangeError} if the list is empty or holds a value that is not finite
 */
export function leastAndGreatest(values: ArrayLike<number>): { least: number; greatest: number } {
  requireFiniteList('leastAndGreatest', values);
  let least = Infinity;
  let greatest = -Infinity;
  for (let i = 0; i < values.length; i += 1) {
    if (values[i]! < least) least = values[i]!;
    if (values[i]! > greatest) greatest = values[i]!;
  }
  return { least, greatest };
}
