/**
 * The points of a long curve that a drawing of so many columns can show: each column keeps its lowest and its highest,
 * so that no peak is lost.
 *
 * @param points in order of x
 * @param columns of the drawing
 */
export function thinned(
  points: readonly (readonly [number, number])[],
  columns: number,
): (readonly [number, number])[] {
  if (points.length <= 2 * columns) return [...points];
  const kept: (readonly [number, number])[] = [];
  for (let column = 0; column < columns; column += 1) {
    const from = Math.floor((column * points.length) / columns);
    const to = Math.floor(((column + 1) * points.length) / columns);
    let low = from;
    let high = from;
    for (let i = from + 1; i < to; i += 1) {
      if (points[i]![1] < points[low]![1]) low = i;
      if (points[i]![1] > points[high]![1]) high = i;
    }
    kept.push(points[Math.min(low, high)]!);
    if (low !== high) kept.push(points[Math.max(low, high)]!);
  }
  return kept;
}
