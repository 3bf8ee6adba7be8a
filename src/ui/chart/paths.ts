export interface Place {
  x: number;
  y: number;
}

/** A number as an SVG path says it: at most one decimal, never `-0`. */
export const coordinate = (value: number): string => String(Math.round(value * 10) / 10 + 0);

/**
 * The line through runs of places. A run of one draws nothing: its point does.
 *
 * @param runs places in order; a gap in the data parts two runs
 * @example linePath([[{ x: 0, y: 1 }, { x: 2, y: 3 }]]) // → 'M0,1L2,3'
 */
export function linePath(runs: readonly (readonly Place[])[]): string {
  return runs
    .filter((run) => run.length > 1)
    .map((run) => `M${run.map(({ x, y }) => `${coordinate(x)},${coordinate(y)}`).join('L')}`)
    .join('');
}

/**
 * The band between an upper and a lower edge, one closed shape a run.
 *
 * @param runs places with `upper` and `lower` on the y axis of the drawing
 * @example bandPath([[{ x: 0, upper: 1, lower: 3 }, { x: 2, upper: 2, lower: 4 }]]) // → 'M0,1L2,2L2,4L0,3Z'
 */
export function bandPath(runs: readonly (readonly { x: number; upper: number; lower: number }[])[]): string {
  return runs
    .filter((run) => run.length > 1)
    .map((run) => {
      const there = run.map(({ x, upper }) => `${coordinate(x)},${coordinate(upper)}`);
      const back = run.toReversed().map(({ x, lower }) => `${coordinate(x)},${coordinate(lower)}`);
      return `M${[...there, ...back].join('L')}Z`;
    })
    .join('');
}
