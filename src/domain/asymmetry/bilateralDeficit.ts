import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/**
 * Bilateral deficit, `100·both/(right + left) − 100`: negative where both legs together give less than
 * the sum of each alone.
 *
 * Source: collected in Bishop et al. 2016, Strength Cond J 38(6):27–32.
 *
 * @param bilateral value of both legs together, ≥ 0
 * @param right     value of the right leg alone, same unit, ≥ 0
 * @param left      value of the left leg alone, same unit, ≥ 0
 * @returns per cent, or null where both legs alone give 0
 * @throws {RangeError} if a value is negative or not finite
 * @example bilateralDeficit(40, 22, 20) // → −4.761905
 */
export function bilateralDeficit(bilateral: number, right: number, left: number): number | null {
  requireFiniteNumber('bilateralDeficit', 'bilateral', bilateral, { min: 0 });
  requireFiniteNumber('bilateralDeficit', 'right', right, { min: 0 });
  requireFiniteNumber('bilateralDeficit', 'left', left, { min: 0 });
  const sum = right + left;
  return sum === 0 ? null : (100 * bilateral) / sum - 100;
}
