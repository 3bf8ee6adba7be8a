import type { Unit } from '#src/domain/units/unitTable.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/**
 * A value in the product's base unit of its quantity: SI, with angles in degrees, rates in revolutions a minute and
 * temperatures in degrees Celsius, as the record keeps them.
 *
 * @param value finite number in `unit`
 * @param unit  a unit of the table
 * @throws {RangeError} if the value is not finite
 * @example toSi(100, parseUnit('yd')!) // → 91.44
 */
export function toSi(value: number, unit: Unit): number {
  requireFiniteNumber('toSi', 'value', value);
  return (value + unit.offset) * unit.factor;
}
