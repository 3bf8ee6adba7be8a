import { describe, expect, it } from 'vitest';
import { kendallExact } from '#src/domain/trend/kendallExact.ts';
import { tieSizes } from '#src/domain/trend/tieSizes.ts';

function orders(values: readonly number[]): number[][] {
  if (values.length < 2) return [[...values]];
  return values.flatMap((first, i) => orders(values.toSpliced(i, 1)).map((rest) => [first, ...rest]));
}

describe('kendallExact', () => {
  // exact one-sided P(S ≥ s), recomputed to five digits
  it.each([
    [4, 6, 0.04167],
    [4, 4, 0.16667],
    [5, 10, 0.00833],
    [5, 8, 0.04167],
    [5, 6, 0.11667],
    [6, 15, 0.00139],
    [6, 13, 0.00833],
    [6, 11, 0.02778],
    [6, 9, 0.06806],
    [7, 21, 0.0002],
    [7, 17, 0.00536],
    [7, 15, 0.01508],
    [7, 13, 0.03452],
    [7, 11, 0.06806],
    [8, 20, 0.00707],
    [8, 18, 0.01558],
    [8, 16, 0.03051],
    [8, 14, 0.05434],
  ])('n %i, S ≥ %i', (n, s, expected) => {
    expect(kendallExact(n, s)).toBeCloseTo(expected, 5);
  });

  it.each([1, 2, 3, 4, 5, 6, 7])('equals the count over all orders of %i', (n) => {
    const all = orders(Array.from({ length: n }, (_, i) => i));
    const scores = all.map((order) => {
      let s = 0;
      for (let i = 0; i < n; i += 1) for (let j = i + 1; j < n; j += 1) s += Math.sign(order[j]! - order[i]!);
      return s;
    });
    const most = (n * (n - 1)) / 2;
    for (let s = -most; s <= most; s += 1) {
      expect(kendallExact(n, s)).toBeCloseTo(scores.filter((score) => score >= s).length / all.length, 12);
    }
  });

  it('refuses sizes it cannot count', () => {
    for (const n of [0, 1.5, 19]) expect(() => kendallExact(n, 0)).toThrow(RangeError);
  });
});

describe('tieSizes', () => {
  it('counts the ties of EPA QA/G-9S p. 109', () => {
    expect(tieSizes([10, 10, 10, 5, 10, 20, 18, 17, 15, 24, 15])).toEqual([4, 2]);
  });
});
