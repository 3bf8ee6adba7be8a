import { MONTH_NAMES } from '#src/domain/calendar/monthNames.ts';

/**
 * A calendar date in words. It is read as text: no clock and no time zone can move a day.
 *
 * @param date YYYY-MM-DD
 * @param form `short` 12 Sep, `day` 12 September, `long` 12 September 2026
 * @throws {RangeError} if the text is no such date
 * @example dateWords('2026-09-12') // → '12 September 2026'
 */
export function dateWords(date: string, form: 'short' | 'day' | 'long' = 'long'): string {
  const [, year, month, day] = /^(\d{4})-(\d{2})-(\d{2})$/.exec(date) ?? [];
  const name = MONTH_NAMES[Number(month) - 1];
  if (!name) throw new RangeError(`dateWords requires a date as YYYY-MM-DD, got ${date}`);
  if (form === 'short') return `${Number(day)} ${name.slice(0, 3)}`;
  return form === 'day' ? `${Number(day)} ${name}` : `${Number(day)} ${name} ${year}`;
}

/** A text with every YYYY-MM-DD in it said in words. */
export const datesInWords = (text: string): string => text.replace(/\b\d{4}-\d{2}-\d{2}\b/g, (date) => dateWords(date));
