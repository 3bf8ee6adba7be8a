/** One figure of a calculator's answer: its place, its name with the unit, and itself in words. */
export interface FigureRow {
  path: string;
  label: string;
  /** One line, or a line each; empty where there is no figure. */
  lines: string[];
  numeric: boolean;
}

const MOST_LISTED = 30;

/**
 * An answer of the Method API as rows, in its own order. `reason` is left out: it belongs beside them.
 *
 * @param labels names by path; `*` stands for any index, an empty name leaves the part out
 */
export function figureRows(answer: object, labels: Readonly<Record<string, string>>): FigureRow[] {
  const { reason: _, ...figures } = answer as Record<string, unknown>;
  return rowsOf(figures, '', '', labels);
}

type Labels = Readonly<Record<string, string>>;

function rowsOf(value: unknown, path: string, prefix: string, labels: Labels): FigureRow[] {
  const named = labels[path] ?? labels[path.replace(/\.\d+(?=\.|$)/g, '.*')];
  if (named === '') return [];
  const lines = linesOf(value);
  if (lines !== null) {
    const label = `${prefix}${named ?? path.split('.').at(-1)!}`;
    return [{ path, label, lines, numeric: typeof value === 'number' || isNumbers(value) }];
  }
  return Object.entries(value as object).flatMap(([key, part]) => {
    if (key === 'name') return [];
    const below = path === '' ? key : `${path}.${key}`;
    return rowsOf(part, below, Array.isArray(value) ? `${nameOf(part, key, labels)}: ` : prefix, labels);
  });
}

function nameOf(part: unknown, index: string, labels: Labels): string {
  const { name } = part as { name?: string };
  return name === undefined ? String(Number(index) + 1) : (labels[name] ?? name);
}

const isNumbers = (value: unknown): value is number[] =>
  Array.isArray(value) && value.length > 0 && value.every((part) => typeof part === 'number');

/** A value in lines, or null where it has parts with names of their own. */
function linesOf(value: unknown): string[] | null {
  if (value === null || value === undefined) return [];
  if (typeof value === 'number') return [figureText(value)];
  if (typeof value === 'boolean') return [value ? 'yes' : 'no'];
  if (typeof value === 'string') return [value];
  if (isNumbers(value)) {
    if (value.length === 2) return [value.map(figureText).join(' to ')];
    return [value.length > MOST_LISTED ? `${value.length} numbers` : value.map(figureText).join(', ')];
  }
  if (!Array.isArray(value)) return null;
  return value.every((part) => typeof part === 'string') ? value : null;
}

/**
 * A figure to eight digits, enough to check it against a book.
 *
 * @example figureText(-10.714285714) // → '−10.714286'
 */
export const figureText = (value: number): string => String(Number(value.toPrecision(8))).replace('-', '−');
