import { parseNumber } from '#src/domain/units/parseNumber.ts';
import type { DecimalMark } from '#src/domain/units/parseNumber.ts';

/**
 * The decimal mark of a column or a file: the one mark under which every number in it can be read.
 *
 * @param texts cells; those that are no number under either mark are left out
 * @returns the mark, or null where both fit or neither does
 * @example decimalMark(['1,234', '13,4']) // → ','
 */
export function decimalMark(texts: readonly string[]): DecimalMark | null {
  let comma = true;
  let point = true;
  for (const text of texts) {
    const readsComma = parseNumber(text, ',') !== null;
    const readsPoint = parseNumber(text, '.') !== null;
    if (!readsComma && !readsPoint) continue;
    comma &&= readsComma;
    point &&= readsPoint;
  }
  if (comma === point) return null;
  return comma ? ',' : '.';
}
