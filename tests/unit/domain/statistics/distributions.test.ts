import fc from 'fast-check';
import * as oracle from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { chiSquareQuantile } from '#src/domain/statistics/chiSquareQuantile.ts';
import { fQuantile } from '#src/domain/statistics/fQuantile.ts';
import { mean } from '#src/domain/statistics/mean.ts';
import { normalCdf } from '#src/domain/statistics/normalCdf.ts';
import { normalQuantile } from '#src/domain/statistics/normalQuantile.ts';
import { sampleStandardDeviation } from '#src/domain/statistics/sampleStandardDeviation.ts';
import { tCdf } from '#src/domain/statistics/tCdf.ts';
import { tQuantile } from '#src/domain/statistics/tQuantile.ts';
import { Z90 } from '#src/domain/statistics/z90.ts';
import { expectRelative } from '#tests/unit/domain/expectRelative.ts';

describe('distributions, against SciPy 1.17', () => {
  it.each([
    [0.95, 1, 6.313751514675037],
    [0.95, 2.5, 2.5582186141359355],
    [0.95, 3.484536, 2.2257658033116465],
    [0.95, 34, 1.6909242551868546],
    [0.05, 7, -1.8945786050900066],
    [0.975, 120, 1.9799304050824402],
  ])('t quantile at %f with df %f', (p, df, expected) => {
    expectRelative(tQuantile(p, df), expected, 1e-9);
    expectRelative(tCdf(expected, df), p, 1e-9);
  });

  it.each([
    [0.975, 5, 15, 3.5764153492790607],
    [0.975, 4.785144, 5, 7.190737139664804],
    [0.975, 5, 4.785144, 7.498627350902274],
    [0.975, 7, 7, 4.994909219063237],
    [0.975, 1, 1, 647.7890114778442],
  ])('F quantile at %f with df %f and %f', (p, above, below, expected) => {
    expectRelative(fQuantile(p, above, below), expected, 1e-8);
  });

  it.each([
    [0.95, 7, 14.067140449340169],
    [0.05, 7, 2.167349909298057],
    [0.05, 1, 0.003932140000019522],
  ])('chi-square quantile at %f with df %f', (p, df, expected) => {
    expectRelative(chiSquareQuantile(p, df), expected, 1e-9);
  });

  it.each([
    [-1.68495, 0.04599910931942983],
    [-8, 6.22096057427174e-16],
    [1.96, 0.9750021048517795],
  ])('normal distribution function at %f', (z, expected) => {
    expectRelative(normalCdf(z), expected, 1e-9);
  });

  it('has its z for 90 % intervals', () => {
    expectRelative(normalQuantile(0.95), Z90, 1e-14);
  });

  it('agrees with simple-statistics', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.001, max: 0.999, noNaN: true }), (p) => {
        // its probit is an approximation, worst in the tails
        expect(Math.abs(normalQuantile(p) - oracle.probit(p))).toBeLessThan(0.02);
        expectRelative(normalCdf(normalQuantile(p)), p, 1e-9);
      }),
    );
  });

  it('B5: Welch and pooled t of two legs by hand from our mean and SD', () => {
    // recomputed with SciPy: Welch t −7.686151, df 3.484536, p .002648; pooled p .001541
    const [lead, trail] = [
      [14.8, 15.2, 15],
      [16.3, 16.9, 16.6],
    ];
    const [a, b] = [sampleStandardDeviation(lead!) ** 2 / 3, sampleStandardDeviation(trail!) ** 2 / 3];
    const t = (mean(lead!) - mean(trail!)) / Math.sqrt(a + b);
    const df = (a + b) ** 2 / (a ** 2 / 2 + b ** 2 / 2);
    expect(t).toBeCloseTo(-7.686151, 6);
    expect(df).toBeCloseTo(3.484536, 6);
    expect(2 * tCdf(t, df)).toBeCloseTo(0.002648, 6);
    expect(2 * tCdf(t, 4)).toBeCloseTo(0.001541, 6);
  });

  it('B2: t(7) = −0.727809 has p .490353', () => {
    // Weir 2005 data (from memory), recomputed
    expect(2 * tCdf(-0.727809, 7)).toBeCloseTo(0.490353, 6);
  });

  it('refuses probabilities outside 0 to 1 and degrees of freedom at 0', () => {
    for (const p of [0, 1, -0.1, 1.1, NaN]) {
      expect(() => normalQuantile(p)).toThrow(RangeError);
      expect(() => tQuantile(p, 5)).toThrow(RangeError);
      expect(() => fQuantile(p, 5, 5)).toThrow(RangeError);
      expect(() => chiSquareQuantile(p, 5)).toThrow(RangeError);
    }
    expect(() => tQuantile(0.5, 0)).toThrow('tQuantile requires df > 0, got 0');
    expect(() => tCdf(1, -1)).toThrow(RangeError);
    expect(() => fQuantile(0.5, 1, 0)).toThrow(RangeError);
    expect(() => chiSquareQuantile(0.5, 0)).toThrow(RangeError);
    expect(() => normalCdf(Infinity)).toThrow(RangeError);
  });
});
