import { recogniseTest } from '#src/domain/catalogue/recogniseTest.ts';
import { parseUnit } from '#src/domain/units/parseUnit.ts';
import type { Unit } from '#src/domain/units/unitTable.ts';
import { columnField, type ColumnField } from '#src/services/import/columnField.ts';
import { fileContext, type FileContext } from '#src/services/import/fileContext.ts';
import type { SourceRow, SourceTable } from '#src/services/import/parseTable.ts';
import { filledDown } from '#src/services/import/filledDown.ts';
import { headingCells } from '#src/services/import/headingCells.ts';
import { readHeading, type Heading } from '#src/services/import/readHeading.ts';
import { sideAndAttempt, type WrittenSide } from '#src/services/import/readSide.ts';

export type TableKind = 'athletes' | 'battery' | 'growth' | 'conditions' | 'driver' | 'ground trace' | 'force curve';

/** One column by what its heading says. */
export interface Column {
  index: number;
  heading: Heading;
  field: ColumnField | null;
  testKey: string | null;
  side: WrittenSide | null;
  attempt: number | null;
  unit: Unit | null;
}

/** A table whose headings were understood. */
export interface RecognisedTable {
  file: string;
  delimiter: SourceTable['delimiter'];
  kinds: readonly TableKind[];
  columns: readonly Column[];
  context: FileContext;
  body: readonly SourceRow[];
  /** Rows that are no data: units, repeated headings. */
  leftOut: readonly { line: number; why: string }[];
  notes: readonly string[];
}

const ROWS_ABOVE_HEADINGS = 40;
const UNITLESS = /^(%|-|#|no\.?|n\/a|h:m|yyyy-mm-dd|dd[/.]mm[/.]yyyy|text)$/i;

/**
 * Finds the row of headings and says what the table is, by its headings alone.
 *
 * @returns null where no row's headings say what the table is
 */
export function recogniseTable(table: SourceTable): RecognisedTable | null {
  const candidates = table.rows.slice(0, ROWS_ABOVE_HEADINGS);
  for (const i of candidates.keys()) {
    const { cells, last } = headingCells(table.rows, i);
    const columns = columnsOf(cells);
    const above = table.rows.slice(0, i);
    const context = fileContext(table, above);
    const kinds = kindsOf(columns, context);
    if (kinds.length > 0) return withBody(table, { kinds, columns, context, at: last });
  }
  return null;
}

/** The first column of a field, or undefined. */
export const columnOf = ({ columns }: Pick<RecognisedTable, 'columns'>, field: ColumnField): Column | undefined =>
  columns.find((column) => column.field === field);

/** The cell under a column; empty where the row is short or there is no such column. */
export const cellOf = (row: SourceRow, column: Column | undefined): string =>
  column === undefined ? '' : (row.cells[column.index] ?? '');

function columnsOf(cells: readonly string[]): Column[] {
  const seen = new Set<ColumnField>();
  return cells.map((cell, index) => {
    const heading = readHeading(cell);
    const { side, attempt, rest } = sideAndAttempt(heading.words);
    const found = columnField(heading);
    const repeated = found !== null && found !== 'force' && found !== 'remark' && seen.has(found);
    const field = repeated ? null : found;
    if (field) seen.add(field);
    const testKey = field === null || field === 'force' ? recogniseTest(rest.join(' ')) : null;
    return { index, heading, field, testKey, side, attempt, unit: heading.unit };
  });
}

function kindsOf(columns: readonly Column[], context: FileContext): TableKind[] {
  const has = (...fields: ColumnField[]) => columns.some(({ field }) => field !== null && fields.includes(field));
  const named = has('athlete', 'givenName', 'familyName');
  const somebody = named || context.find('athlete', 'player', 'name', 'golfer') !== null;
  if (named && has('birthDate')) return ['athletes'];
  if (has('carry') && has('ballSpeed', 'clubSpeed', 'club', 'spin', 'launch')) return ['driver'];
  const forces = columns.filter(isForceColumn);
  const timed = has('time') || context.find('sample rate', 'sampling rate', 'rate', 'hz', 'frequency') !== null;
  if (timed && forces.length > 0 && !has('test', 'attempt', 'value', 'stature')) {
    const sided = forces.filter(({ side }) => side !== null);
    return [sided.length >= 2 ? 'ground trace' : 'force curve'];
  }
  const kinds: TableKind[] = [];
  const tests = columns.filter(({ testKey }) => testKey !== null);
  const parts = columns.filter((column) => column.field === null && (column.side !== null || column.attempt !== null));
  if (somebody && (tests.length > 0 || (has('test') && (has('value', 'force') || parts.length > 0))))
    kinds.push('battery');
  if (somebody && has('stature', 'sittingHeight', 'mass')) kinds.push('growth');
  if (!named && kinds.length === 0 && has('temperature', 'pressure', 'wind', 'headwind', 'altitude'))
    kinds.push('conditions');
  return kinds;
}

/** A column of samples: it speaks of force, or names a side and has a unit of force or none. */
export const isForceColumn = ({ field, side, unit, heading }: Column): boolean =>
  field === 'force' ||
  (field === null &&
    (side !== null || unit?.quantity === 'force') &&
    (unit === null || unit.quantity === 'force') &&
    !/\b(fx|fy|x|y|cop|moment)\b/.test(heading.name)) ||
  (field === 'pressure' && side !== null);

interface Found {
  kinds: readonly TableKind[];
  columns: Column[];
  context: FileContext;
  at: number;
}

function withBody(table: SourceTable, { kinds, columns, context, at }: Found): RecognisedTable {
  const headings = table.rows[at]!.cells.join('\n').toLowerCase();
  const leftOut: { line: number; why: string }[] = [];
  let units: (Unit | null)[] = [];
  const body = filledDown(columns, table.rows.slice(at + 1)).filter(({ line, cells }, i) => {
    if (cells.join('\n').toLowerCase() === headings) return !leftOut.push({ line, why: 'the headings again' });
    if (i === 0 && isUnitRow(cells)) {
      units = cells.map((cell) => parseUnit(cell));
      return !leftOut.push({ line, why: 'a row of units' });
    }
    return true;
  });
  return {
    file: table.file,
    delimiter: table.delimiter,
    kinds,
    columns: columns.map((column) => ({ ...column, unit: column.unit ?? units[column.index] ?? null })),
    context,
    body,
    leftOut,
    notes: table.notes,
  };
}

function isUnitRow(cells: readonly string[]): boolean {
  const filled = cells.filter((cell) => cell !== '');
  const units = filled.filter((cell) => parseUnit(cell) !== null);
  return units.length > 0 && filled.every((cell) => parseUnit(cell) !== null || UNITLESS.test(cell));
}
