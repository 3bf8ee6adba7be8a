import { dayNumber } from '#src/domain/calendar/dayNumber.ts';

/** Days from the first date to the second, negative if the second is earlier. */
export const daysBetween = (from: string, to: string): number => dayNumber(to) - dayNumber(from);

/** The rows of a date or before, oldest first; rows of one date keep their order. */
export function upTo<Row extends { on: string }>(rows: readonly Row[], asOf: string): Row[] {
  return rows.filter(({ on }) => daysBetween(on, asOf) >= 0).sort((a, b) => daysBetween(b.on, a.on));
}

/**
 * The row nearest in time to a date, at most so many days away on either side; the earlier one on a tie.
 *
 * @param rows   any order
 * @param on     YYYY-MM-DD
 * @param within days, inclusive
 */
export function nearestInTime<Row extends { on: string }>(
  rows: readonly Row[],
  on: string,
  within: number,
): Row | undefined {
  const away = (row: Row) => Math.abs(daysBetween(row.on, on));
  return rows.filter((row) => away(row) <= within).sort((a, b) => away(a) - away(b) || daysBetween(b.on, a.on))[0];
}
