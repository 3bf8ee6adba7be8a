import { dayNumber } from '#src/domain/calendar/dayNumber.ts';

/** Days in the year of the growth formulas: the mean Julian year. */
export const DAYS_PER_YEAR = 365.25;

/**
 * Decimal age in years of 365.25 days.
 *
 * @param bornOn date of birth, YYYY-MM-DD
 * @param on     date of the measure, YYYY-MM-DD
 * @throws {RangeError} if either is no calendar date, or `on` is before birth
 * @example ageYears('2012-07-08', '2024-07-08') // → 12 (4383 days)
 */
export function ageYears(bornOn: string, on: string): number {
  const days = dayNumber(on) - dayNumber(bornOn);
  if (days < 0) throw new RangeError(`ageYears requires a date from birth on, got ${on} for a birth on ${bornOn}`);
  return days / DAYS_PER_YEAR;
}
