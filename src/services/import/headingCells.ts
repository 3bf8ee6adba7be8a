import type { SourceRow } from '#src/services/import/parseTable.ts';
import { readHeading } from '#src/services/import/readHeading.ts';
import { sideAndAttempt } from '#src/services/import/readSide.ts';

const MOST_LEVELS = 3;

/**
 * The headings that begin at a row. Where the rows below hold nothing but sides and attempts, they are the lower levels
 * of the same headings (`jump` over `L1`, `L2`), and a cell of an upper level reaches to the next one.
 *
 * @returns one text a column, and the index of the last row of headings
 */
export function headingCells(rows: readonly SourceRow[], at: number): { cells: readonly string[]; last: number } {
  let last = at;
  while (last - at < MOST_LEVELS - 1 && isLowerLevel(rows[last + 1], rows[at]!)) last += 1;
  if (last === at) return { cells: rows[at]!.cells, last };
  const levels = rows.slice(at, last + 1).map(({ cells }, i) => (i === last - at ? cells : reaching(cells)));
  const width = Math.max(...levels.map((cells) => cells.length));
  const cells = Array.from({ length: width }, (_, column) =>
    levels
      .map((level) => level[column] ?? '')
      .filter((cell) => cell !== '')
      .join(' '),
  );
  return { cells, last };
}

function isLowerLevel(row: SourceRow | undefined, upper: SourceRow): boolean {
  if (row === undefined || row.cells[0] !== '' || !upper.cells.includes('', 1)) return false;
  const filled = row.cells.filter((cell) => cell !== '');
  return (
    filled.length > 1 &&
    filled.every((cell) => {
      const { side, attempt, rest } = sideAndAttempt(readHeading(cell).words);
      return rest.length === 0 && (side !== null || attempt !== null);
    })
  );
}

const reaching = (cells: readonly string[]): string[] => {
  let reach = '';
  return cells.map((cell) => (reach = cell === '' ? reach : cell));
};
