import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/**
 * Symmetry angle, `(45° − atan(XL/XR))/90° · 100`, with 180° taken off first where the bracket exceeds 90°.
 * Needs no reference limb and is defined for opposite signs.
 *
 * Source: Zifchock et al. 2008, Gait Posture 27:622–7 (constants from memory), cited by Exell et al. 2012.
 *
 * @param right XR, any unit; the product passes the lead leg
 * @param left  XL, same unit; the product passes the trail leg
 * @returns per cent, positive where `right` is the larger of two positive values; null where both are 0
 * @throws {RangeError} if a value is not finite
 * @example symmetryAngle(25, 20) // → 7.044657
 */
export function symmetryAngle(right: number, left: number): number | null {
  requireFiniteNumber('symmetryAngle', 'right', right);
  requireFiniteNumber('symmetryAngle', 'left', left);
  if (right === 0 && left === 0) return null;
  // `+ 0` turns −0 into 0, which would otherwise send the arctangent to the other end
  const degrees = 45 - (Math.atan((left + 0) / (right + 0)) * 180) / Math.PI;
  return ((degrees > 90 ? degrees - 180 : degrees) / 90) * 100;
}
