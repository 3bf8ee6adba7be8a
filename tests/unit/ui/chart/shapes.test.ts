import { describe, expect, it } from 'vitest';
import { forestGeometry } from '#src/ui/chart/forestGeometry.ts';
import { hatchPath } from '#src/ui/chart/hatchPath.ts';
import { diamondPath, octagonPath } from '#src/ui/chart/levelShape.ts';
import { bandPath, coordinate, linePath } from '#src/ui/chart/paths.ts';
import { runs, runsByTerm } from '#src/ui/chart/runs.ts';
import { sparklineGeometry } from '#src/ui/chart/sparklineGeometry.ts';
import { wrapWords } from '#src/ui/chart/textWidth.ts';
import { thresholdGeometry } from '#src/ui/chart/thresholdGeometry.ts';

describe('paths (all by hand)', () => {
  it('rounds to a tenth and never writes −0', () => {
    expect([1.26, -0.01, 3].map(coordinate)).toEqual(['1.3', '0', '3']);
  });

  it('breaks a line at a gap, and leaves a lone place to its point', () => {
    const place = (x: number) => ({ x, y: x });
    expect(linePath([[place(0), place(2)], [place(5)], [place(7), place(8)]])).toBe('M0,0L2,2M7,7L8,8');
  });

  it('closes a band over the upper edge and back along the lower', () => {
    expect(
      bandPath([
        [
          { x: 0, upper: 1, lower: 3 },
          { x: 2, upper: 2, lower: 4 },
        ],
      ]),
    ).toBe('M0,1L2,2L2,4L0,3Z');
  });

  it('parts a list at what is missing', () => {
    expect(runs([null, 1, 2, null, null, 3])).toEqual([[1, 2], [3]]);
    expect(runs([])).toEqual([]);
  });

  it('joins neighbouring terms and one term with itself, never across a missed one', () => {
    const terms = [0, 0, 1, 3, 4].map((term) => ({ term }));
    expect(runsByTerm(terms).map((run) => run.map(({ term }) => term))).toEqual([
      [0, 0, 1],
      [3, 4],
    ]);
  });

  it('hatches only inside the box', () => {
    const ends = [...hatchPath({ x: 10, y: 5, width: 20, height: 8 }).matchAll(/(-?[\d.]+),(-?[\d.]+)/g)];
    expect(ends.length).toBe(8);
    for (const [, x, y] of ends) {
      expect(Number(x)).toBeGreaterThanOrEqual(10);
      expect(Number(x)).toBeLessThanOrEqual(30);
      expect(Number(y)).toBeGreaterThanOrEqual(5);
      expect(Number(y)).toBeLessThanOrEqual(13);
    }
    expect(hatchPath({ x: 0, y: 0, width: 4, height: 4 }, 4)).toBe('M0,4L4,0');
  });

  it('draws a diamond and an octagon that differ', () => {
    expect(diamondPath(0, 0, 8)).toBe('M0,-8L8,0L0,8L-8,0Z');
    expect(octagonPath(0, 0, 8).match(/,/g)).toHaveLength(8);
  });

  it('wraps a long name by its words', () => {
    expect(wrapWords('Countermovement jump', 130, 15)).toEqual(['Countermovement', 'jump']);
    expect(wrapWords('Push', 20, 15)).toEqual(['Push']);
  });
});

describe('forestGeometry (by hand: 250 wide, 25 % a side, edges of 8)', () => {
  const size = { width: 266, height: 20, range: 25 };

  it('puts trail stronger left of 0 and lead stronger right of it', () => {
    const trail = forestGeometry({ estimate: -10, interval: [-15, -5], noise: 5 }, size);
    expect(trail).toMatchObject({ zeroX: 133, markX: 83, side: 'trail', interval: { x1: 58, x2: 108 } });
    expect(trail.sleeve).toMatchObject({ x: 108, width: 50 });
    expect(forestGeometry({ estimate: 10, interval: null, noise: null }, size)).toMatchObject({
      markX: 183,
      side: 'lead',
      sleeve: null,
      interval: null,
    });
  });

  it('shows one fact twice: the mark leaves the sleeve exactly where the interval leaves 0', () => {
    for (const estimate of [-5.01, -4.99, 4.99, 5.01]) {
      const drawn = forestGeometry({ estimate, interval: [estimate - 5, estimate + 5], noise: 5 }, size);
      const outside = drawn.markX < drawn.sleeve!.x || drawn.markX > drawn.sleeve!.x + drawn.sleeve!.width;
      const excludes = drawn.interval!.x2 < drawn.zeroX || drawn.interval!.x1 > drawn.zeroX;
      expect(outside).toBe(excludes);
      expect(outside).toBe(Math.abs(estimate) > 5);
    }
  });

  it('holds what lies further out at the edge and says so', () => {
    const far = forestGeometry({ estimate: -44, interval: [-52, -36], noise: 8 }, size);
    expect(far).toMatchObject({ beyondStart: true, beyondEnd: false, markX: 16 });
    expect(forestGeometry({ estimate: 20, interval: [10, 30], noise: 8 }, size).beyondEnd).toBe(true);
  });
});

describe('thresholdGeometry', () => {
  it('keeps order on the scale, and tints the side on which the criterion is met', () => {
    const above = thresholdGeometry({ value: 1.11, interval: [1.02, 1.2], threshold: 0.85, metWhen: 'above' }, 240);
    expect(above.thresholdX).toBeLessThan(above.interval!.x1);
    expect(above.interval!.x1).toBeLessThan(above.markX);
    expect(above.side).toEqual({ x: above.thresholdX, width: 232 - above.thresholdX });
    const below = thresholdGeometry({ value: -8, interval: [-11.4, -4.6], threshold: -4, metWhen: 'below' }, 240);
    expect(below.side).toEqual({ x: 8, width: below.thresholdX - 8 });
    expect(below.markX).toBeLessThan(below.thresholdX);
  });
});

describe('sparklineGeometry', () => {
  it('leaves a gap for a missing term and a point for each value (by hand)', () => {
    const { path, points } = sparklineGeometry([1, 2, null, 3, 3], { width: 48, height: 28 });
    expect(path).toBe('M4,24L14,14M34,4L44,4');
    expect(points).toHaveLength(4);
    expect(sparklineGeometry([null, null], { width: 48, height: 28 })).toEqual({ path: '', points: [] });
  });
});
