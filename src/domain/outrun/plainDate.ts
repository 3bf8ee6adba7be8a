import { MONTH_NAMES } from '#src/domain/calendar/monthNames.ts';

/**
 * A date in words.
 *
 * @param date YYYY-MM-DD
 * @example plainDate('2026-05-09') // → '9 May 2026'
 */
export function plainDate(date: string): string {
  const [year, month, day] = date.split('-').map(Number);
  return `${day} ${MONTH_NAMES[month! - 1]} ${year}`;
}

/**
 * The calendar date of a day number (whole days from 1970-01-01).
 *
 * @example dateOfDay(0) // → '1970-01-01'
 */
export function dateOfDay(day: number): string {
  return new Date(day * 86_400_000).toISOString().slice(0, 10);
}
