import { linearScale } from '#src/ui/chart/linearScale.ts';
import { linePath, type Place } from '#src/ui/chart/paths.ts';
import { runs } from '#src/ui/chart/runs.ts';

/**
 * A small line of one value a term. A missing term leaves a gap.
 *
 * @param values oldest first
 */
export function sparklineGeometry(
  values: readonly (number | null)[],
  { width, height }: { width: number; height: number },
): { path: string; points: Place[] } {
  const present = values.filter((value) => value !== null);
  if (present.length === 0) return { path: '', points: [] };
  const edge = 4;
  const x = linearScale([0, Math.max(1, values.length - 1)], [edge, width - edge]);
  const y = linearScale([Math.min(...present), Math.max(...present)], [height - edge, edge]);
  const places = values.map((value, i) => (value === null ? null : { x: x(i), y: y(value) }));
  return { path: linePath(runs(places)), points: places.filter((place) => place !== null) };
}
