/** One figure of a calculator's answer: its place, its name with the unit, and itself in words. */
export interface FigureRow {
  path: string;
  label: string;
  /** One line, or a line each; empty where there is no figure. */
  lines: string[];
  numeric: boolean;
  /** Set for a figure of one part of a list, as of one shot. */
  part?: FigurePart;
}

/** Which part of which list a figure belongs to, and as what. */
export interface FigurePart {
  list: string;
  index: number;
  /** Of the part: its own, or its number. */
  name: string;
  figure: string;
}

const MOST_LISTED = 30;

/**
 * An answer of the Method API as rows, in its own order. `reason` is left out: it belongs beside them.
 *
 * @param labels names by path; `*` stands for any index, an empty name leaves the part out
 */
export function figureRows(answer: object, labels: Readonly<Record<string, string>>): FigureRow[] {
  const { reason: _, ...figures } = answer as Record<string, unknown>;
  return rowsOf(figures, '', undefined, labels);
}

type Labels = Readonly<Record<string, string>>;
type Place = Omit<FigurePart, 'figure'>;

function rowsOf(value: unknown, path: string, within: Place | undefined, labels: Labels): FigureRow[] {
  const named = labels[path] ?? labels[path.replace(/\.\d+(?=\.|$)/g, '.*')];
  if (named === '') return [];
  const lines = linesOf(value);
  if (lines !== null) {
    const figure = named ?? path.split('.').at(-1)!;
    const row = { path, lines, numeric: typeof value === 'number' || isNumbers(value) };
    return [
      within ? { ...row, label: `${within.name}: ${figure}`, part: { ...within, figure } } : { ...row, label: figure },
    ];
  }
  return Object.entries(value as object).flatMap(([key, part]) => {
    if (key === 'name') return [];
    const below = path === '' ? key : `${path}.${key}`;
    if (!Array.isArray(value)) return rowsOf(part, below, within, labels);
    const place = { list: labels[path] ?? path, index: Number(key), name: nameOf(part, key, labels) };
    return rowsOf(part, below, place, labels);
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
