import type { SeasonOutrun } from '#src/ui/chart/season/season.ts';
import { textWidth } from '#src/ui/chart/textWidth.ts';

export interface DrawnOutrun {
  x1: number;
  x2: number;
  steps: { x: number; level: 'look' | 'act' | null; word: string; labelX: number; labelAbove: boolean }[];
}

const WORDS = { look: 'Look', act: 'Act' } as const;
const BESIDE = 12;

/** Outruns on the time axis: a line while one is open, a mark at each level, its word beside it or, in want of room, above. */
export function outrunLane(
  outruns: readonly SeasonOutrun[],
  { x, end, font }: { x: (date: string) => number; end: number; font: number },
): DrawnOutrun[] {
  const marks = outruns.flatMap(({ steps }) => steps.map(({ on }) => x(on))).sort((a, b) => a - b);
  return outruns.map(({ steps }) => {
    const closed = steps.at(-1)?.level === null;
    const first = steps[0] ? x(steps[0].on) : end;
    return {
      x1: first,
      x2: closed ? x(steps.at(-1)!.on) : Math.max(end, first),
      steps: steps.map(({ on, level, word }) => {
        const at = x(on);
        const said = word ?? (level ? WORDS[level] : 'cleared');
        const after = marks.find((mark) => mark > at) ?? Infinity;
        const above = after - at < BESIDE * 2 + textWidth(said, font);
        return { x: at, level, word: said, labelX: above ? at + 7 : at + BESIDE, labelAbove: above };
      }),
    };
  });
}
