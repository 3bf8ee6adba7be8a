import type { DateOrder } from '#src/domain/units/parseDate.ts';
import type { DecimalMark } from '#src/domain/units/parseNumber.ts';
import { parseUnit } from '#src/domain/units/parseUnit.ts';
import { toSi } from '#src/domain/units/toSi.ts';
import type { Quantity, Unit } from '#src/domain/units/unitTable.ts';
import { columnField, type ColumnField } from '#src/services/import/columnField.ts';
import { readCell } from '#src/services/import/readCell.ts';
import { readHeading } from '#src/services/import/readHeading.ts';
import type { Reading, Readings } from '#src/services/import/reading.ts';
import { cellOf, columnOf, type RecognisedTable } from '#src/services/import/recogniseTable.ts';
import { dateFinder, isSummaryRow } from '#src/services/import/rowContext.ts';
import { tableDecimal } from '#src/services/import/tableDecimal.ts';

/** The air and the ground of one driver session; null where not noted. */
export interface SessionConditions {
  heldOn: string;
  place: string;
  temperatureC: number | null;
  humidityPct: number | null;
  pressurePa: number | null;
  altitudeM: number | null;
  /** Along the target line; positive follows the ball. */
  windMps: number | null;
  surface: string;
  ball: string;
}

interface Measured {
  quantity: Quantity | null;
  lowest: number;
  highest: number;
  /** Taken where neither heading nor cell names a unit and the size tells. */
  assumed: readonly string[];
}

const MEASURED: Readonly<Partial<Record<ColumnField, Measured>>> = {
  temperature: { quantity: 'temperature', lowest: -20, highest: 55, assumed: ['°C'] },
  humidity: { quantity: null, lowest: 0, highest: 100, assumed: [] },
  pressure: { quantity: 'pressure', lowest: 50_000, highest: 110_000, assumed: ['hPa', 'kPa', 'inHg', 'Pa'] },
  altitude: { quantity: 'length', lowest: -450, highest: 5000, assumed: ['m'] },
  wind: { quantity: 'speed', lowest: -25, highest: 25, assumed: [] },
  headwind: { quantity: 'speed', lowest: -25, highest: 25, assumed: [] },
};

/** Reads the conditions of sessions, a row a session. A value out of its range refuses the row. */
export function readConditions(
  table: RecognisedTable,
  settings: { dateOrder: DateOrder | null; nameOrder: DateOrder | null },
): Readings<SessionConditions> {
  const dateOf = dateFinder(table, { ...settings, athletes: [] });
  const measuring = table.columns.filter(({ field }) => field !== null && field in MEASURED);
  const decimal = tableDecimal(table, measuring);
  const leftOut = table.leftOut.map((row) => ({ file: table.file, ...row }));
  const rows = table.body.filter((row) => {
    if (!isSummaryRow(table, row)) return true;
    leftOut.push({ file: table.file, line: row.line, why: 'a summary row' });
    return false;
  });
  const readings = rows.map((row): Reading<SessionConditions> => {
    const { date, reason } = dateOf(row);
    const at = { file: table.file, line: row.line, column: 1, label: date ?? 'conditions' };
    if (date === null) return { ...at, value: null, refused: reason };
    const value = { ...noConditions(date), place: cellOf(row, columnOf(table, 'place')) };
    value.surface = cellOf(row, columnOf(table, 'surface'));
    value.ball = cellOf(row, columnOf(table, 'ball'));
    for (const column of measuring) {
      const problem = setMeasured(value, column.field!, cellOf(row, column), column.unit, decimal);
      if (problem !== null) return { ...at, column: column.index + 1, value: null, refused: problem };
    }
    return { ...at, value, refused: null };
  });
  return { readings, leftOut, notes: [] };
}

/** The conditions that a driver file's own head gives, or null where it gives none. */
export function conditionsAtHead({ context }: RecognisedTable, heldOn: string): SessionConditions | null {
  const value = noConditions(heldOn);
  let found = false;
  for (const entry of context.entries) {
    const heading = readHeading(entry.key);
    const field = columnField(heading);
    if (field === 'place' || field === 'surface' || field === 'ball') {
      value[field] = entry.value;
      found = true;
    } else if (field !== null && field in MEASURED) {
      found = setMeasured(value, field, entry.value, heading.unit, undefined) === null || found;
    }
  }
  return found ? value : null;
}

/** A session of which nothing is known but its date. */
export const noConditions = (heldOn: string): SessionConditions => ({
  ...{ heldOn, place: '', surface: '', ball: '' },
  ...{ temperatureC: null, humidityPct: null, pressurePa: null, altitudeM: null, windMps: null },
});

function setMeasured(
  into: SessionConditions,
  field: ColumnField,
  text: string,
  headingUnit: Unit | null,
  decimal: DecimalMark | undefined,
): string | null {
  if (/^(calm|still|indoors?|no wind)$/i.test(text.trim()) && (field === 'wind' || field === 'headwind')) {
    into.windMps = 0;
    return null;
  }
  const cell = readCell(text.replace(/%/g, ''), decimal);
  if (cell.kind === 'blank') return null;
  if (cell.kind === 'words') return `“${text}” is no number`;
  const { quantity, lowest, highest, assumed } = MEASURED[field]!;
  const inRange = (value: number) => value >= lowest && value <= highest;
  const unit =
    cell.unit ??
    headingUnit ??
    assumed.map((symbol) => parseUnit(symbol)!).find((candidate) => inRange(toSi(cell.value, candidate))) ??
    null;
  if (quantity !== null && unit === null) return `no unit for “${text}”`;
  if (quantity !== null && unit!.quantity !== quantity) return `${unit!.symbol} is no unit of ${quantity}`;
  const base = quantity === null ? cell.value : toSi(cell.value, unit!);
  if (!inRange(base)) return `${text} is outside ${lowest} to ${highest}`;
  if (field === 'temperature') into.temperatureC = base;
  else if (field === 'humidity') into.humidityPct = base;
  else if (field === 'pressure') into.pressurePa = base;
  else if (field === 'altitude') into.altitudeM = base;
  else if (/\b(head ?wind|head|into|against)\b/i.test(cell.remark)) into.windMps = 0 - Math.abs(base);
  else into.windMps = field === 'headwind' ? 0 - base : base;
  return null;
}
