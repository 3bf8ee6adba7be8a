import { parseDate } from '#src/domain/units/parseDate.ts';
import type { DateOrder } from '#src/domain/units/parseDate.ts';

const ORDERS: readonly DateOrder[] = ['ymd', 'dmy', 'mdy'];

/**
 * The one order of day, month and year under which every date of a column is a date of the calendar.
 * Dates that say their own order (`2026-05-09`, `9 May 2026`) agree with any; a column of nothing else is `ymd`.
 *
 * @param texts cells of one column; blank ones are left out
 * @returns the order, or null where no order fits, several do, or there is no date
 * @example dateOrder(['08/07/2012', '16/12/2011']) // → 'dmy'
 */
export function dateOrder(texts: readonly string[]): DateOrder | null {
  const dates = texts.filter((text) => text.trim() !== '');
  if (dates.length === 0) return null;
  const fitting = ORDERS.filter((order) => dates.every((text) => parseDate(text, order) !== null));
  if (fitting.length === ORDERS.length && dates.every((text) => parseDate(text, null) !== null)) return 'ymd';
  return fitting.length === 1 ? fitting[0]! : null;
}
