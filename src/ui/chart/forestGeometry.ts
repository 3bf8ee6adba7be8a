import { hatchPath } from '#src/ui/chart/hatchPath.ts';
import { linearScale } from '#src/ui/chart/linearScale.ts';
import type { Difference } from '#src/ui/words/forestSentence.ts';

export interface ForestGeometry {
  zeroX: number;
  sleeve: { x: number; width: number; hatch: string } | null;
  interval: { x1: number; x2: number } | null;
  markX: number;
  /** The side that the estimate favours decides the shape: lead a filled circle, trail an open square. */
  side: 'lead' | 'trail';
  /** The interval or the mark goes on past the drawing. */
  beyondStart: boolean;
  beyondEnd: boolean;
}

/**
 * Places of one forest row: trail stronger on the left of 0, lead stronger on the right.
 *
 * @param size.width  of the drawing
 * @param size.height of the noise sleeve
 * @param size.range  percent from 0 to either edge; what lies further out is held at the edge and said so
 */
export function forestGeometry(
  { estimate, interval, noise }: Difference,
  { width, height, range }: { width: number; height: number; range: number },
): ForestGeometry {
  const edge = 8;
  const scale = linearScale([-range, range], [edge, width - edge]);
  const held = (value: number) => scale(Math.max(-range, Math.min(range, value)));
  const sleeveX = noise === null ? null : held(-noise);
  const sleeveWidth = noise === null ? 0 : held(noise) - held(-noise);
  return {
    zeroX: scale(0),
    sleeve:
      sleeveX === null
        ? null
        : { x: sleeveX, width: sleeveWidth, hatch: hatchPath({ x: sleeveX, y: 0, width: sleeveWidth, height }) },
    interval: interval && { x1: held(interval[0]), x2: held(interval[1]) },
    // Held a little inside the edge, so that the arrow which says "further out" stays free.
    markX: Math.max(edge + 8, Math.min(width - edge - 8, held(estimate))),
    side: estimate < 0 ? 'trail' : 'lead',
    beyondStart: Math.min(estimate, interval?.[0] ?? estimate) < -range,
    beyondEnd: Math.max(estimate, interval?.[1] ?? estimate) > range,
  };
}
