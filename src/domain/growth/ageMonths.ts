import { ageYears } from '#src/domain/growth/ageYears.ts';

/**
 * Decimal age in months of 30.4375 days, as the centile tables count it.
 *
 * @param bornOn date of birth, YYYY-MM-DD
 * @param on     date of the measure, YYYY-MM-DD
 * @throws {RangeError} if either is no calendar date, or `on` is before birth
 * @example ageMonths('2012-07-08', '2024-07-08') // → 144
 */
export function ageMonths(bornOn: string, on: string): number {
  return ageYears(bornOn, on) * 12;
}
