import { parse, CsvError } from 'csv-parse/sync';
import type { DecodedText } from '#src/services/import/decodeText.ts';
import { sniffDelimiter, type Delimiter } from '#src/services/import/sniffDelimiter.ts';
import { unusableFile } from '#src/services/import/unusableFile.ts';

/** One row of a table, with the line of the file it begins on. */
export interface SourceRow {
  line: number;
  cells: readonly string[];
}

/** A file cut into rows of trimmed cells; empty rows and comment lines are not among them. */
export interface SourceTable {
  file: string;
  delimiter: Delimiter;
  rows: readonly SourceRow[];
  comments: readonly { line: number; text: string }[];
  notes: readonly string[];
}

const MOST_ROWS = 200_000;
const MOST_COLUMNS = 600;
const LONGEST_LINE = 100_000;

/**
 * Cuts a file's text into rows.
 *
 * @throws {AppError} invalid with file, row and column for a quote that is never closed, or a table beyond the caps
 */
export function parseTable({ text, note }: DecodedText, file: string): SourceTable {
  const comments: { line: number; text: string }[] = [];
  let declared: Delimiter | null = null;
  const lines = text.split('\n').map((line, i) => {
    if (line.length > LONGEST_LINE) {
      unusableFile({ file, row: i + 1 }, `the line is longer than ${LONGEST_LINE} characters`);
    }
    const separator = i === 0 ? /^"?sep=(.)"?$/i.exec(line.trim())?.[1] : undefined;
    if (separator) declared = separator as Delimiter;
    const comment = separator ? null : commentOf(line);
    if (comment !== null) comments.push({ line: i + 1, text: comment });
    return separator || comment !== null ? '' : line;
  });
  if (lines.length > MOST_ROWS) unusableFile({ file, row: MOST_ROWS }, `more than ${MOST_ROWS} rows`);
  const delimiter = declared ?? sniffDelimiter(lines);
  const rows = cut(lines.join('\n'), delimiter, file);
  const wide = rows.find(({ cells }) => cells.length > MOST_COLUMNS);
  if (wide) unusableFile({ file, row: wide.line, column: MOST_COLUMNS }, `more than ${MOST_COLUMNS} columns`);
  return { file, delimiter, rows, comments, notes: note === null ? [] : [note] };
}

/** A line that begins with a hash or two slashes is a comment, unless the hash is the heading of a numbered column. */
function commentOf(line: string): string | null {
  const found = /^\s*(?:"\s*)?(#+(?!["\s]*[,;\t|])|\/\/)\s*(.*?)"?[,;\t|]*\s*$/.exec(line);
  return found ? found[2]! : null;
}

function cut(text: string, delimiter: Delimiter, file: string): SourceRow[] {
  try {
    const records = parse(text, {
      delimiter,
      relax_column_count: true,
      relax_quotes: true,
      skip_empty_lines: false,
      info: true,
      trim: delimiter !== '\t',
      max_record_size: LONGEST_LINE,
    }) as unknown as { record: string[]; info: { lines: number } }[];
    let line = 1;
    const rows = records.map(({ record, info }) => {
      const row = { line, cells: record.map((cell) => cell.trim()) };
      line = info.lines + 1;
      return row;
    });
    return rows.filter(({ cells }) => cells.some((cell) => cell !== ''));
  } catch (error) {
    if (!(error instanceof CsvError)) throw error;
    const row = typeof error['lines'] === 'number' ? error['lines'] : undefined;
    const column = typeof error['column'] === 'number' ? error['column'] + 1 : undefined;
    const unclosed = error.code === 'CSV_QUOTE_NOT_CLOSED';
    return unusableFile(
      { file, row, column },
      unclosed ? 'a quotation mark is never closed' : 'cannot be cut into cells',
    );
  }
}
