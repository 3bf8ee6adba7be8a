/** The mark between units and tenths. */
export type DecimalMark = ',' | '.';

/** A number read from text, with whatever stood after it (`null` where nothing did). */
export interface ParsedNumber {
  value: number;
  unit: string | null;
}

const SPACES = /[\s\u00a0\u2007\u2009\u202f]+/g;
const SHAPE =
  /^([+\-\u2212\u2013]?) ?((?:\d|[.,](?=\d)| (?=\d{3}(?!\d)))+)(?:e([+-]?\d{1,3}))?(?: ?([a-z°º"'″′”’%µ([].*))?$/i;
const GROUPED_INTEGER = /^[1-9]\d{0,2}(?:([ .,])\d{3})(?:\1\d{3})*$/;

/**
 * Reads a number as people and devices write it, with a decimal comma or point, thousands set apart, a true minus
 * sign, and a unit behind it. Text that can be read two ways is refused, not guessed: `1,234` is 1.234 in one file
 * and 1234 in another. A lone point is read as the decimal mark, which every device's own number format uses.
 *
 * @param text    one cell
 * @param decimal the file's decimal mark, where it is known; then the other mark may only set thousands apart
 * @returns the value and the raw text of the unit, or null where it is no single finite number
 * @example parseNumber('1 234,5 N') // → { value: 1234.5, unit: 'N' }
 * @example parseNumber('1,234')     // → null; parseNumber('1,234', ',') → 1.234
 */
export function parseNumber(text: string, decimal?: DecimalMark): ParsedNumber | null {
  const parts = SHAPE.exec(text.replace(SPACES, ' ').trim());
  if (!parts) return null;
  const digits = plainDigits(parts[2] ?? '', decimal);
  if (digits === null) return null;
  const sign = parts[1] === '' || parts[1] === '+' ? 1 : -1;
  const value = sign * Number(parts[3] === undefined ? digits : `${digits}e${parts[3]}`);
  return Number.isFinite(value) ? { value: value === 0 ? 0 : value, unit: parts[4]?.trim() || null } : null;
}

/** The digits with a point as decimal mark and no grouping, or null where the marks contradict or leave a doubt. */
function plainDigits(body: string, decimal: DecimalMark | undefined): string | null {
  const commas = body.split(',').length - 1;
  const points = body.split('.').length - 1;
  if (commas > 1 && points > 1) return null;
  const mark = decimal ?? decimalMarkWithin(body, commas, points);
  if (mark === null) return null;
  const [whole = '', fraction, ...more] = mark === 'none' ? [body] : body.split(mark);
  if (more.length > 0 || (fraction !== undefined && /\D/.test(fraction))) return null;
  const plain = /\D/.test(whole) ? ungrouped(whole) : whole;
  if (plain === null) return null;
  return fraction === undefined ? plain : `${plain === '' ? '0' : plain}.${fraction}`;
}

function decimalMarkWithin(body: string, commas: number, points: number): DecimalMark | 'none' | null {
  if (commas === 0 && points === 0) return 'none';
  if (commas > 0 && points > 0) return body.lastIndexOf(',') > body.lastIndexOf('.') ? ',' : '.';
  if (commas + points > 1) return 'none';
  if (points === 1) return '.';
  const readableAsThousands = GROUPED_INTEGER.test(body) && !body.includes(' ');
  return readableAsThousands ? null : ',';
}

function ungrouped(whole: string): string | null {
  return GROUPED_INTEGER.test(whole) ? whole.replace(/\D/g, '') : null;
}
