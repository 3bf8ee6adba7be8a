import type { SourceRow } from '#src/services/import/parseTable.ts';
import type { Column } from '#src/services/import/recogniseTable.ts';

const FEWEST_ROWS = 4;

/**
 * Rows of a table that names an athlete only in the first of their rows, each with the name it stands under. A table
 * where most rows have a name is left as it is: there an empty cell is a name that is missing.
 */
export function filledDown(columns: readonly Column[], rows: readonly SourceRow[]): readonly SourceRow[] {
  const at = columns.find(({ field }) => field === 'athlete')?.index;
  if (at === undefined || rows.length < FEWEST_ROWS) return rows;
  const empty = rows.filter(({ cells }) => (cells[at] ?? '') === '').length;
  if (empty * 2 <= rows.length) return rows;
  let name = '';
  return rows.map((row) => {
    name = row.cells[at] || name;
    return { ...row, cells: row.cells.map((cell, i) => (i === at ? name : cell)) };
  });
}
