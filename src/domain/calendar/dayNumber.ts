const ISO_DATE = /^(\d{4})-(\d{2})-(\d{2})$/;
const MS_PER_DAY = 86_400_000;

/**
 * Whole days from 1970-01-01 to a calendar date, so that dates subtract without a clock or a time zone.
 *
 * @param date YYYY-MM-DD of the proleptic Gregorian calendar
 * @returns integer days, negative before 1970
 * @throws {RangeError} if the text is no such date (2026-02-29 is not one)
 * @example dayNumber('2026-03-01') - dayNumber('2026-02-01') // → 28
 */
export function dayNumber(date: string): number {
  const parts = ISO_DATE.exec(date);
  if (!parts || !isCalendarDate(Number(parts[1]), Number(parts[2]), Number(parts[3]))) {
    throw new RangeError(`dayNumber requires a date as YYYY-MM-DD, got ${date}`);
  }
  // @NOTE Date.UTC reads the years 0 to 99 as 1900 to 1999, so those go 400 years (146 097 days) further on first.
  const year = Number(parts[1]);
  const shifted = year < 100;
  const ms = Date.UTC(shifted ? year + 400 : year, Number(parts[2]) - 1, Number(parts[3]));
  return ms / MS_PER_DAY - (shifted ? 146_097 : 0);
}

/**
 * Whether year, month (1 to 12) and day are a date of the Gregorian calendar.
 *
 * @returns false for a month or a day that does not exist, and for anything but integers
 * @example isCalendarDate(2024, 2, 29) // → true
 */
export function isCalendarDate(year: number, month: number, day: number): boolean {
  if (!Number.isInteger(year) || !Number.isInteger(month) || !Number.isInteger(day)) return false;
  if (month < 1 || month > 12 || day < 1) return false;
  const leap = (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0;
  const lengths = [31, leap ? 29 : 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];
  return day <= lengths[month - 1]!;
}
