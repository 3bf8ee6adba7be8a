import type { FormField, FormTexts, LineColumn } from '#src/schemas/method/form/formField.ts';

/** The texts with which a form makes this request: `bodyOf` the other way round. */
export function textsOf(fields: readonly FormField[], body: unknown): FormTexts {
  return Object.fromEntries(fields.map((field) => [field.path, textOf(field, at(body, field.path.split('.')))]));
}

function at(value: unknown, [key, ...rest]: string[]): unknown {
  if (key === undefined || value === undefined || value === null) return value;
  return at((value as Record<string, unknown>)[key], rest);
}

function textOf(field: FormField, value: unknown): string {
  if (value === undefined || value === null) return '';
  switch (field.kind) {
    case 'flag':
      return value ? 'yes' : 'no';
    case 'numbers':
    case 'samples':
      return (value as number[]).join(' ');
    case 'table':
      return (value as unknown[][]).map((row) => row.join(' ')).join('\n');
    case 'rows':
      return (value as Record<string, unknown>[])
        .map((row) => lineOf(field.columns, row))
        .join(field.oneLine ? '; ' : '\n');
    default:
      return String(value);
  }
}

function lineOf(columns: readonly LineColumn[], row: Record<string, unknown>): string {
  const cells = columns.map(({ name }) => row[name]);
  const last = cells.findLastIndex((cell) => cell !== undefined && cell !== null);
  return cells
    .slice(0, last + 1)
    .map((cell) => (cell === undefined || cell === null ? '-' : cell === true ? 'yes' : cell === false ? 'no' : cell))
    .join(' ');
}
