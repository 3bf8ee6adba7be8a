import { wordsOf } from '#src/domain/catalogue/wordsOf.ts';
import type { SourceRow, SourceTable } from '#src/services/import/parseTable.ts';

/** What a file says about itself beside its table: comment lines and the rows above the headings. */
export interface FileContext {
  /** Keys as plain words, values as written, in the order of the file. */
  entries: readonly { key: string; value: string; line: number }[];
  /** The first value whose key is one of these. */
  find: (...keys: string[]) => string | null;
}

/**
 * Reads `key: value`, `key = value` and `key; value` from comments and from the rows above the headings.
 *
 * @param above rows before the headings
 */
export function fileContext({ comments }: Pick<SourceTable, 'comments'>, above: readonly SourceRow[]): FileContext {
  const entries = [
    ...comments.flatMap(({ line, text }) => text.split(/[;|,](?=[^;|,]*[:=])/).flatMap((part) => entryOf(part, line))),
    ...above.flatMap(({ line, cells }) => {
      const filled = cells.filter((cell) => cell !== '');
      const own = filled.flatMap((cell) => (/[:=]\s*\S/.test(cell) ? entryOf(cell, line) : []));
      if (own.length > 0) return own;
      const pairs: FileContext['entries'][number][] = [];
      for (let i = 0; i + 1 < filled.length; i += 2)
        pairs.push(...entryOf(`${bare(filled[i]!)}=${filled[i + 1]!}`, line));
      return pairs;
    }),
  ];
  return { entries, find: (...keys) => entries.find(({ key }) => keys.includes(key))?.value ?? null };
}

const bare = (text: string): string => text.replace(/[:=]\s*$/, '');

function entryOf(text: string, line: number): FileContext['entries'][number][] {
  const parts = /^\s*([^:=]+?)\s*[:=]\s*(.+?)\s*$/.exec(text);
  if (!parts) return [];
  const key = wordsOf(parts[1]!).join(' ');
  return key === '' ? [] : [{ key, value: parts[2]!, line }];
}
