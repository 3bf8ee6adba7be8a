import { growthBand } from '#src/domain/growth/growthBand.ts';
import type { Sex } from '#src/domain/growth/sex.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';
import { Z90 } from '#src/domain/statistics/z90.ts';

/** Growth velocity and its standard error (cm a year), the days it was measured over, and the athlete's sex. */
export interface GrowthCautionInput {
  velocity: number;
  standardError: number;
  days: number;
  sex: Sex;
}

/**
 * The caution that stands on a record while a child grows fast: growth in the spurt-like band over 150 days or more.
 *
 * Source: faster growth goes with bone and growth-plate injuries (Wik 2020, n = 74; Monasterio 2022); the band is our
 * own proposal, no published cut-off.
 *
 * @returns a plain sentence with the rate and its interval, or null
 * @throws {RangeError} if a figure is not finite, or the error or the days negative
 * @example growthCaution({ velocity: 6, standardError: 0.8, days: 182, sex: 'male' }) // → null
 */
export function growthCaution({ velocity, standardError, days, sex }: GrowthCautionInput): string | null {
  requireFiniteNumber('growthCaution', 'standardError', standardError, { min: 0 });
  if (growthBand(sex, velocity, days) !== 'spurt-like') return null;
  const [low, high] = [velocity - Z90 * standardError, velocity + Z90 * standardError];
  return (
    `Growing fast: ${velocity.toFixed(1)} cm a year over ${days} days (90 % interval ${low.toFixed(1)} to ${high.toFixed(1)}). ` +
    'Bones and growth plates take load less well now: ask about heel, knee, hip and back pain before adding jumps or driver balls.'
  );
}
