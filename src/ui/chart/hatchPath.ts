import { coordinate } from '#src/ui/chart/paths.ts';

/**
 * Slanted lines that fill a box, as one path: a pattern would need an id, unique on the page and never hidden.
 *
 * @param step distance between lines along x
 * @example hatchPath({ x: 0, y: 0, width: 4, height: 4 }, 4) // → 'M0,4L4,0'
 */
export function hatchPath(
  { x, y, width, height }: { x: number; y: number; width: number; height: number },
  step = 6,
): string {
  const lines: string[] = [];
  // Each line satisfies (X − x) + (Y − y) = reach, cut to the box.
  for (let reach = step; reach < width + height; reach += step) {
    const from = { x: x + Math.max(0, reach - height), y: y + Math.min(height, reach) };
    const to = { x: x + Math.min(width, reach), y: y + Math.max(0, reach - width) };
    lines.push(`M${coordinate(from.x)},${coordinate(from.y)}L${coordinate(to.x)},${coordinate(to.y)}`);
  }
  return lines.join('');
}
