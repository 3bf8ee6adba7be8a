import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dayNumber, isCalendarDate } from '#src/domain/calendar/dayNumber.ts';

describe('dayNumber', () => {
  it.each([
    { date: '1970-01-01', expected: 0, source: 'by hand: the origin' },
    { date: '1969-12-31', expected: -1, source: 'by hand: the day before' },
    { date: '2000-03-01', expected: 11017, source: 'by hand: 30 years of 365 + 7 leap days = 10957, + 31 + 29' },
    { date: '0001-01-01', expected: -719162, source: 'by hand: proleptic day 1 against the 719163rd, 1970-01-01' },
  ])('$date: $source', ({ date, expected }) => {
    expect(dayNumber(date)).toBe(expected);
  });

  it('leaves 366 days in a leap year and 365 in a common one (by hand: Gregorian rule)', () => {
    expect(dayNumber('2025-01-01') - dayNumber('2024-01-01')).toBe(366);
    expect(dayNumber('1901-01-01') - dayNumber('1900-01-01')).toBe(365);
    expect(dayNumber('2001-01-01') - dayNumber('2000-01-01')).toBe(366);
  });

  it('counts up by one from each day to the next (brute force over the days of 1996 to 2004)', () => {
    let expected = dayNumber('1996-01-01');
    for (let year = 1996; year <= 2004; year += 1) {
      for (let month = 1; month <= 12; month += 1) {
        for (let day = 1; day <= 31; day += 1) {
          if (!isCalendarDate(year, month, day)) continue;
          const text = `${year}-${String(month).padStart(2, '0')}-${String(day).padStart(2, '0')}`;
          expect(dayNumber(text)).toBe(expected);
          expected += 1;
        }
      }
    }
  });

  it.each(['2026-02-29', '2026-13-01', '2026-00-10', '2026-1-1', '26-01-01', '2026-01-01T00:00', ''])(
    'refuses "%s"',
    (text) => {
      expect(() => dayNumber(text)).toThrow(RangeError);
    },
  );

  it('never calls a date with a fraction a date', () => {
    fc.assert(fc.property(fc.double({ noInteger: true, noNaN: true }), (day) => !isCalendarDate(2026, 5, day)));
  });
});
