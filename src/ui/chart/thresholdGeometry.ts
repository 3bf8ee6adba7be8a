import { linearScale } from '#src/ui/chart/linearScale.ts';
import type { Measured } from '#src/ui/words/thresholdSentence.ts';

/**
 * Places of a value with its interval against a threshold, on a scale of its own that holds all three and 0 where 0 is
 * near.
 *
 * @returns x places in a drawing of `width`; `side` is the part on which the criterion is met
 */
export function thresholdGeometry(
  { value, interval, threshold, metWhen }: Omit<Measured, 'unit' | 'digits'>,
  width: number,
) {
  const shown = [value, threshold, ...(interval ?? [])];
  const [low, high] = [Math.min(...shown), Math.max(...shown)];
  const room = (high - low || Math.abs(threshold) || 1) * 0.22;
  const edge = 8;
  const scale = linearScale([low - room, high + room], [edge, width - edge]);
  const at = scale(threshold);
  return {
    thresholdX: at,
    side: metWhen === 'above' ? { x: at, width: width - edge - at } : { x: edge, width: at - edge },
    interval: interval && { x1: scale(interval[0]), x2: scale(interval[1]) },
    markX: scale(value),
  };
}
