import { parseUnit } from '#src/domain/units/parseUnit.ts';
import type { DecimalMark } from '#src/domain/units/parseNumber.ts';
import { siValue } from '#src/services/import/siValue.ts';
import { wordsOf } from '#src/domain/catalogue/wordsOf.ts';
import type { ColumnField } from '#src/services/import/columnField.ts';
import { readCell } from '#src/services/import/readCell.ts';
import type { Reading, ReaderSettings, Readings } from '#src/services/import/reading.ts';
import type { SourceRow } from '#src/services/import/parseTable.ts';
import { cellOf, columnOf, type Column, type RecognisedTable } from '#src/services/import/recogniseTable.ts';
import { athleteFinder, dateFinder, isSummaryRow, nameOf } from '#src/services/import/rowContext.ts';
import { tableDecimal } from '#src/services/import/tableDecimal.ts';
import { unusableFile } from '#src/services/import/unusableFile.ts';

/** One shot in SI, degrees and rpm; null where the device gave nothing. */
export interface ShotReading {
  athleteId: string;
  heldOn: string;
  place: string;
  /** As the file numbers it; null where it does not. */
  shotNo: number | null;
  club: 'driver' | 'other';
  clubLabel: string;
  clubSpeedMps: number | null;
  ballSpeedMps: number | null;
  launchDeg: number | null;
  spinRpm: number | null;
  attackDeg: number | null;
  dynamicLoftDeg: number | null;
  carryM: number;
  offlineM: number | null;
}

type Measure = Exclude<keyof ShotReading, 'athleteId' | 'heldOn' | 'place' | 'shotNo' | 'club' | 'clubLabel'>;
interface Measured {
  field: ColumnField;
  key: Measure;
  quantity: 'speed' | 'angle' | 'rate' | 'length';
  /** Units that a heading without one means; a speed or a length has none of its own. */
  assumed: string | null;
  lowest: number;
  highest: number;
}

const MEASURED: readonly Measured[] = [
  { field: 'carry', key: 'carryM', quantity: 'length', assumed: null, lowest: 0, highest: 449 },
  { field: 'clubSpeed', key: 'clubSpeedMps', quantity: 'speed', assumed: null, lowest: 0, highest: 1000 },
  { field: 'ballSpeed', key: 'ballSpeedMps', quantity: 'speed', assumed: null, lowest: 0, highest: 1000 },
  { field: 'launch', key: 'launchDeg', quantity: 'angle', assumed: 'deg', lowest: -45, highest: 85 },
  { field: 'spin', key: 'spinRpm', quantity: 'rate', assumed: 'rpm', lowest: 0, highest: 19_999 },
  { field: 'attack', key: 'attackDeg', quantity: 'angle', assumed: 'deg', lowest: -45, highest: 45 },
  { field: 'dynamicLoft', key: 'dynamicLoftDeg', quantity: 'angle', assumed: 'deg', lowest: -45, highest: 85 },
  { field: 'side', key: 'offlineM', quantity: 'length', assumed: null, lowest: -300, highest: 300 },
  { field: 'offline', key: 'offlineM', quantity: 'length', assumed: null, lowest: -300, highest: 300 },
];

/** What the trade calls a driver. */
const DRIVER = /^(driver\b.*|dr|drv|drvr|d|1 ?w|1 ?wood|w ?1|wood ?1)$/;

/**
 * Reads the shots of a driver session. Averages are left out; a shot of another club is kept as such; a shot without a
 * carry, or with a reading that no ball or club gives, is refused.
 *
 * @throws {AppError} invalid with file, row and column where a speed or a distance has no unit anywhere
 */
export function readDriver(table: RecognisedTable, settings: ReaderSettings): Readings<ShotReading> {
  const columns = MEASURED.flatMap((measured) => {
    const column = columnOf(table, measured.field);
    return column ? [{ ...measured, column: { ...column } }] : [];
  });
  const decimal = tableDecimal(
    table,
    columns.map(({ column }) => column),
  );
  requireUnits(table, columns, decimal);
  const athleteOf = athleteFinder(table, settings.athletes);
  const dateOf = dateFinder(table, settings);
  const leftOut = table.leftOut.map((row) => ({ file: table.file, ...row }));
  const readings: Reading<ShotReading>[] = [];
  const clubColumn = columnOf(table, 'club');
  for (const row of table.body) {
    if (isSummaryRow(table, row)) {
      leftOut.push({ file: table.file, line: row.line, why: 'an average row' });
      continue;
    }
    const clubLabel = cellOf(row, clubColumn) || (clubColumn ? '' : (table.context.find('club') ?? 'driver'));
    const number = cellOf(row, columnOf(table, 'attempt'));
    const label = [nameOf(table, row), clubLabel, number && `shot ${number}`].filter((part) => part).join(', ');
    const at = { file: table.file, line: row.line, column: 1, label };
    const read = readShot({ row, columns, decimal });
    const { athlete, reason: nobody } = athleteOf(row);
    const { date, reason: undated } = dateOf(row);
    if (athlete === null || date === null) readings.push({ ...at, value: null, refused: nobody ?? undated ?? '' });
    else if (clubLabel === '') readings.push({ ...at, value: null, refused: 'no club is named' });
    else if ('problem' in read) readings.push({ ...at, column: read.column, value: null, refused: read.problem });
    else {
      const value: ShotReading = {
        ...{ athleteId: athlete.id, heldOn: date, place: cellOf(row, columnOf(table, 'place')) },
        ...{ shotNo: /^\d{1,6}$/.test(number) ? Number(number) : null, clubLabel: clubLabel.slice(0, 60) },
        club: DRIVER.test(wordsOf(clubLabel).join(' ')) ? 'driver' : 'other',
        ...read,
      };
      readings.push({ ...at, value, refused: null });
    }
  }
  return { readings, leftOut, notes: clubColumn ? [] : ['no column of clubs: every shot is taken as a driver’s'] };
}

type ReadColumn = Measured & { column: Column };
type Measures = Record<Exclude<Measure, 'carryM'>, number | null> & { carryM: number };

function readShot(input: {
  row: SourceRow;
  columns: readonly ReadColumn[];
  decimal: DecimalMark | undefined;
}): Measures | { problem: string; column: number } {
  const { row, columns, decimal } = input;
  const found: Record<Measure, number | null> = {
    ...{ clubSpeedMps: null, ballSpeedMps: null, launchDeg: null, spinRpm: null },
    ...{ attackDeg: null, dynamicLoftDeg: null, carryM: null, offlineM: null },
  };
  for (const { column, key, quantity, assumed, lowest, highest } of columns) {
    const text = cellOf(row, column);
    const { bare, sign } = key === 'offlineM' ? directed(text) : { bare: text, sign: 1 };
    const cell = readCell(bare, decimal);
    if (cell.kind === 'blank') continue;
    const at = column.index + 1;
    if (cell.kind === 'words') return { problem: `“${text}” is no number`, column: at };
    const unit = cell.unit ?? column.unit ?? (assumed === null ? null : parseUnit(assumed));
    const base = unit === null ? null : siValue(cell.value * sign, unit, quantity);
    if (base === null) return { problem: `${unit?.symbol ?? 'no unit'} for “${text}”`, column: at };
    if (base < lowest || base > highest) {
      return { problem: `${column.heading.name} “${text}” is outside what a shot can give`, column: at };
    }
    found[key] ??= base;
  }
  const { carryM, ...others } = found;
  const carryColumn = columns.find(({ key }) => key === 'carryM')!.column.index + 1;
  return carryM === null ? { problem: 'no carry was read', column: carryColumn } : { carryM, ...others };
}

/** `12.3 L`, `R 4.5`: a side as a letter; left is negative. */
function directed(text: string): { bare: string; sign: number } {
  const behind = /^([\d.,\s]+?)\s*([a-z]{1,2}\s+)?(l|left|r|right)$/i.exec(text.trim());
  const before = /^(l|left|r|right)\s*([\d.,]+.*)$/i.exec(text.trim());
  const letter = behind?.[3] ?? before?.[1];
  if (letter === undefined) return { bare: text, sign: 1 };
  const bare = behind ? `${behind[1]!} ${behind[2] ?? ''}`.trim() : before![2]!;
  return { bare, sign: letter[0]!.toLowerCase() === 'l' ? -1 : 1 };
}

function requireUnits(table: RecognisedTable, columns: readonly ReadColumn[], decimal: DecimalMark | undefined): void {
  for (const { column, assumed, quantity, key } of columns) {
    if (column.unit !== null || assumed !== null) continue;
    if (key === 'offlineM') {
      column.unit = columns[0]!.column.unit;
      continue;
    }
    const written = table.context.find(
      `${column.heading.name} unit`,
      `unit of ${column.heading.name}`,
      `${quantity} unit`,
    );
    column.unit = written === null ? null : parseUnit(written);
    const inCells = table.body.some((row) => {
      const cell = readCell(cellOf(row, column), decimal);
      return cell.kind === 'number' && cell.unit !== null;
    });
    if (column.unit === null && !inCells && table.body.length > 0) {
      unusableFile(
        { file: table.file, row: table.body[0]!.line - 1, column: column.index + 1 },
        `no unit for ${column.heading.name}, neither in its heading, nor in a row of units, nor in the cells`,
      );
    }
  }
}
