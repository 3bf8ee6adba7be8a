import type { FormField } from '#src/schemas/method/form/formField.ts';

/** What is wrong with one field of a form, or, without a path, with the request as a whole. */
export interface PlacedError {
  path: string | null;
  message: string;
}

/**
 * The errors of a request, each beside the field that it comes from, one a field; deeper places are said in words.
 *
 * @param errors as the API gives them
 */
export function placeErrors(
  fields: readonly FormField[],
  errors: readonly { path: string; message: string }[],
): PlacedError[] {
  const placed = new Map<string | null, PlacedError>();
  for (const { path, message } of errors) {
    const field = fieldOf(fields, path);
    const key = field?.path ?? null;
    if (placed.has(key)) continue;
    const where = field ? whereIn(field, path) : '';
    placed.set(key, { path: key, message: `${where}${where === '' || field === undefined ? '' : ': '}${message}` });
  }
  return [...placed.values()];
}

function fieldOf(fields: readonly FormField[], path: string): FormField | undefined {
  const holding = fields
    .filter((field) => path === field.path || path.startsWith(`${field.path}.`))
    .sort((a, b) => b.path.length - a.path.length)[0];
  return holding ?? fields.find((field) => field.path.startsWith(`${path}.`));
}

function whereIn(field: FormField, path: string): string {
  const [index, name] = path.slice(field.path.length + 1).split('.');
  if (!path.startsWith(`${field.path}.`) || !index) return '';
  const number = Number(index) + 1;
  if (!Number.isInteger(number)) return '';
  if (field.kind === 'numbers' || field.kind === 'samples') return `Value ${number}`;
  if (name === undefined) return `Line ${number}`;
  if (field.kind === 'table') return `Line ${number}, value ${Number(name) + 1}`;
  const label = field.kind === 'rows' ? field.columns.find((column) => column.name === name)?.label : undefined;
  return `Line ${number}, ${label ? label.toLowerCase() : name}`;
}
