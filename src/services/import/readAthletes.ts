import { wordsOf } from '#src/domain/catalogue/wordsOf.ts';
import type { Sex } from '#src/domain/growth/sex.ts';
import type { SourceRow } from '#src/services/import/parseTable.ts';
import type { Reading, Readings } from '#src/services/import/reading.ts';
import { cellOf, columnOf, type RecognisedTable } from '#src/services/import/recogniseTable.ts';
import { dateProblem, isSummaryRow, nameOf } from '#src/services/import/rowContext.ts';
import { readDate } from '#src/services/import/settleDates.ts';
import type { DateOrder } from '#src/domain/units/parseDate.ts';

/** One athlete of an academy's list. */
export interface ListedAthlete {
  givenName: string;
  familyName: string;
  birthDate: string;
  sex: Sex;
  /** What the child plays; null where the list does not say. */
  plays: 'left' | 'right' | null;
  squad: string;
  guardianEmails: string[];
}

const LONGEST_NAME = 80;
const DEFAULT_SQUAD = 'Squad';
const SEXES: Readonly<Record<string, Sex>> = {
  ...{ m: 'male', male: 'male', boy: 'male', boys: 'male', b: 'male', man: 'male' },
  ...{ f: 'female', female: 'female', girl: 'female', girls: 'female', g: 'female', w: 'female', woman: 'female' },
};

/**
 * Reads a list of athletes. A row without a name, a birth date or a sex is refused: nobody can be judged without them.
 *
 * @param today YYYY-MM-DD; a later birth is refused
 */
export function readAthletes(table: RecognisedTable, order: DateOrder | null, today: string): Readings<ListedAthlete> {
  const seen = new Set<string>();
  const readings: Reading<ListedAthlete>[] = [];
  const leftOut = table.leftOut.map((row) => ({ file: table.file, ...row }));
  for (const row of table.body) {
    if (isSummaryRow(table, row)) {
      leftOut.push({ file: table.file, line: row.line, why: 'a summary row' });
      continue;
    }
    const read = readRow(table, row, order, today);
    const place = { file: table.file, line: row.line, column: 1, label: nameOf(table, row) };
    if (typeof read === 'string') readings.push({ ...place, value: null, refused: read });
    else {
      const key = `${wordsOf(`${read.givenName} ${read.familyName}`).join(' ')} ${read.birthDate}`;
      if (seen.has(key)) leftOut.push({ file: table.file, line: row.line, why: 'the same athlete again' });
      else readings.push({ ...place, value: read, refused: null });
      seen.add(key);
    }
  }
  return { readings, leftOut, notes: [] };
}

function readRow(
  table: RecognisedTable,
  row: SourceRow,
  order: DateOrder | null,
  today: string,
): ListedAthlete | string {
  const cell = (field: Parameters<typeof columnOf>[1]) => cellOf(row, columnOf(table, field));
  const name = readName(cell('givenName'), cell('familyName'), cell('athlete'));
  if (name === null) return 'no given and family name';
  if (name.givenName.length > LONGEST_NAME || name.familyName.length > LONGEST_NAME)
    return 'a name longer than 80 letters';
  const birth = cell('birthDate');
  const birthDate = readDate(birth, order);
  if (birthDate === null) return dateProblem(birth);
  if (birthDate >= today || birthDate < '1980-01-01') return `born on ${birthDate}`;
  const sex = SEXES[wordsOf(cell('sex'))[0] ?? ''];
  if (sex === undefined) return `“${cell('sex')}” is neither female nor male, which the growth references ask for`;
  return {
    ...name,
    birthDate,
    sex,
    plays: readPlays(cell('plays')),
    squad: cell('squad').slice(0, 60) || DEFAULT_SQUAD,
    guardianEmails: readEmails(table, row),
  };
}

function readName(given: string, family: string, one: string): { givenName: string; familyName: string } | null {
  if (given !== '' && family !== '') return { givenName: given, familyName: family };
  const comma = /^([^,]+),\s*(.+)$/.exec(one);
  if (comma) return { givenName: comma[2]!, familyName: comma[1]!.trim() };
  const words = one.split(/\s+/).filter((word) => word !== '');
  return words.length < 2 ? null : { givenName: words[0]!, familyName: words.slice(1).join(' ') };
}

/** What a child plays, from `right-handed`, `R`, `LH`, `lefty`. */
export function readPlays(text: string): 'left' | 'right' | null {
  const words = wordsOf(text);
  if (words.some((word) => /^(l|lh|left|lefty|lefthanded|lefthander|southpaw)$/.test(word))) return 'left';
  return words.some((word) => /^(r|rh|right|righty|righthanded|righthander)$/.test(word)) ? 'right' : null;
}

function readEmails(table: RecognisedTable, row: SourceRow): string[] {
  const cells = table.columns
    .filter(({ heading, field }) => field === 'email' || /mail|parent|guardian|mother|father/.test(heading.name))
    .map((column) => cellOf(row, column));
  const found = cells.flatMap(
    (cell) => cell.toLowerCase().match(/[^\s,;<>()"@]+@[^\s,;<>()"@]+\.[^\s,;<>()"@]+/g) ?? [],
  );
  return [...new Set(found)];
}
