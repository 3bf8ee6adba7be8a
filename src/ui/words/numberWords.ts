const MINUS = '−';
const NARROW_SPACE = '\u202f';

/**
 * A number as the screens show it: fixed decimals, a true minus, thousands parted by a narrow space, never `−0`.
 *
 * @param digits decimals
 * @example plainNumber(-1003.46, 1) // → '−1 003.5'
 */
export function plainNumber(value: number, digits = 0): string {
  const rounded = Math.abs(value).toFixed(digits);
  const [whole = '', decimals] = rounded.split('.');
  const parted = whole.replace(/\B(?=(\d{3})+$)/g, NARROW_SPACE);
  const sign = value < 0 && Number(rounded) !== 0 ? MINUS : '';
  return `${sign}${parted}${decimals === undefined ? '' : `.${decimals}`}`;
}

/**
 * A number whose sign matters, `+` included.
 *
 * @example signedNumber(7.4, 1) // → '+7.4'
 */
export function signedNumber(value: number, digits = 0): string {
  const plain = plainNumber(value, digits);
  return value > 0 && Number(value.toFixed(digits)) !== 0 ? `+${plain}` : plain;
}

/** An interval, `−11.4 to −4.6`. */
export const intervalWords = ([low, high]: readonly [number, number], digits = 0): string =>
  `${plainNumber(low, digits)} to ${plainNumber(high, digits)}`;
