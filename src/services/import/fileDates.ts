import { parseDate, type DateOrder } from '#src/domain/units/parseDate.ts';

const SHAPES = [
  /(?<!\d)(\d{4}[-._ ]\d{1,2}[-._ ]\d{1,2})(?!\d)/,
  /(?<!\d)(20\d{2}[01]\d[0-3]\d)(?!\d)/,
  /(?<!\d)(\d{1,2}[-._ ]\d{1,2}[-._ ]\d{4})(?!\d)/,
  /(?<!\d)(\d{1,2}(?:st|nd|rd|th)?[-._ ]?[a-z]{3,9}[-._ ]?\d{4})(?!\d)/i,
  /(?<!\d)(\d{1,2}[-._ ]\d{1,2}[-._ ]\d{2})(?!\d)/,
];

/** The date written in a file's path, its own name before its folders', or null. */
export function dateInName(path: string, order: DateOrder | null): string | null {
  for (const part of path.split('/').reverse()) {
    for (const text of datesWritten(part)) {
      const date = parseDate(text, order);
      if (date !== null) return date;
    }
  }
  return null;
}

/** Texts in a file's path that look like dates, rewritten as a table would hold them. */
export function datesWritten(path: string): string[] {
  return SHAPES.flatMap((shape) => {
    const text = shape.exec(path)?.[1];
    if (text === undefined) return [];
    if (/^\d{8}$/.test(text)) return [`${text.slice(0, 4)}-${text.slice(4, 6)}-${text.slice(6)}`];
    const named = /^(\d{1,2})\D*?[-._ ]?([a-z]{3,9})[-._ ]?(\d{4})$/i.exec(text.replace(/(\d)(st|nd|rd|th)/i, '$1'));
    return [named ? `${named[1]} ${named[2]} ${named[3]}` : text.replace(/[._ ]/g, '-')];
  });
}
