import type { Unit } from '#src/domain/units/unitTable.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/**
 * The inverse of `toSi`: a value in the product's base unit, written in `unit`.
 *
 * @param baseValue finite number in the base unit of the unit's quantity
 * @param unit      a unit of the table
 * @throws {RangeError} if the value is not finite
 * @example fromSi(91.44, parseUnit('yd')!) // → 100
 */
export function fromSi(baseValue: number, unit: Unit): number {
  requireFiniteNumber('fromSi', 'baseValue', baseValue);
  return baseValue / unit.factor - unit.offset;
}
