import type { Unit } from '#src/domain/units/unitTable.ts';
import type { ColumnField } from '#src/services/import/columnField.ts';
import { readCell, type CellValue } from '#src/services/import/readCell.ts';
import type { Reading, ReaderSettings, Readings } from '#src/services/import/reading.ts';
import { cellOf, type Column, type RecognisedTable } from '#src/services/import/recogniseTable.ts';
import { athleteFinder, dateFinder, isSummaryRow, nameOf } from '#src/services/import/rowContext.ts';
import { siValue, unitBySize } from '#src/services/import/siValue.ts';
import { tableDecimal } from '#src/services/import/tableDecimal.ts';

/** One growth measure in m and kg, null where not taken, with what was written. */
export interface GrowthReading {
  athleteId: string;
  measuredOn: string;
  statureM: number | null;
  sittingHeightM: number | null;
  massKg: number | null;
  entered: Record<string, string>;
}

type Measure = 'statureM' | 'sittingHeightM' | 'massKg';
const MEASURES: Readonly<
  Partial<Record<ColumnField, { key: Measure; quantity: 'length' | 'mass'; typical: number | null }>>
> = {
  stature: { key: 'statureM', quantity: 'length', typical: 1.52 },
  sittingHeight: { key: 'sittingHeightM', quantity: 'length', typical: 0.8 },
  // A child's kilograms and another's pounds overlap: nothing but a name tells them apart.
  mass: { key: 'massKg', quantity: 'mass', typical: null },
};

/** Reads growth measures, a row an athlete and date. A row without any value is left out; a wrong value refuses it. */
export function readGrowth(table: RecognisedTable, settings: ReaderSettings): Readings<GrowthReading> {
  const athleteOf = athleteFinder(table, settings.athletes);
  const dateOf = dateFinder(table, settings);
  const columns = table.columns.filter(({ field }) => field !== null && field in MEASURES);
  const decimal = tableDecimal(table, columns);
  const cells = new Map(
    columns.map((column) => [column, table.body.map((row) => readCell(cellOf(row, column), decimal))]),
  );
  const bySize = new Map(columns.map((column) => [column, unitOfColumn(column, cells.get(column)!)]));
  const leftOut = table.leftOut.map((row) => ({ file: table.file, ...row }));
  const readings: Reading<GrowthReading>[] = [];
  table.body.forEach((row, i) => {
    const filled = columns.filter((column) => cells.get(column)![i]!.kind !== 'blank');
    if (isSummaryRow(table, row) || filled.length === 0) {
      const why = filled.length === 0 ? 'no measure in the row' : 'a summary row';
      leftOut.push({ file: table.file, line: row.line, why });
      return;
    }
    const at = { file: table.file, line: row.line, column: filled[0]!.index + 1, label: nameOf(table, row) };
    const refuse = (refused: string, column = at.column) => readings.push({ ...at, column, value: null, refused });
    const { athlete, reason: nobody } = athleteOf(row);
    if (athlete === null) return refuse(nobody, 1);
    const { date, reason: undated } = dateOf(row);
    if (date === null) return refuse(undated, 1);
    const value: GrowthReading = {
      ...{ athleteId: athlete.id, measuredOn: date, statureM: null, sittingHeightM: null, massKg: null, entered: {} },
    };
    for (const column of filled) {
      const { key, quantity } = MEASURES[column.field!]!;
      const read = siOf(cells.get(column)![i]!, column.unit ?? bySize.get(column)!, quantity);
      if (typeof read === 'string') return refuse(read, column.index + 1);
      value[key] = read;
      value.entered[key] = `${cellOf(row, column)}${column.unit ? ` ${column.unit.symbol}` : ''}`;
    }
    return readings.push({ ...at, value, refused: null });
  });
  return { readings, leftOut, notes: [] };
}

function siOf(cell: CellValue, columnUnit: Unit | null, quantity: 'length' | 'mass'): number | string {
  if (cell.kind !== 'number') return cell.kind === 'words' ? `“${cell.text}” is no number` : 'no value';
  const unit = cell.unit ?? columnUnit;
  if (unit === null) return `no unit for ${cell.value}${cell.remark === '' ? '' : ` ${cell.remark}`}`;
  return siValue(cell.value, unit, quantity) ?? `${unit.symbol} is no unit of ${quantity}`;
}

function unitOfColumn({ field, unit }: Column, cells: readonly CellValue[]): Unit | null {
  const { quantity, typical } = MEASURES[field!]!;
  if (unit !== null || typical === null) return unit;
  const values = cells.flatMap((cell) => (cell.kind === 'number' && cell.unit === null ? [cell.value] : []));
  return unitBySize(values, typical, quantity);
}
