/**
 * Parts a list wherever a value is missing.
 *
 * @example runs([1, 2, null, 3]) // → [[1, 2], [3]]
 */
export function runs<T>(values: readonly (T | null)[]): T[][] {
  const out: T[][] = [[]];
  for (const value of values) {
    if (value === null) out.push([]);
    else out.at(-1)!.push(value);
  }
  return out.filter((run) => run.length > 0);
}

/**
 * Parts dated values wherever a whole term passed without one, so that a line never runs across a term that was missed.
 *
 * @param points in date order, with the number of the term each falls in
 * @example runsByTerm([{ term: 0 }, { term: 1 }, { term: 3 }]) // → [[{ term: 0 }, { term: 1 }], [{ term: 3 }]]
 */
export function runsByTerm<T extends { term: number }>(points: readonly T[]): T[][] {
  return runs(
    points.flatMap((point, i) => {
      const before = points[i - 1];
      return before && point.term - before.term > 1 ? [null, point] : [point];
    }),
  );
}
