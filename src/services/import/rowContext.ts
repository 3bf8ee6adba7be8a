import { dateInName } from '#src/services/import/fileDates.ts';
import { matchFileName, matchName, type NameMatch } from '#src/services/import/athleteNames.ts';
import type { DateOrder } from '#src/domain/units/parseDate.ts';
import type { KnownAthlete, ReaderSettings } from '#src/services/import/reading.ts';
import type { SourceRow } from '#src/services/import/parseTable.ts';
import { cellOf, columnOf, type RecognisedTable } from '#src/services/import/recogniseTable.ts';
import { readDate } from '#src/services/import/settleDates.ts';
import { isSummaryLabel } from '#src/services/import/summaryRow.ts';

/** The name that a row gives, from one column or two, or from the head of the file. */
export function nameOf(table: RecognisedTable, row: SourceRow): string {
  const given = cellOf(row, columnOf(table, 'givenName'));
  const family = cellOf(row, columnOf(table, 'familyName'));
  const one = cellOf(row, columnOf(table, 'athlete'));
  if (given !== '' || family !== '') return `${given} ${family}`.trim();
  if (one !== '' || columnOf(table, 'athlete') || columnOf(table, 'familyName')) return one;
  return table.context.find('athlete', 'player', 'name', 'golfer') ?? '';
}

/** Finds athletes of a table's rows, each name looked up once. */
export function athleteFinder(table: RecognisedTable, athletes: readonly KnownAthlete[]) {
  const known = new Map<string, NameMatch<KnownAthlete>>();
  return (row: SourceRow): NameMatch<KnownAthlete> => {
    const name = nameOf(table, row);
    const match = known.get(name) ?? matchRow(table, name, athletes);
    known.set(name, match);
    return match;
  };
}

function matchRow(table: RecognisedTable, name: string, athletes: readonly KnownAthlete[]): NameMatch<KnownAthlete> {
  const named = columnOf(table, 'athlete') ?? columnOf(table, 'givenName') ?? columnOf(table, 'familyName');
  return name === '' && !named ? matchFileName(athletes, table.file) : matchName(athletes, name);
}

/** Gives the date of a row: its own column, else the head of the file, else the file's name; or why there is none. */
export function dateFinder(table: RecognisedTable, { dateOrder, nameOrder }: ReaderSettings) {
  const column = columnOf(table, 'date');
  const ofFile = dateAtHead(table, dateOrder) ?? dateInName(table.file, nameOrder);
  return (row: SourceRow): { date: string; reason: null } | { date: null; reason: string } => {
    const text = cellOf(row, column);
    if (text === '') {
      if (ofFile !== null) return { date: ofFile, reason: null };
      return { date: null, reason: 'no date in the row, at the head of the file or in its name' };
    }
    const date = readDate(text, dateOrder);
    return date === null ? { date: null, reason: dateProblem(text) } : { date, reason: null };
  };
}

/** The date that the head of a file gives: under a key that speaks of one, else any value that is one. */
export function dateAtHead({ context }: RecognisedTable, order: DateOrder | null): string | null {
  const dated = context.entries.filter(({ key }) => /\b(date|day|held|tested|recorded|measured)\b/.test(key));
  const others = context.entries.filter(({ key }) => !/birth|born|dob|print|export|created/.test(key));
  return [...dated, ...others].map(({ value }) => readDate(value, order)).find((date) => date !== null) ?? null;
}

/** Why a text is no date. */
export const dateProblem = (text: string): string =>
  /\d/.test(text) ? `“${text}” is no date, or may be one in two ways` : `“${text}” is no date`;

/** Whether the row sums others up: the athlete's cell, or a label where a club, a test or a number should be. */
export function isSummaryRow(table: RecognisedTable, row: SourceRow): boolean {
  const fields = ['club', 'test', 'attempt', 'swing'] as const;
  return (
    isSummaryLabel(nameOf(table, row)) || fields.some((field) => isSummaryLabel(cellOf(row, columnOf(table, field))))
  );
}
