import type { Sex } from '#src/domain/growth/sex.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** How fast a child grows, in words. */
export type GrowthBand = 'slow' | 'usual' | 'spurt-like' | 'too soon to say';

/** The rate from which growth is called spurt-like, cm a year. Our own proposal, no published cut-off. */
export const SPURT_LIKE_CM_PER_YEAR: Readonly<Record<Sex, number>> = Object.freeze({ female: 7, male: 8 });

/** The shortest time over which growth is put into a band: below it the measurement error hides the rate. */
export const GROWTH_BAND_MIN_DAYS = 150;

const SLOW_BELOW_CM_PER_YEAR = 4;

/**
 * The band of a growth velocity: under 4 cm a year slow, spurt-like from 7 (girls) or 8 (boys), else usual. Over less
 * than 150 days none is named: with 0.3 cm of measurement error a rate over 91 days is uncertain by ±2.8 cm a year.
 *
 * Source: our own proposal, no published cut-off (SCIENCE §5).
 *
 * @param perYear cm a year, from `growthVelocity`
 * @param days    between the two statures, from `growthVelocity`
 * @throws {RangeError} if either is not finite or the days are negative
 * @example growthBand('male', 8.2, 182) // → 'spurt-like'
 */
export function growthBand(sex: Sex, perYear: number, days: number): GrowthBand {
  requireFiniteNumber('growthBand', 'perYear', perYear);
  requireFiniteNumber('growthBand', 'days', days, { min: 0 });
  if (days < GROWTH_BAND_MIN_DAYS) return 'too soon to say';
  if (perYear < SLOW_BELOW_CM_PER_YEAR) return 'slow';
  return perYear >= SPURT_LIKE_CM_PER_YEAR[sex] ? 'spurt-like' : 'usual';
}
