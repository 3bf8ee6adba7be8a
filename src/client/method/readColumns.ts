/** A file of samples as columns; the rate where the first column is a time. */
export interface FileColumns {
  /** Headings, or `Column 1` and so on; without the time. */
  names: string[];
  columns: number[][];
  sampleRate: number | null;
}

const STEADY = 0.02;

/**
 * Reads a table of samples: separators `;`, tab, comma or spaces, `,` or `.` as decimal mark, any lines of words before
 * the samples. A first column that rises steadily is the time (ms where its heading says so) or the sample's number.
 *
 * @throws {RangeError} with a sentence for the person, if there are no samples or a line is broken
 */
export function readColumns(text: string): FileColumns {
  const lines = text.replace(/^\uFEFF/, '').split(/\r\n|\r|\n/);
  const separator = separatorOf(lines);
  const cellsOf = (line: string) =>
    line
      .trim()
      .split(separator)
      .map((cell) => cell.trim().replace(/^"|"$/g, ''));
  const decimalComma = separator !== ',' && lines.some((line) => /\d,\d/.test(line));
  const numberOf = (cell: string) => (cell === '' ? NaN : Number(decimalComma ? cell.replace(',', '.') : cell));

  const first = lines.findIndex(
    (line) => line.trim() !== '' && cellsOf(line).every((cell) => !Number.isNaN(numberOf(cell))),
  );
  if (first === -1) throw new RangeError('There are no samples in this file');
  const width = cellsOf(lines[first]!).length;
  const columns = Array.from({ length: width }, (): number[] => []);
  for (let i = first; i < lines.length; i += 1) {
    if (lines[i]!.trim() === '') continue;
    const numbers = cellsOf(lines[i]!).map(numberOf);
    if (numbers.length !== width || numbers.some((value) => !Number.isFinite(value))) {
      throw new RangeError(`Line ${i + 1} does not hold ${width} ${width === 1 ? 'number' : 'numbers'}`);
    }
    numbers.forEach((value, column) => columns[column]!.push(value));
  }
  const heading = first > 0 ? cellsOf(lines[first - 1]!) : [];
  const names = columns.map((_, i) => (heading.length === width && heading[i] ? heading[i] : `Column ${i + 1}`));
  return withoutTime(names, columns);
}

function separatorOf(lines: readonly string[]): string | RegExp {
  const isSample = (line: string) => /^\s*"?[-+]?[\d.,]/.test(line);
  const first = lines.findIndex(isSample);
  const samples = lines.slice(Math.max(0, first)).filter(isSample).slice(0, 50);
  for (const separator of [';', '\t']) if (samples.some((line) => line.includes(separator))) return separator;
  const commas = (line: string) => (line.match(/,/g) ?? []).length;
  if (samples.some((line) => commas(line) > 1 || (line.includes(',') && line.includes('.')))) return ',';
  if (samples.every((line) => commas(line) === 0) || samples.some((line) => /\S\s+\S/.test(line.trim()))) return /\s+/;
  // One comma a line: it parts two columns if the heading has one too, or if what stands before it counts up
  // from 0 or 1.
  const before = samples.map((line) => Number(line.split(',')[0]));
  const step = (before[1] ?? 0) - before[0]!;
  const countsUp = before[0]! <= 1 && step > 0 && before.every((value, i) => value === before[0]! + i * step);
  return countsUp || (first > 0 && lines[first - 1]!.includes(',')) ? ',' : /\s+/;
}

function withoutTime(names: string[], columns: number[][]): FileColumns {
  const [time, ...rest] = columns;
  if (!time || rest.length === 0 || time.length < 3) return { names, columns, sampleRate: null };
  const step = (time.at(-1)! - time[0]!) / (time.length - 1);
  const steady =
    step > 0 && time.every((value, i) => Math.abs(value - time[0]! - i * step) <= Math.max(STEADY * step, step / 2));
  if (!steady) return { names, columns, sampleRate: null };
  const isCount = Math.abs(step - 1) < 1e-9;
  const inMs = /\bms\b|msec|millisec/i.test(names[0]!);
  const rate = inMs ? 1000 / step : isCount ? null : 1 / step;
  return { names: names.slice(1), columns: rest, sampleRate: rate === null ? null : Number(rate.toPrecision(6)) };
}
