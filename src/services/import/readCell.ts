import { parseNumber, type DecimalMark } from '#src/domain/units/parseNumber.ts';
import { parseUnit } from '#src/domain/units/parseUnit.ts';
import type { Unit } from '#src/domain/units/unitTable.ts';

/** What one cell says: nothing, a number with what stands behind it, or words. */
export type CellValue =
  | { kind: 'blank' }
  | { kind: 'number'; value: number; unit: Unit | null; remark: string }
  | { kind: 'words'; text: string };

const BLANK = /^(|[-–—.?_/\\*]+|n\.?\/?a\.?|nan|null|nil|none|missing|blank|absent|abs|dns|did not (start|attend))$/i;
const FEET = /^(\d{1,2})\s*(?:'|′|’|ft|feet|foot)\.?\s*(\d{1,2}(?:[.,]\d+)?)?\s*(?:"|″|”|''|in|ins|inch|inches)?\.?$/i;
const STONES = /^(\d{1,2})\s*(?:st|stone|stones)\.?\s*(?:(\d{1,2}(?:[.,]\d+)?)\s*(?:lbs?|pounds?)?)?\.?$/i;
const METRE = parseUnit('m');
const KILOGRAM = parseUnit('kg');
const POUND_KG = 0.45359237;
const INCH_M = 0.0254;

/** Whether a cell says nothing: empty, a dash, `n/a`. */
export const isBlankCell = (text: string): boolean => BLANK.test(text.trim());

/**
 * Reads a cell that should hold a measurement.
 *
 * @param decimal the file's decimal mark, where it is known
 * @returns a number with its own unit where the cell names one, and whatever words follow as a remark
 * @example readCell('43.4 kg')      // → 43.4, kg
 * @example readCell("5' 3\"")       // → 1.6002, m
 * @example readCell('13,6 slipped') // → 13.6, remark `slipped`
 */
export function readCell(text: string, decimal?: DecimalMark): CellValue {
  const bare = text.trim();
  if (isBlankCell(bare)) return { kind: 'blank' };
  const feet = FEET.exec(bare);
  if (feet) {
    const inches = Number(feet[1]) * 12 + plain(feet[2]);
    return { kind: 'number', value: inches * INCH_M, unit: METRE, remark: '' };
  }
  const stones = STONES.exec(bare);
  if (stones) {
    const pounds = Number(stones[1]) * 14 + plain(stones[2]);
    return { kind: 'number', value: pounds * POUND_KG, unit: KILOGRAM, remark: '' };
  }
  const marked = /^(.*[\d.])\s*([*!#†]+)$/.exec(bare);
  const parsed = parseNumber(marked ? marked[1]! : bare, decimal) ?? withRemark(bare, decimal);
  if (parsed === null) return { kind: 'words', text: bare };
  const { unit, remark } = behind(parsed.unit);
  return { kind: 'number', value: parsed.value, unit, remark: marked ? marked[2]! : remark };
}

/** `13,6; slipped`, `13.6 - void`: a number, a mark that no number holds, and words. */
function withRemark(text: string, decimal: DecimalMark | undefined): { value: number; unit: string | null } | null {
  const cut = /^([+\-−]?[\d., ]*\d(?:\s*[a-z°"'/]{1,5})?)\s*[-–—;:,(/]\s*([a-z].*)$/i.exec(text);
  const number = cut ? parseNumber(cut[1]!, decimal) : null;
  return number ? { value: number.value, unit: `${number.unit ?? ''} ${cut![2]!}`.trim() } : null;
}

function behind(text: string | null): { unit: Unit | null; remark: string } {
  if (text === null) return { unit: null, remark: '' };
  const whole = parseUnit(text);
  if (whole) return { unit: whole, remark: '' };
  const [first = '', ...rest] = text.split(/[\s(;]+/);
  const unit = parseUnit(first);
  return unit ? { unit, remark: rest.join(' ').replace(/\)$/, '') } : { unit: null, remark: text };
}

const plain = (digits: string | undefined): number => (digits === undefined ? 0 : Number(digits.replace(',', '.')));
