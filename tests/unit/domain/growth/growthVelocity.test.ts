import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ageMonths } from '#src/domain/growth/ageMonths.ts';
import { ageYears } from '#src/domain/growth/ageYears.ts';
import { growthBand } from '#src/domain/growth/growthBand.ts';
import { growthVelocity } from '#src/domain/growth/growthVelocity.ts';

const e8 = [
  { on: '2026-01-01', stature: 150 },
  { on: '2026-04-02', stature: 152.4 },
];

describe('growthVelocity', () => {
  it('E8: 150.0 to 152.4 cm in 91 days (SCIENCE §5, recomputed)', () => {
    const { perYear, standardError, interval90, days, reason } = growthVelocity({ measures: e8 });
    expect(perYear).toBeCloseTo(9.632967, 6);
    expect(standardError).toBeCloseTo(1.7029, 4);
    expect(days).toBe(91);
    expect(reason).toBeNull();
    expect((interval90![1] - interval90![0]) / 2).toBeCloseTo(2.8, 2);
  });

  it('E8: about six months give a standard error of 0.8485 (by hand: √2 · 0.3 ÷ 0.5 years)', () => {
    const half = growthVelocity({ measures: [e8[0]!, { on: '2026-07-03', stature: 153 }] });
    expect(half.days).toBe(183);
    expect(half.standardError).toBeCloseTo((Math.SQRT2 * 0.3) / (183 / 365.25), 12);
    expect(Math.abs(half.standardError! - 0.8485)).toBeLessThan(0.003);
  });

  it('takes the first and the last date, whatever the order and whatever lies between', () => {
    const between = { on: '2026-02-15', stature: 149 };
    const expected = growthVelocity({ measures: e8 });
    fc.assert(
      fc.property(fc.shuffledSubarray([...e8, between], { minLength: 3 }), (measures) => {
        expect(growthVelocity({ measures })).toEqual(expected);
      }),
    );
  });

  it('counts two statures of one date as their mean (by hand: 150.2 and 149.8 are 150)', () => {
    const measures = [{ on: '2026-01-01', stature: 150.2 }, { on: '2026-01-01', stature: 149.8 }, e8[1]!];
    expect(growthVelocity({ measures }).perYear).toBeCloseTo(9.632967, 6);
  });

  it('scales the error with the measurement error, and keeps the rate', () => {
    const [usual, none] = [growthVelocity({ measures: e8 }), growthVelocity({ measures: e8, measurementError: 0 })];
    expect(none).toMatchObject({ perYear: usual.perYear, standardError: 0 });
    expect(growthVelocity({ measures: e8, measurementError: 0.6 }).standardError).toBeCloseTo(
      2 * usual.standardError!,
      12,
    );
  });

  it('is null with a reason for one date', () => {
    const nothing = { perYear: null, standardError: null, interval90: null };
    const reason = 'two statures on different dates are needed';
    expect(growthVelocity({ measures: [e8[0]!] })).toEqual({ ...nothing, days: null, reason });
    expect(growthVelocity({ measures: [e8[0]!, e8[0]!] })).toEqual({ ...nothing, days: 0, reason });
  });

  it('refuses an empty list, a stature of 0, a date that is none, a negative error', () => {
    expect(() => growthVelocity({ measures: [] })).toThrow(RangeError);
    expect(() => growthVelocity({ measures: [{ on: '2026-01-01', stature: 0 }] })).toThrow(RangeError);
    expect(() => growthVelocity({ measures: [{ on: '2026-02-30', stature: 150 }] })).toThrow(RangeError);
    expect(() => growthVelocity({ measures: e8, measurementError: -0.1 })).toThrow(RangeError);
  });
});

describe('growthBand', () => {
  it.each([
    ['female', 3.99, 150, 'slow'],
    ['female', 4, 150, 'usual'],
    ['female', 6.99, 150, 'usual'],
    ['female', 7, 150, 'spurt-like'],
    ['male', 7.99, 150, 'usual'],
    ['male', 8, 150, 'spurt-like'],
    ['male', 9.63, 91, 'too soon to say'],
    ['male', 8, 149, 'too soon to say'],
    ['male', -0.4, 365, 'slow'],
  ] as const)('%s, %s cm a year over %s days: %s (our own bands, SCIENCE §5)', (sex, perYear, days, band) => {
    expect(growthBand(sex, perYear, days)).toBe(band);
  });

  it('refuses what is no number', () => {
    expect(() => growthBand('male', NaN, 200)).toThrow(RangeError);
    expect(() => growthBand('male', 5, -1)).toThrow(RangeError);
  });
});

describe('ageYears and ageMonths', () => {
  it.each([
    { born: '2012-07-08', on: '2024-07-08', years: 12, source: 'by hand: 12 · 365 + 3 leap days = 4383 = 12 · 365.25' },
    { born: '2012-07-08', on: '2012-07-08', years: 0, source: 'by hand' },
    { born: '2023-01-01', on: '2024-01-01', years: 365 / 365.25, source: 'by hand: a common year' },
  ])('$born to $on: $source', ({ born, on, years }) => {
    expect(ageYears(born, on)).toBeCloseTo(years, 12);
    expect(ageMonths(born, on)).toBeCloseTo(years * 12, 10);
  });

  it('refuses a date before birth', () => {
    expect(() => ageYears('2012-07-08', '2012-07-07')).toThrow(RangeError);
  });
});
