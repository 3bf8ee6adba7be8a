import { AppError } from '#src/errors/appError.ts';
import { decodeText } from '#src/services/import/decodeText.ts';
import { parseTable } from '#src/services/import/parseTable.ts';
import type { FolderFile } from '#src/services/import/readFolder.ts';
import { recogniseTable, type RecognisedTable } from '#src/services/import/recogniseTable.ts';
import type { ReportLine } from '#src/services/import/seasonReport.ts';

/** The tables of a folder that were understood, and the report's lines about the files that were not. */
export interface RecognisedFolder {
  tables: RecognisedTable[];
  lines: ReportLine[];
}

/** Cuts and recognises every file. One that cannot be is refused as a whole; the rest goes on. */
export function recogniseFolder(files: readonly FolderFile[], others: readonly string[]): RecognisedFolder {
  const tables: RecognisedTable[] = [];
  const lines: ReportLine[] = others.map((path) => fileLine(path, 'left out', 'not a table of text'));
  for (const { path, bytes } of files) {
    try {
      const table = recogniseTable(parseTable(decodeText(bytes, path), path));
      if (table === null) lines.push(fileLine(path, 'refused', 'no row of headings says what this file is'));
      else {
        tables.push(table);
        lines.push(...table.notes.map((note) => fileLine(path, 'note', note)));
      }
    } catch (error) {
      lines.push(unusableLine(path, 'file', error));
    }
  }
  for (const line of lines)
    if (line.verdict === 'refused') line.kind = recordingKindBeside(line.file, tables) ?? 'file';
  return { tables, lines };
}

const FEWEST_NEIGHBOURS = 3;

/** A file that cannot be read, in a folder of nothing but traces or curves, is one of them: it counts as refused. */
function recordingKindBeside(path: string, tables: readonly RecognisedTable[]): 'traces' | 'curves' | null {
  const folderOf = (file: string) => file.slice(0, file.lastIndexOf('/') + 1);
  const beside = tables.filter(({ file }) => folderOf(file) === folderOf(path));
  const all = (kind: RecognisedTable['kinds'][number]) => beside.every(({ kinds }) => kinds[0] === kind);
  if (beside.length < FEWEST_NEIGHBOURS) return null;
  return all('ground trace') ? 'traces' : all('force curve') ? 'curves' : null;
}

/** A line about a whole file. */
export const fileLine = (file: string, verdict: ReportLine['verdict'], reason: string): ReportLine => ({
  ...{ file, row: 0, column: 0, kind: 'file', what: '', verdict, reason },
});

/** The line of a file that cannot be read, with the place that its error names. Other errors go on. */
export function unusableLine(file: string, kind: ReportLine['kind'], error: unknown): ReportLine {
  if (!(error instanceof AppError) || error.code !== 'invalid') throw error;
  const place = error.fields[0]?.path ?? '';
  const number = (word: string) => Number(new RegExp(`, ${word} (\\d+)`).exec(place)?.[1] ?? 0);
  const reason = error.fields[0]?.message ?? error.message;
  return { file, row: number('row'), column: number('column'), kind, what: '', verdict: 'refused', reason };
}
