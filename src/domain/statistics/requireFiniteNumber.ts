/** Bounds of `requireFiniteNumber`: `min` is allowed itself, `above` is not; `max` is allowed itself. */
export interface NumberBounds {
  min?: number;
  above?: number;
  max?: number;
}

/**
 * Guard for one number at the door of a domain function.
 *
 * @param caller name of the function that requires the number, for the message
 * @param field  name of the number
 * @param value  the number
 * @param bounds the range allowed
 * @throws {RangeError} if the number is not finite or out of range
 */
export function requireFiniteNumber(caller: string, field: string, value: number, bounds: NumberBounds = {}): void {
  const { min, above, max } = bounds;
  if (!Number.isFinite(value)) throw new RangeError(`${caller} requires a finite ${field}, got ${value}`);
  if (min !== undefined && value < min) throw new RangeError(`${caller} requires ${field} ≥ ${min}, got ${value}`);
  if (above !== undefined && value <= above)
    throw new RangeError(`${caller} requires ${field} > ${above}, got ${value}`);
  if (max !== undefined && value > max) throw new RangeError(`${caller} requires ${field} ≤ ${max}, got ${value}`);
}
