import { isCalendarDate } from '#src/domain/calendar/dayNumber.ts';

/** The order of day, month and year in a numeric date. */
export type DateOrder = 'dmy' | 'mdy' | 'ymd';

const YEAR_FIRST = /^(\d{4})([-/. ])(\d{1,2})\2(\d{1,2})(?:[t ]\d{1,2}:\d{2}.*)?$/;
const NUMERIC = /^(\d{1,2})([-/. ])(\d{1,2})\2(\d{2}|\d{4})(?: \d{1,2}:\d{2}.*)?$/;
const DAY_MONTH_NAME = /^(\d{1,2})(?:st|nd|rd|th)?[-/. ]{1,2}([a-z]{3,9})\.?,?[-/. ]{1,2}(\d{4})$/;
const MONTH_NAME_DAY = /^([a-z]{3,9})\.? (\d{1,2})(?:st|nd|rd|th)?,? (\d{4})$/;
const MONTHS = [
  'january',
  'february',
  'march',
  'april',
  'may',
  'june',
  'july',
  'august',
  'september',
  'october',
  'november',
  'december',
];

/**
 * Reads a calendar date as files write it. A year written first with four digits, or a month written as a word, says
 * its own order and is read whatever `order` is. A two-digit year is read only when the order is known: 00 to 69 are
 * 2000 to 2069, 70 to 99 are 1970 to 1999 (POSIX).
 *
 * @param text  one cell; a time of day after the date is dropped
 * @param order the file's order; null reads only dates that cannot be read two ways (`13/02/2026`, `08/08/2026`)
 * @returns YYYY-MM-DD, or null where it is no date between 1900 and 2199 or the order leaves a doubt
 * @example parseDate('08/07/2012', 'dmy') // → '2012-07-08'
 */
export function parseDate(text: string, order: DateOrder | null): string | null {
  const bare = text.trim().replace(/\s+/g, ' ').toLowerCase();
  const yearFirst = YEAR_FIRST.exec(bare);
  if (yearFirst) return isoDate(yearFirst[1], yearFirst[3], yearFirst[4]);
  const named = DAY_MONTH_NAME.exec(bare);
  if (named) return isoDate(named[3], monthNumber(named[2]), named[1]);
  const monthFirst = MONTH_NAME_DAY.exec(bare);
  if (monthFirst) return isoDate(monthFirst[3], monthNumber(monthFirst[1]), monthFirst[2]);
  const numeric = NUMERIC.exec(bare);
  return numeric ? fromNumeric(numeric[1]!, numeric[3]!, numeric[4]!, order) : null;
}

function fromNumeric(first: string, second: string, third: string, order: DateOrder | null): string | null {
  if (order === 'ymd') return third.length === 2 && first.length === 2 ? isoDate(fullYear(first), second, third) : null;
  if (order === null && third.length === 2) return null;
  const year = fullYear(third);
  const dayFirst = isoDate(year, second, first);
  const monthFirst = isoDate(year, first, second);
  if (order !== null) return order === 'dmy' ? dayFirst : monthFirst;
  if (dayFirst !== null && monthFirst !== null) return dayFirst === monthFirst ? dayFirst : null;
  return dayFirst ?? monthFirst;
}

function fullYear(year: string): string {
  if (year.length === 4) return year;
  return Number(year) < 70 ? `20${year}` : `19${year}`;
}

function monthNumber(name: string | undefined): string {
  const index = name === 'sept' ? 8 : MONTHS.findIndex((month) => month === name || month.slice(0, 3) === name);
  return String(index + 1);
}

function isoDate(year = '', month = '', day = ''): string | null {
  if (Number(year) < 1900 || Number(year) > 2199) return null;
  if (!isCalendarDate(Number(year), Number(month), Number(day))) return null;
  return `${year}-${month.padStart(2, '0')}-${day.padStart(2, '0')}`;
}
