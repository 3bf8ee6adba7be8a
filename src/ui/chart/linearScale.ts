export type Scale = (value: number) => number;

/**
 * A straight scale from values to places. A domain of no width puts everything in the middle of the range.
 *
 * @example linearScale([0, 10], [0, 200])(5) // → 100
 */
export function linearScale([from, to]: readonly [number, number], [start, end]: readonly [number, number]): Scale {
  if (from === to) return () => (start + end) / 2;
  return (value) => start + ((value - from) / (to - from)) * (end - start);
}
