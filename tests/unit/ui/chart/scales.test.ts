import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dateTicks } from '#src/ui/chart/dateTicks.ts';
import { linearScale } from '#src/ui/chart/linearScale.ts';
import { niceTicks } from '#src/ui/chart/niceTicks.ts';
import { spreadLabels } from '#src/ui/chart/spreadLabels.ts';

describe('linearScale', () => {
  it.each([
    { value: 0, expected: 0, source: 'by hand: the start' },
    { value: 5, expected: 100, source: 'by hand: half way' },
    { value: 12, expected: 240, source: 'by hand: goes on past the end' },
  ])('$value → $expected ($source)', ({ value, expected }) => {
    expect(linearScale([0, 10], [0, 200])(value)).toBe(expected);
  });

  it('turns an axis over, and puts a domain of no width in the middle (by hand)', () => {
    expect(linearScale([0, 10], [100, 0])(2.5)).toBe(75);
    expect(linearScale([3, 3], [0, 40])(3)).toBe(20);
  });
});

describe('niceTicks', () => {
  it.each([
    { low: 163, high: 185, count: 3, expected: [160, 180, 200], source: 'by hand: steps of 10 give four' },
    { low: 155, high: 186, count: 4, expected: [150, 160, 170, 180, 190], source: 'by hand: steps of 20 waste half' },
    { low: 0, high: 8.6, count: 3, expected: [0, 5, 10], source: 'by hand' },
    { low: 0, high: 100, count: 5, expected: [0, 25, 50, 75, 100], source: 'by hand' },
    {
      low: -11.4,
      high: -4.6,
      count: 3,
      expected: [-12, -10, -8, -6, -4],
      source: 'by hand: steps of 5 would waste more than half',
    },
    { low: 0.1, high: 0.3, count: 3, expected: [0.1, 0.2, 0.3], source: 'by hand: no drift of tenths' },
  ])('$low to $high: $source', ({ low, high, count, expected }) => {
    expect(niceTicks(low, high, count)).toEqual(expected);
  });

  it('gives a single value room on both sides (by hand)', () => {
    const ticks = niceTicks(50, 50, 3);
    expect(ticks[0]!).toBeLessThan(50);
    expect(ticks.at(-1)!).toBeGreaterThan(50);
  });

  it('always holds its range, in even steps, with few ticks', () => {
    const value = fc.double({ min: -1e5, max: 1e5, noNaN: true });
    fc.assert(
      fc.property(
        value,
        fc.double({ min: 0.001, max: 1e5, noNaN: true }),
        fc.integer({ min: 3, max: 6 }),
        (low, width, count) => {
          const ticks = niceTicks(low, low + width, count);
          const tiny = width * 1e-6;
          expect(ticks[0]!).toBeLessThanOrEqual(low + tiny);
          expect(ticks.at(-1)!).toBeGreaterThanOrEqual(low + width - tiny);
          expect(ticks.length).toBeLessThanOrEqual(count + 4);
          const step = ticks[1]! - ticks[0]!;
          ticks.slice(1).forEach((tick, i) => expect(Math.abs(tick - ticks[i]! - step)).toBeLessThan(step * 1e-3));
        },
      ),
    );
  });

  it.each([
    [3, 1, 4],
    [NaN, 1, 4],
    [0, Infinity, 4],
    [0, 1, 1],
  ])('refuses %s to %s in %s', (low, high, count) => {
    expect(() => niceTicks(low, high, count)).toThrow(RangeError);
  });
});

describe('spreadLabels', () => {
  it.each([
    { places: [10, 12], expected: [7, 15], source: 'by hand: 8 apart about their mean 11' },
    { places: [12, 10], expected: [15, 7], source: 'by hand: the order given stays' },
    { places: [10, 40], expected: [10, 40], source: 'by hand: nothing to move' },
    { places: [0, 1], expected: [0, 8], source: 'by hand: held at the edge' },
    { places: [], expected: [], source: 'by hand' },
  ])('$places: $source', ({ places, expected }) => {
    expect(spreadLabels(places, 8, [0, 100])).toEqual(expected);
  });

  it('keeps the gap and the order, and stays inside where there is room', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 200 }), { maxLength: 8 }), (places) => {
        const moved = spreadLabels(places, 17, [0, 200]);
        const order = [...places.keys()].sort((a, b) => places[a]! - places[b]! || a - b);
        order
          .slice(1)
          .forEach((index, i) => expect(moved[index]! - moved[order[i]!]!).toBeGreaterThanOrEqual(17 - 1e-9));
        for (const place of moved) {
          expect(place).toBeGreaterThanOrEqual(-1e-9);
          expect(place).toBeLessThanOrEqual(200 + 1e-9);
        }
      }),
    );
  });
});

describe('dateTicks', () => {
  it.each([
    {
      from: '2025-01-10',
      to: '2026-02-01',
      count: 4,
      expected: ['May 25', 'Sep', 'Jan 26'],
      source: 'by hand: every fourth month',
    },
    { from: '2026-01-01', to: '2026-03-01', count: 4, expected: ['Jan 26', 'Feb', 'Mar'], source: 'by hand' },
    { from: '2026-01-02', to: '2026-01-20', count: 4, expected: [], source: 'by hand: no first of a month' },
  ])('$from to $to: $source', ({ from, to, count, expected }) => {
    expect(dateTicks(from, to, count).map(({ label }) => label)).toEqual(expected);
  });
});
