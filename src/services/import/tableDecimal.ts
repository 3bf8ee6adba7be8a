import { decimalMark } from '#src/domain/units/decimalMark.ts';
import type { DecimalMark } from '#src/domain/units/parseNumber.ts';
import { parseNumber } from '#src/domain/units/parseNumber.ts';
import { cellOf, type Column, type RecognisedTable } from '#src/services/import/recogniseTable.ts';

const CELLS_LOOKED_AT = 20_000;
const LEAST_SHARE = 0.9;

/** The decimal mark of a table's measuring columns; undefined where the cells do not tell. */
export function tableDecimal(table: RecognisedTable, columns: readonly Column[]): DecimalMark | undefined {
  const cells: string[] = [];
  for (const row of table.body) {
    for (const column of columns) {
      const cell = cellOf(row, column);
      if (/\d[.,]\d/.test(cell)) cells.push(cell);
    }
    if (cells.length > CELLS_LOOKED_AT) break;
  }
  return decimalMark(cells) ?? byMost(cells) ?? byDelimiter(table, cells);
}

/** A few cells may be written the other way: then the mark that nearly all of them can be read with. */
function byMost(cells: readonly string[]): DecimalMark | undefined {
  const fits = (mark: DecimalMark) => cells.filter((cell) => parseNumber(cell, mark) !== null).length / cells.length;
  if (cells.length === 0) return undefined;
  const [comma, point] = [fits(','), fits('.')];
  if (comma === point) return undefined;
  if (Math.max(comma, point) < LEAST_SHARE) return undefined;
  return comma > point ? ',' : '.';
}

/**
 * Cells like `1,299` and `202.847` can be read both ways. A table cut by semicolons is so because its commas are decimal
 * marks; one cut by commas, tabs or bars has points.
 */
function byDelimiter({ delimiter }: RecognisedTable, cells: readonly string[]): DecimalMark | undefined {
  if (cells.length === 0) return undefined;
  if (delimiter !== ';') return '.';
  return cells.some((cell) => cell.includes(',')) ? ',' : undefined;
}
