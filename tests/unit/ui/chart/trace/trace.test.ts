import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { textWidth } from '#src/ui/chart/textWidth.ts';
import { markRows } from '#src/ui/chart/trace/markRows.ts';
import { thinned } from '#src/ui/chart/trace/thinned.ts';

describe('thinned', () => {
  const curve = fc.array(fc.integer({ min: -999, max: 999 }), { minLength: 1, maxLength: 400 });

  it('keeps the extremes and the order, and no more than two points a column', () => {
    fc.assert(
      fc.property(curve, fc.integer({ min: 1, max: 60 }), (values, columns) => {
        const points = values.map((y, x): [number, number] => [x, y]);
        const kept = thinned(points, columns);
        expect(kept.length).toBeLessThanOrEqual(2 * columns);
        expect(kept.every(([x], i) => i === 0 || x > kept[i - 1]![0])).toBe(true);
        const ys = kept.map(([, y]) => y);
        expect([Math.min(...ys), Math.max(...ys)]).toEqual([Math.min(...values), Math.max(...values)]);
      }),
    );
  });
});

describe('markRows', () => {
  const mark = fc.record({
    x: fc.integer({ min: 0, max: 320 }),
    label: fc.constantFrom('top', 'impact', 'lead arm parallel'),
  });

  it('lets no label touch another of its row, nor leave the drawing on the right', () => {
    fc.assert(
      fc.property(fc.array(mark, { maxLength: 8 }), (marks) => {
        const placed = markRows(marks, 328, 13);
        expect(placed).toHaveLength(marks.length);
        const spans = placed.map(({ x, label, row, anchor }) => {
          const width = textWidth(label, 13);
          return { row, from: anchor === 'start' ? x : x - width, to: anchor === 'start' ? x + width : x };
        });
        for (const span of spans) expect(span.to).toBeLessThanOrEqual(328);
        spans.forEach((a, i) =>
          spans.slice(i + 1).forEach((b) => {
            if (a.row === b.row) expect(a.to <= b.from || b.to <= a.from).toBe(true);
          }),
        );
      }),
    );
  });
});
