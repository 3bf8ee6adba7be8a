import { columnOf, type Column, type RecognisedTable } from '#src/services/import/recogniseTable.ts';
import { isSummaryHeading } from '#src/services/import/summaryRow.ts';

/** The columns of a battery: values, each with what its heading says of test, side and attempt, and remarks. */
export interface BatteryColumns {
  values: readonly Column[];
  remarks: readonly Column[];
  /** Headings of columns that look like tests of no catalogue, or are worked out from others. */
  leftOut: readonly string[];
}

const REMARK = /\b(remarks?|notes?|comments?|valid|void)\b/;
const LOOSE_VALUE = /\b(force|distance|height|mark|reading|peak|length|measured|value|result)\b/;

/** Sorts the columns of a battery's table. */
export function batteryColumns(table: RecognisedTable): BatteryColumns {
  const free = table.columns.filter(({ field }) => field === null || field === 'value' || field === 'force');
  const remarks = table.columns.filter(
    ({ field, heading }) => field === 'remark' || (field === null && REMARK.test(heading.name)),
  );
  const candidates = free.filter((column) => !remarks.includes(column));
  const summaries = candidates.filter((column) => column.field === null && isSummaryHeading(column.heading.name));
  const measured = candidates.filter((column) => !summaries.includes(column));
  const named = measured.filter(
    ({ testKey, side, attempt, field, heading }) =>
      testKey !== null || field === 'value' || ((side !== null || attempt !== null) && !/time|date/.test(heading.name)),
  );
  const inRows = columnOf(table, 'test') !== undefined;
  // A sheet with one test: the columns name sides and attempts alone. Without a test anywhere they mean nothing.
  const values = inRows ? named : named.filter(({ testKey }) => testKey !== null);
  const loose = measured.filter(({ heading, field }) => field === 'force' || LOOSE_VALUE.test(heading.name));
  const chosen = values.length > 0 || !inRows ? values : loose.slice(0, 1);
  const unknown = measured.filter(
    (column) =>
      !chosen.includes(column) && (column.side !== null || column.attempt !== null) && column.heading.words.length > 1,
  );
  return { values: chosen, remarks, leftOut: [...summaries, ...unknown].map(({ heading }) => heading.name) };
}
