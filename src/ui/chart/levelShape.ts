import { coordinate } from '#src/ui/chart/paths.ts';

/**
 * A diamond around a centre: the shape of an outrun's levels.
 *
 * @param radius half of its height
 * @example diamondPath(0, 0, 8) // → 'M0,-8L8,0L0,8L-8,0Z'
 */
export function diamondPath(x: number, y: number, radius: number): string {
  const corners = [
    [x, y - radius],
    [x + radius, y],
    [x, y + radius],
    [x - radius, y],
  ];
  return `M${corners.map((corner) => corner.map((value) => coordinate(value!)).join(',')).join('L')}Z`;
}

/**
 * An octagon standing on a side: the shape of Stop and refer.
 *
 * @param radius distance of the corners from the centre
 */
export function octagonPath(x: number, y: number, radius: number): string {
  const corners = Array.from({ length: 8 }, (_, i) => {
    const angle = Math.PI / 8 + (i * Math.PI) / 4;
    return `${coordinate(x + radius * Math.cos(angle))},${coordinate(y + radius * Math.sin(angle))}`;
  });
  return `M${corners.join('L')}Z`;
}
