import { linearScale, type Scale } from '#src/ui/chart/linearScale.ts';
import { niceTicks } from '#src/ui/chart/niceTicks.ts';
import { bandPath, linePath } from '#src/ui/chart/paths.ts';
import { runsByTerm } from '#src/ui/chart/runs.ts';
import type { SeasonPoint } from '#src/ui/chart/season/season.ts';

export interface Axis {
  y: Scale;
  ticks: { value: number; y: number; label: string }[];
}

export interface Drawn {
  line: string;
  band: string;
  /** From the line down to 0. */
  area: string;
  /** `alone`: no neighbour to draw a line or a band to. */
  points: { x: number; y: number; whisker: { y1: number; y2: number } | null; alone: boolean }[];
}

/**
 * The axis of a lane over all that is drawn in it, intervals included.
 *
 * @param points of every series of the lane, at least one
 * @param withZero whether 0 must be on it
 */
export function laneAxis(
  points: readonly SeasonPoint[],
  { top, height, count, withZero = false }: { top: number; height: number; count: number; withZero?: boolean },
): Axis {
  const values = points.flatMap(({ value, interval }) => [
    value,
    ...(withZero ? [0, interval?.[1] ?? 0] : (interval ?? [])),
  ]);
  const ticks = niceTicks(Math.min(...values), Math.max(...values), count);
  const y = linearScale([ticks[0]!, ticks.at(-1)!], [top + height, top]);
  const digits = Math.max(...ticks.map((tick) => (String(tick).split('.')[1] ?? '').length));
  return { y, ticks: ticks.map((value) => ({ value, y: y(value), label: value.toFixed(digits).replace('-', '−') })) };
}

/** One series of a lane: its line broken where a term was missed, its band, its whiskers. */
export function drawSeries(
  points: readonly SeasonPoint[],
  { x, y, termOf }: { x: (date: string) => number; y: Scale; termOf: (date: string) => number },
): Drawn {
  const placed = points.map(({ on, value, interval }) => ({
    term: termOf(on),
    x: x(on),
    y: y(value),
    upper: y(interval?.[1] ?? value),
    lower: y(interval?.[0] ?? value),
    whisker: interval && { y1: y(interval[1]), y2: y(interval[0]) },
  }));
  const parts = runsByTerm(placed);
  return {
    line: linePath(parts),
    band: bandPath(parts),
    area: bandPath(parts.map((run) => run.map((place) => ({ x: place.x, upper: place.y, lower: y(0) })))),
    points: parts.flatMap((run) =>
      run.map((place) => ({ x: place.x, y: place.y, whisker: place.whisker, alone: run.length === 1 })),
    ),
  };
}
