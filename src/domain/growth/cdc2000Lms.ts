import { CDC2000 } from '#src/domain/growth/cdc2000.ts';
import type { GrowthMeasure } from '#src/domain/growth/cdc2000.ts';
import type { Lms } from '#src/domain/growth/lmsValue.ts';
import type { Sex } from '#src/domain/growth/sex.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** First age of the tables that we ship, months. */
export const CDC2000_MIN_MONTHS = 72.5;

/** Last age of the tables, months. */
export const CDC2000_MAX_MONTHS = 240;

/**
 * L, M and S of the CDC 2000 growth charts at an age, linear in each between the tabled ages.
 *
 * Source: US Centers for Disease Control and Prevention, growth charts of 2000 (public domain).
 *
 * @param reference which chart, and the age in months
 * @returns M in cm, kg or kg/m²; null outside 72.5 to 240 months
 * @throws {RangeError} if the age is not finite or negative
 * @example cdc2000Lms({ measure: 'stature', sex: 'male', ageMonths: 120.5 })?.m // → 138.8234114
 */
export function cdc2000Lms({
  measure,
  sex,
  ageMonths,
}: {
  measure: GrowthMeasure;
  sex: Sex;
  ageMonths: number;
}): Lms | null {
  requireFiniteNumber('cdc2000Lms', 'ageMonths', ageMonths, { min: 0 });
  if (ageMonths < CDC2000_MIN_MONTHS || ageMonths > CDC2000_MAX_MONTHS) return null;
  const rows = CDC2000[measure][sex];
  let upper = 1;
  while (rows[upper]![0] < ageMonths) upper += 1;
  const [fromAge, fromL, fromM, fromS] = rows[upper - 1]!;
  const [toAge, toL, toM, toS] = rows[upper]!;
  const part = (ageMonths - fromAge) / (toAge - fromAge);
  const between = (from: number, to: number) => (part === 1 ? to : from + part * (to - from));
  return { l: between(fromL, toL), m: between(fromM, toM), s: between(fromS, toS) };
}
