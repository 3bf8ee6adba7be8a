import fc from 'fast-check';
import * as oracle from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { normalCdf } from '#src/domain/statistics/normalCdf.ts';
import { median } from '#src/domain/statistics/median.ts';
import { trend } from '#src/domain/trend/trend.ts';
import { expectRelative } from '#tests/unit/domain/expectRelative.ts';

// NIST StRD, Norris (public domain)
const norrisX = [
  0.2, 337.4, 118.2, 884.6, 10.1, 226.5, 666.3, 996.3, 448.6, 777, 558.2, 0.4, 0.6, 775.5, 666.9, 338, 447.5, 11.6, 556,
  228.1, 995.8, 887.6, 120.2, 0.3, 0.3, 556.8, 339.1, 887.2, 999, 779, 11.1, 118.3, 229.2, 669.1, 448.9, 0.5,
];
const norrisY = [
  0.1, 338.8, 118.1, 888, 9.2, 228.1, 668.5, 998.5, 449.1, 778.9, 559.2, 0.3, 0.1, 778.1, 668.8, 339.3, 448.9, 10.8,
  557.7, 228.3, 998, 888.8, 119.6, 0.3, 0.6, 557.6, 339.3, 888, 998.5, 778.9, 10.2, 117.6, 228.9, 668.4, 449.2, 0.2,
];
// Sen 1968, J Am Stat Assoc 63:1379–89 (data from memory)
const sen = { x: [1, 2, 3, 4, 10, 12, 18], y: [9, 15, 19, 20, 45, 55, 78] };

describe('trend', () => {
  it('B9: NIST StRD Norris, certified values to 1e-9', () => {
    const { n, ols, reason } = trend({ x: norrisX, y: norrisY });
    expect(n).toBe(36);
    expect(reason).toBeNull();
    expectRelative(ols.intercept, -0.262323073774029, 1e-9);
    expectRelative(ols.slope, 1.00211681802045, 1e-9);
    expectRelative(ols.slopeSe, 4.29796848199937e-4, 1e-9);
    expectRelative(ols.residualSd, 0.884796396144373, 1e-9);
    expectRelative(ols.r2, 0.999993745883712, 1e-9);
    // t(.95, 34) = 1.6909242551868546 from SciPy
    expectRelative(ols.slopeCi90![1], 1.00211681802045 + 1.6909242551868546 * 4.29796848199937e-4, 1e-9);
  });

  it('B11: Theil–Sen of Sen 1968, limits at 90 % as SciPy 1.17 ranks them', () => {
    const { theilSen, ols } = trend(sen);
    expect(theilSen.slope).toBeCloseTo(4, 12);
    expect(theilSen.intercept).toBeCloseTo(4, 12); // median y − slope · median x; the other convention gives 6
    expect(theilSen.slopeCi90![0]).toBeCloseTo(3.75, 12);
    expect(theilSen.slopeCi90![1]).toBeCloseTo(4.181818, 6);
    expect(ols.slope).toBeCloseTo(4.021352, 6);
    expect(ols.intercept).toBeCloseTo(5.704626, 6);
  });

  it.each([
    {
      x: [1, 2, 2, 3, 5, 5, 6, 8, 9, 9],
      y: [3, 4, 4, 6, 5, 7, 9, 9, 12, 11],
      expected: [1, 1.5, 0.8333333333333334, 1.25],
    },
    { x: [0, 1, 2, 3], y: [1, 3, 2, 5], expected: [1.1666666666666665, 0.75, -1, 3] },
    { x: [0, 1, 2, 3, 4], y: [5, 6, 11, 8, 10], expected: [1.125, 5.75, -0.5, 3] },
    { x: [0, 1, 2, 3], y: [2, 2, 2, 2], expected: [0, 2, 0, 0] },
  ])('Theil–Sen as SciPy 1.17 has it: $y', ({ x, y, expected }) => {
    const { slope, intercept, slopeCi90 } = trend({ x, y }).theilSen;
    [slope, intercept, ...slopeCi90!].forEach((value, i) => expect(value).toBeCloseTo(expected[i]!, 12));
  });

  it('B12: Mann–Kendall with ties, EPA QA/G-9S p. 109', () => {
    const y = [10, 10, 10, 5, 10, 20, 18, 17, 15, 24, 15];
    const { mannKendall } = trend({ x: y.map((_, i) => i), y });
    expect(mannKendall).toMatchObject({ s: 22, exact: false });
    expect(mannKendall.variance).toBeCloseTo(155.3333, 4);
    expect(mannKendall.z).toBeCloseTo(1.68495, 6);
    expect(mannKendall.p).toBeCloseTo(0.091998, 6);
  });

  it('B13: five values, exact', () => {
    const y = [5, 6, 11, 8, 10];
    const { mannKendall } = trend({ x: [1, 2, 3, 4, 5], y, alternative: 'greater' });
    expect(mannKendall).toMatchObject({ s: 6, exact: true });
    expect(mannKendall.variance).toBeCloseTo(16.6667, 4);
    expectRelative(mannKendall.p, 14 / 120, 1e-12); // .11667, recomputed
    expect(mannKendall.z).toBeCloseTo(5 / Math.sqrt(50 / 3), 12); // by hand: continuity 1
    expectRelative(trend({ x: [1, 2, 3, 4, 5], y }).mannKendall.p, 28 / 120, 1e-12);
  });

  it('n = 4 can never reach two-sided .05 (recomputed)', () => {
    expectRelative(trend({ x: [1, 2, 3, 4], y: [1, 2, 3, 4] }).mannKendall.p, 2 / 24, 1e-12);
  });

  it('uses Z from eleven values on, and with any tie', () => {
    const counting = (n: number) => Array.from({ length: n }, (_, i) => i);
    expect(trend({ x: counting(10), y: counting(10) }).mannKendall.exact).toBe(true);
    expect(trend({ x: counting(11), y: counting(11) }).mannKendall.exact).toBe(false);
    expect(trend({ x: counting(5), y: [1, 2, 2, 3, 4] }).mannKendall.exact).toBe(false);
    expect(trend({ x: [0, 1, 1, 2, 3], y: counting(5) }).mannKendall.exact).toBe(false);
  });

  it('ties in both lists: variance of Kendall 1975 as SciPy uses it', () => {
    const result = trend({ x: [1, 2, 2, 3, 5, 5, 6, 8, 9, 9], y: [3, 4, 4, 6, 5, 7, 9, 9, 12, 11] });
    // by hand: term(10) 2250 less 3 · 18 in x and 2 · 18 in y, over 18; plus 6 · 4/(2 · 90)
    expect(result.mannKendall.variance).toBeCloseTo((2250 - 54 - 36) / 18 + 24 / 180, 12);
    // SciPy 1.17 kendalltau, asymptotic, which has no continuity correction
    const { s, variance } = result.mannKendall;
    expectRelative(2 * normalCdf(-s / Math.sqrt(variance)), 0.00037337598304800244, 1e-9);
  });

  const points = fc.array(fc.tuple(fc.integer({ min: -50, max: 50 }), fc.integer({ min: -50, max: 50 })), {
    minLength: 1,
    maxLength: 25,
  });
  const split = (list: readonly (readonly [number, number])[]) => ({
    x: list.map(([x]) => x),
    y: list.map(([, y]) => y),
  });

  it('Theil–Sen equals its brute-force twin', () => {
    fc.assert(
      fc.property(points, (list) => {
        const { x, y } = split(list);
        const slopes: number[] = [];
        for (const a of list) for (const b of list) if (b[0] > a[0]) slopes.push((b[1] - a[1]) / (b[0] - a[0]));
        const { slope, intercept, slopeCi90 } = trend({ x, y }).theilSen;
        if (slopes.length === 0) {
          expect([slope, intercept, slopeCi90]).toEqual([null, null, null]);
          return;
        }
        expect(slope! - oracle.median(slopes)).toBeCloseTo(0, 9);
        expect(intercept! - (median(y) - slope! * median(x))).toBeCloseTo(0, 9);
        if (slopeCi90 !== null) {
          expect(slopeCi90[0]).toBeLessThanOrEqual(slope! + 1e-12);
          expect(slopeCi90[1]).toBeGreaterThanOrEqual(slope! - 1e-12);
        }
      }),
    );
  });

  it('agrees with simple-statistics on the line', () => {
    fc.assert(
      fc.property(points, (list) => {
        const { x, y } = split(list);
        const { ols } = trend({ x, y });
        if (ols.slope === null) {
          expect(new Set(x).size).toBe(1);
          return;
        }
        const { m, b } = oracle.linearRegression(list.map(([px, py]) => [px, py]));
        expect(ols.slope - m).toBeCloseTo(0, 8);
        expect(ols.intercept! - b).toBeCloseTo(0, 8);
        if (ols.r2 !== null) {
          const r2 = oracle.rSquared(
            list.map(([px, py]) => [px, py]),
            (at) => m * at + b,
          );
          expect(ols.r2 - r2).toBeCloseTo(0, 8);
        }
      }),
    );
  });

  it('does not depend on the order; turns with the sign of y; scales with its unit', () => {
    fc.assert(
      fc.property(points, fc.integer({ min: 1, max: 9 }), (list, unit) => {
        const { x, y } = split(list);
        const one = trend({ x, y });
        const turned = trend(split(list.toReversed()));
        const minus = trend({ x, y: y.map((value) => -value + 0) });
        const scaled = trend({ x, y: y.map((value) => unit * value) });
        expect(turned.mannKendall).toEqual(one.mannKendall);
        expect(turned.theilSen).toEqual(one.theilSen);
        expect(minus.mannKendall.s + one.mannKendall.s).toBe(0);
        expect(minus.mannKendall.p).toEqual(one.mannKendall.p);
        expect(scaled.mannKendall).toEqual(one.mannKendall);
        if (one.ols.slope !== null) {
          expect(scaled.ols.slope! - unit * one.ols.slope).toBeCloseTo(0, 8);
          expect(minus.theilSen.slope! + one.theilSen.slope!).toBeCloseTo(0, 9);
        }
      }),
    );
  });

  it('gives null, never NaN or Infinity, and then a reason', () => {
    const few = fc.array(fc.tuple(fc.constantFrom(0, 0.1, 1, 1e6), fc.constantFrom(0, 0.1, 1, 1e6)), {
      minLength: 1,
      maxLength: 6,
    });
    fc.assert(
      fc.property(few, (list) => {
        const seen: unknown[] = [];
        const result = trend(split(list));
        JSON.stringify({ ...result, reason: 0 }, (_, value: unknown) => (seen.push(value), value));
        expect(seen.filter((value) => typeof value === 'number' && !Number.isFinite(value))).toEqual([]);
        expect(seen.includes(null)).toBe(result.reason !== null);
      }),
    );
  });

  it.each([
    { x: [1], y: [2], reason: 'all x are equal' },
    { x: [3, 3, 3], y: [1, 2, 3], reason: 'all x are equal' },
    { x: [1, 2], y: [1, 2], reason: 'two points: no residual spread' },
    { x: [1, 2, 3], y: [1, 2, 4], reason: 'too few slopes for a 90 % interval' },
    { x: [1, 2, 3, 4], y: [0.1, 0.1, 0.1, 0.1], reason: 'all y are equal' },
  ])('says why: $reason', ({ x, y, reason }) => {
    expect(trend({ x, y }).reason).toContain(reason);
  });

  it('refuses empty, unequal, too long lists and what is not finite', () => {
    expect(() => trend({ x: [], y: [] })).toThrow(RangeError);
    expect(() => trend({ x: [1, 2], y: [1] })).toThrow('trend requires equal lengths, got 2 and 1');
    expect(() => trend({ x: [1, NaN], y: [1, 2] })).toThrow(RangeError);
    const long = Array.from({ length: 2001 }, (_, i) => i);
    expect(() => trend({ x: long, y: long })).toThrow('trend requires at most 2000 points');
  });
});
