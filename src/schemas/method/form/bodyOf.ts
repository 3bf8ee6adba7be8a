import type { FormField, FormTexts, LineColumn } from '#src/schemas/method/form/formField.ts';
import { readNumber, readTokens } from '#src/schemas/method/form/readTokens.ts';

type Tree = { [key: string]: unknown } | unknown[];

/**
 * The request that a form's texts make. Empty fields are left out, so that the schema can say that they are missing; an
 * empty field of lines within a list of lists stays an empty list.
 *
 * @param texts what was written, by path
 */
export function bodyOf(fields: readonly FormField[], texts: FormTexts): unknown {
  const body: Tree = {};
  for (const field of fields) {
    const value = valueOf(field, (texts[field.path] ?? '').trim());
    if (value !== undefined) put(body, field.path.split('.'), value);
  }
  return body;
}

function valueOf(field: FormField, text: string): unknown {
  if (text === '') return field.kind === 'rows' && field.oneLine ? [] : undefined;
  switch (field.kind) {
    case 'number':
      return readNumber(text);
    case 'flag':
      return flagOf(text);
    case 'numbers':
    case 'samples':
      return text.split(/[\n;]/).flatMap(readTokens).map(readNumber);
    case 'table':
      return linesOf(text).map((line) => readTokens(line).map(readNumber));
    case 'rows':
      return linesOf(text).map((line) => rowOf(field.columns, readTokens(line)));
    default:
      return text;
  }
}

const linesOf = (text: string): string[] => text.split(/[\n;]/).filter((line) => line.trim() !== '');

const flagOf = (text: string): boolean | string =>
  /^(yes|true)$/i.test(text) ? true : /^(no|false)$/i.test(text) ? false : text;

const NOT_KNOWN = new Set(['-', '–', '—']);

function rowOf(columns: readonly LineColumn[], tokens: readonly string[]): Tree {
  const row: Tree = {};
  tokens.forEach((token, i) => {
    const column = columns[i];
    // A part too many becomes a field that the schema does not know, and says so.
    if (!column) row[`part ${i + 1}`] = token;
    else if (!(column.optional && NOT_KNOWN.has(token))) row[column.name] = cellOf(column, token);
  });
  return row;
}

function cellOf({ kind }: LineColumn, token: string): unknown {
  if (kind === 'number') return readNumber(token);
  return kind === 'flag' ? flagOf(token) : token;
}

function put(tree: Tree, [key, ...rest]: string[], value: unknown): void {
  const here = tree as Record<string, unknown>;
  if (rest.length === 0) here[key!] = value;
  else put((here[key!] ??= /^\d+$/.test(rest[0]!) ? [] : {}) as Tree, rest, value);
}
