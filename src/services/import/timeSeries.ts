import type { DecimalMark } from '#src/domain/units/parseNumber.ts';
import { parseNumber } from '#src/domain/units/parseNumber.ts';
import {
  cellOf,
  columnOf,
  isForceColumn,
  type Column,
  type RecognisedTable,
} from '#src/services/import/recogniseTable.ts';
import { tableDecimal } from '#src/services/import/tableDecimal.ts';
import { unusableFile } from '#src/services/import/unusableFile.ts';

/** Evenly sampled channels of one file; `startS` is the clock's reading at the first sample. */
export interface TimeSeries {
  sampleRateHz: number;
  startS: number;
  channels: { column: Column; samples: Float64Array; measure: 'force' | 'pressure' }[];
}

const FEWEST_SAMPLES = 20;
/** A rounded clock may miss its sample by this share of an interval; more is a lost or doubled sample. */
const MOST_JITTER = 0.75;

/**
 * Reads the samples of a trace or curve.
 *
 * @throws {AppError} invalid with file, row and column where a sample is missing or no number, or the clock jumps
 */
export function timeSeries(table: RecognisedTable): TimeSeries {
  const timeColumn = columnOf(table, 'time');
  const columns = table.columns.filter(isForceColumn);
  const decimal = tableDecimal(table, timeColumn ? [...columns, timeColumn] : columns);
  const rows = table.body;
  if (rows.length < FEWEST_SAMPLES) unusableFile({ file: table.file }, `only ${rows.length} samples`);
  const read = new Map(
    [...columns, ...(timeColumn ? [timeColumn] : [])].map((column) => [column, new Float64Array(rows.length)]),
  );
  // Row by row: the place that is told is the first one.
  rows.forEach((row, i) => {
    for (const [column, samples] of read) samples[i] = numberAt(table, row, column, decimal);
  });
  const channels = columns.map((column) => {
    const isForce = column.unit?.quantity === 'force' || (column.unit === null && !/press/.test(column.heading.name));
    const factor = column.unit?.quantity === 'force' ? column.unit.factor : 1;
    const measure = isForce ? ('force' as const) : ('pressure' as const);
    return { column, samples: read.get(column)!.map((value) => value * factor), measure };
  });
  const clock = timeColumn ? clockOf(table, timeColumn, read.get(timeColumn)!) : declaredClock(table);
  return { ...clock, channels };
}

function numberAt(
  table: RecognisedTable,
  row: RecognisedTable['body'][number],
  column: Column,
  decimal: DecimalMark | undefined,
): number {
  const text = cellOf(row, column);
  const value = parseNumber(text, decimal);
  if (value !== null && value.unit === null) return value.value;
  const what = text === '' ? 'a sample is missing: the file may be cut off' : `“${text}” is no number`;
  return unusableFile({ file: table.file, row: row.line, column: column.index + 1 }, what);
}

function clockOf(table: RecognisedTable, column: Column, written: Float64Array): Omit<TimeSeries, 'channels'> {
  const factor =
    column.unit?.quantity === 'time' ? column.unit.factor : /\bms\b|milli/.test(column.heading.name) ? 0.001 : 1;
  const last = written.length - 1;
  const interval = ((written[last]! - written[0]!) / last) * factor;
  const typical = medianStep(written) * factor;
  if (!(typical > 0)) unusableFile({ file: table.file, column: column.index + 1 }, 'the time does not move on');
  written.forEach((time, i) => {
    const step = i === 0 ? typical : (time - written[i - 1]!) * factor;
    if (Math.abs(step - typical) > MOST_JITTER * typical + 1e-9) {
      const place = { file: table.file, row: table.body[i]!.line, column: column.index + 1 };
      unusableFile(
        place,
        `the time moves on by ${step.toFixed(4)} s, elsewhere by ${typical.toFixed(4)} s: samples are lost`,
      );
    }
  });
  return { sampleRateHz: tidyRate(1 / interval), startS: written[0]! * factor };
}

function medianStep(times: Float64Array): number {
  const steps = times
    .slice(1)
    .map((time, i) => time - times[i]!)
    .sort();
  return steps[Math.floor(steps.length / 2)] ?? 0;
}

/** A clock written to the millisecond gives 999.9999 Hz: whole rates are meant. */
function tidyRate(rateHz: number): number {
  const whole = Math.round(rateHz);
  return Math.abs(rateHz - whole) / rateHz < 1e-3 ? whole : rateHz;
}

function declaredClock(table: RecognisedTable): Omit<TimeSeries, 'channels'> {
  const text = table.context.find('sample rate', 'sampling rate', 'rate', 'frequency', 'hz') ?? '';
  const rate = Number(/[\d.]+/.exec(text)?.[0]);
  if (!(rate > 0)) unusableFile({ file: table.file }, 'neither a column of times nor a sample rate');
  return { sampleRateHz: rate, startS: 0 };
}
