import fc from 'fast-check';
import * as oracle from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { coefficientOfVariationPct } from '#src/domain/statistics/coefficientOfVariationPct.ts';
import { leastAndGreatest } from '#src/domain/statistics/leastAndGreatest.ts';
import { mean } from '#src/domain/statistics/mean.ts';
import { median } from '#src/domain/statistics/median.ts';
import { medianAbsoluteDeviation } from '#src/domain/statistics/medianAbsoluteDeviation.ts';
import { sampleStandardDeviation } from '#src/domain/statistics/sampleStandardDeviation.ts';
import { expectRelative } from '#tests/unit/domain/expectRelative.ts';

const lists = (minLength: number) =>
  fc.array(fc.double({ min: -1e6, max: 1e6, noNaN: true }), { minLength, maxLength: 40 });
const scale = (values: readonly number[]) => Math.max(1, ...values.map(Math.abs));

describe('centre and spread', () => {
  it('B8: a group cut at mean + 0.2 SD and mean + 1 SD', () => {
    // Dos'Santos et al. 2021 (from memory); values recomputed: mean 6.1, SD 2.998148, cuts 6.699630 and 9.098148
    const sizes = [2, 4, 5, 7, 3, 9, 6, 12, 5, 8];
    const [centre, spread] = [mean(sizes), sampleStandardDeviation(sizes)];
    expect(centre).toBeCloseTo(6.1, 12);
    expect(spread).toBeCloseTo(2.998148, 6);
    expect(centre + 0.2 * spread).toBeCloseTo(6.69963, 6);
    expect(centre + spread).toBeCloseTo(9.098148, 6);
  });

  it.each([
    { values: [10000001, 10000003, 10000002], sd: 1, source: 'NIST StRD NumAcc1, certified sd = 1' },
    { values: Object.freeze([2, 4, 4, 4, 5, 5, 7, 9]), sd: Math.sqrt(32 / 7), source: 'by hand: squares sum to 32' },
    { values: [0.1, 0.1, 0.1], sd: 0, source: 'by hand: equal values have no spread, whatever the rounding' },
  ])('standard deviation $sd: $source', ({ values, sd }) => {
    expect(sampleStandardDeviation(values)).toBeCloseTo(sd, 12);
  });

  it('B2: mean and root-mean-square of the per-subject CV', () => {
    // Weir 2005 (numbers from memory), recomputed: 4.317732 % and 4.826097 %
    const cvs = [
      [146, 140],
      [148, 152],
      [170, 152],
      [90, 99],
      [157, 145],
      [156, 153],
      [176, 167],
      [205, 218],
    ].map((row) => coefficientOfVariationPct(row)!);
    expect(mean(cvs)).toBeCloseTo(4.317732, 6);
    expect(Math.sqrt(mean(cvs.map((cv) => cv ** 2)))).toBeCloseTo(4.826097, 6);
  });

  it('has no coefficient of variation about 0', () => {
    expect(coefficientOfVariationPct([-1, 1])).toBeNull();
  });

  it.each([
    { values: [1, 1, 2, 2, 4, 6, 9], plain: 1, source: 'by hand: median 2, deviations 1 1 0 0 2 4 7' },
    { values: [5], plain: 0, source: 'by hand: one value' },
  ])('median absolute deviation $plain: $source', ({ values, plain }) => {
    expect(medianAbsoluteDeviation(values)).toBe(plain);
    expect(medianAbsoluteDeviation(values, { scaled: true })).toBe(plain * 1.4826);
  });

  it('agrees with simple-statistics', () => {
    fc.assert(
      fc.property(lists(2), (values) => {
        const allowed = 1e-9 * scale(values);
        expect(Math.abs(mean(values) - oracle.mean(values))).toBeLessThanOrEqual(allowed);
        expect(Math.abs(sampleStandardDeviation(values) - oracle.sampleStandardDeviation(values))).toBeLessThanOrEqual(
          allowed,
        );
        expect(Math.abs(median(values) - oracle.median(values))).toBeLessThanOrEqual(allowed);
        const deviation = oracle.medianAbsoluteDeviation(values);
        expect(Math.abs(medianAbsoluteDeviation(values) - deviation)).toBeLessThanOrEqual(allowed);
      }),
    );
  });

  it('does not depend on the order and leaves its input alone', () => {
    fc.assert(
      fc.property(lists(2), (values) => {
        const reversed = Object.freeze(values.toReversed());
        expect(median(reversed)).toBe(median(values));
        expectRelative(mean(reversed) + 3e6, mean(values) + 3e6, 1e-12);
        expect(leastAndGreatest(reversed)).toEqual(leastAndGreatest(values));
      }),
    );
  });

  it('takes a million samples', () => {
    const samples = Float64Array.from({ length: 1_000_000 }, (_, i) => i % 1000);
    expect(leastAndGreatest(samples)).toEqual({ least: 0, greatest: 999 });
    expect(mean(samples)).toBeCloseTo(499.5, 9);
    expect(median(samples)).toBe(499.5);
  });

  it('refuses empty lists, single values for a spread, and what is not finite', () => {
    for (const summary of [mean, median, medianAbsoluteDeviation, leastAndGreatest]) {
      expect(() => summary([])).toThrow(RangeError);
      expect(() => summary([1, NaN])).toThrow(RangeError);
      expect(() => summary([Infinity])).toThrow(RangeError);
    }
    expect(() => sampleStandardDeviation([1])).toThrow('sampleStandardDeviation requires at least 2 values, got 1');
  });
});
