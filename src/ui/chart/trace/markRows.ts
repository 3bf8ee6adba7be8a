import { textWidth } from '#src/ui/chart/textWidth.ts';

/** A mark with its place, the row of its label, and the side on which the label stands. */
export interface PlacedMark {
  x: number;
  label: string;
  row: number;
  anchor: 'start' | 'end';
}

const GAP = 6;

/**
 * Puts the labels of marks into as few rows as let none touch another; a label that would leave the drawing stands on
 * the other side of its mark.
 *
 * @param marks places in px with their labels
 * @param right right edge of the drawing, px
 */
export function markRows(marks: readonly { x: number; label: string }[], right: number, font: number): PlacedMark[] {
  const ends: number[][] = [];
  return [...marks]
    .sort((a, b) => a.x - b.x)
    .map(({ x, label }) => {
      const width = textWidth(label, font) + GAP;
      const anchor = x + width > right ? 'end' : 'start';
      const from = anchor === 'start' ? x : x - width;
      let row = ends.findIndex((taken) => taken.every((end) => end <= from));
      if (row === -1) row = ends.push([]) - 1;
      ends[row]!.push(from + width);
      return { x, label, row, anchor };
    });
}
