import { cdc2000Lms, CDC2000_MAX_MONTHS, CDC2000_MIN_MONTHS } from '#src/domain/growth/cdc2000Lms.ts';
import { lmsZ } from '#src/domain/growth/lmsZ.ts';
import type { Lms } from '#src/domain/growth/lmsValue.ts';
import type { GrowthMeasure } from '#src/domain/growth/cdc2000.ts';
import type { Sex } from '#src/domain/growth/sex.ts';
import { normalCdf } from '#src/domain/statistics/normalCdf.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** Stature in cm, weight in kg or body-mass index in kg/m² at an age in months; or a reference of one's own. */
export type GrowthCentileInput =
  { measure: GrowthMeasure; sex: Sex; ageMonths: number; value: number } | { lms: Lms; value: number };

/** The reference used, the standard score and the centile (0 to 100). */
export interface GrowthCentileResult {
  l: number | null;
  m: number | null;
  s: number | null;
  z: number | null;
  centile: number | null;
  reason: string | null;
}

/**
 * Where a child's measure stands in a growth reference: the CDC 2000 charts, interpolated in age, or the given L, M, S.
 * Very high weights and body-mass indices need the CDC's extended method, which this is not.
 *
 * Sources: US Centers for Disease Control and Prevention, growth charts of 2000; LMS after Cole & Green 1992.
 *
 * @returns all null with a reason outside 72.5 to 240 months
 * @throws {RangeError} if a number is not finite, or the value, M, S or the age is not positive
 * @example growthCentile({ measure: 'stature', sex: 'male', ageMonths: 120.5, value: 145 }).centile // → 82.24
 */
export function growthCentile(input: GrowthCentileInput): GrowthCentileResult {
  requireFiniteNumber('growthCentile', 'value', input.value, { above: 0 });
  const lms = 'lms' in input ? input.lms : cdc2000Lms(input);
  if (lms === null) {
    const reason = `the CDC 2000 table covers ${CDC2000_MIN_MONTHS} to ${CDC2000_MAX_MONTHS} months of age`;
    return { l: null, m: null, s: null, z: null, centile: null, reason };
  }
  const z = lmsZ(lms, input.value);
  if (!Number.isFinite(z)) {
    const reason = 'the value is too far from this reference for a standard score';
    return { l: lms.l, m: lms.m, s: lms.s, z: null, centile: null, reason };
  }
  return { l: lms.l, m: lms.m, s: lms.s, z, centile: 100 * normalCdf(z), reason: null };
}
