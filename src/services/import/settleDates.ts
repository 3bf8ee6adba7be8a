import { parseDate, type DateOrder } from '#src/domain/units/parseDate.ts';
import { datesWritten } from '#src/services/import/fileDates.ts';
import { cellOf, type RecognisedTable } from '#src/services/import/recogniseTable.ts';

/** Most dates of a column must fit its order; the few others are wrong dates, to be refused row by row. */
const LEAST_SHARE = 0.8;
const SERIAL_EPOCH = Date.UTC(1899, 11, 30);

/**
 * The order of day and month in each table's dates: what the heading says (`dd/mm/yyyy`), else what the column's own
 * dates allow, else those of the tables of the same kind, else every date of the folder, file names with them.
 *
 * @returns a function that gives a table's order, null where all of that leaves a doubt
 */
export function settleDateOrders(tables: readonly RecognisedTable[], paths: readonly string[]) {
  const texts = new Map(tables.map((table) => [table, dateCells(table)]));
  const pooled = (wanted: readonly RecognisedTable[]) => orderByVote(wanted.flatMap((table) => texts.get(table)!));
  const inNames = paths.flatMap(datesWritten);
  const everything = orderByVote([...[...texts.values()].flat(), ...inNames]);
  const forNames = orderByVote(inNames.filter((text) => !/^\d{4}/.test(text))) ?? everything;
  const orderOf = (table: RecognisedTable): DateOrder | null =>
    orderInHeading(table) ??
    orderByVote(texts.get(table) ?? []) ??
    pooled(tables.filter(({ kinds }) => kinds[0] === table.kinds[0])) ??
    everything;
  return { orderOf, forNames };
}

/** Reads a date of a table, a spreadsheet's day number too. */
export function readDate(text: string, order: DateOrder | null): string | null {
  if (/^[345]\d{4}$/.test(text.trim())) {
    return new Date(SERIAL_EPOCH + Number(text) * 86_400_000).toISOString().slice(0, 10);
  }
  return parseDate(text, order);
}

/**
 * Day first or month first, by what most dates allow.
 *
 * @returns null where both do
 */
export function orderByVote(dates: readonly string[]): DateOrder | null {
  const fits = (order: DateOrder) => dates.filter((text) => parseDate(text, order) !== null).length;
  const readable = dates.filter((text) => (['dmy', 'mdy', 'ymd'] as const).some((order) => parseDate(text, order)));
  if (readable.length === 0) return null;
  const [dmy, mdy] = [fits('dmy'), fits('mdy')];
  if (Math.max(dmy, mdy) < readable.length * LEAST_SHARE) return fits('ymd') === readable.length ? 'ymd' : null;
  if (dmy === mdy) return dates.every((text) => parseDate(text, null) !== null) ? 'ymd' : null;
  return dmy > mdy ? 'dmy' : 'mdy';
}

function orderInHeading(table: RecognisedTable): DateOrder | null {
  const name = dateColumns(table).find(({ heading }) => /\b[dmy]{1,4}\b/.test(heading.name))?.heading.name ?? '';
  if (/\bd{1,2} m{1,3} y/.test(name)) return 'dmy';
  return /\bm{1,2} d{1,2} y/.test(name) ? 'mdy' : null;
}

const dateColumns = ({ columns }: RecognisedTable) =>
  columns.filter(({ field }) => field === 'date' || field === 'birthDate');

/** The cells of a table's dates, and the dates at its head. */
const dateCells = (table: RecognisedTable): string[] => [
  ...dateColumns(table).flatMap((column) => table.body.map((row) => cellOf(row, column)).filter((cell) => cell !== '')),
  ...table.context.entries
    .map(({ value }) => value)
    .filter((value) => /^\d{1,2}[-/. ]\d{1,2}[-/. ]\d{2,4}$/.test(value)),
];
