import type { TestQuantity } from '#src/domain/catalogue/catalogueTest.ts';
import { toSi } from '#src/domain/units/toSi.ts';
import { BASE_SYMBOL, UNITS, type Unit } from '#src/domain/units/unitTable.ts';

const GRAVITY_STANDARD = 9.80665;

/**
 * A value in the base unit of what is measured. A force written in kg or lb is a weight; a grip written in N is a mass.
 *
 * @returns null where the unit measures something else
 */
export function siValue(value: number, unit: Unit, quantity: TestQuantity | 'speed' | 'rate'): number | null {
  const base = toSi(value, unit);
  if (unit.quantity === quantity) return base;
  if (quantity === 'force' && unit.quantity === 'mass') return base * GRAVITY_STANDARD;
  if (quantity === 'mass' && unit.quantity === 'force') return base / GRAVITY_STANDARD;
  return null;
}

/** Units in which tests are written; a yard is told from a metre by nothing but its name. */
const TOLD_BY_SIZE = new Set(['N', 'kgf', 'm', 'cm', 'mm', 'in', 'ft', 's', 'ms']);
const FITS_WITHIN = 2;

/**
 * The unit of values that name none: the only one in which their median lies near what such values are, and by far.
 *
 * @param typicalSi what such a value is, in the base unit
 * @returns null where no unit fits
 */
export function unitBySize(values: readonly number[], typicalSi: number, quantity: TestQuantity): Unit | null {
  const positive = values.filter((value) => value > 0).sort((a, b) => a - b);
  const middle = positive[Math.floor(positive.length / 2)];
  if (middle === undefined) return null;
  if (quantity === 'angle') return UNITS.find(({ symbol }) => symbol === BASE_SYMBOL.angle) ?? null;
  const near = UNITS.filter((unit) => unit.quantity === quantity && TOLD_BY_SIZE.has(unit.symbol))
    .map((unit) => ({ unit, miss: Math.abs(Math.log(toSi(middle, unit) / typicalSi)) }))
    .filter(({ miss }) => miss <= Math.log(FITS_WITHIN))
    .sort((a, b) => a.miss - b.miss);
  return near[0]?.unit ?? null;
}
