import type { Sex } from '#src/domain/growth/sex.ts';

/** The measure that Moore's first formula multiplies the age by, cm: sitting height for boys, stature for girls. */
export interface MooreInput {
  sex: Sex;
  age: number;
  stature: number;
  sittingHeight?: number | undefined;
}

/**
 * Years from peak height velocity after Moore: boys from age and sitting height, girls from age and stature. The boys'
 * intercept is −8.128741; one open table misprints it as −8.125741.
 *
 * Source: Moore 2015, Medicine & Science in Sports & Exercise 47:1755–1764; error in other samples 0.85–0.89 (boys),
 * 0.65–0.70 (girls) years.
 *
 * @param input age in years, heights in cm
 * @returns years, negative before peak height velocity; null for a boy without a sitting height
 * @example mooreOffset({ sex: 'male', age: 12, stature: 150, sittingHeight: 78 }) // → −1.544355
 */
export function mooreOffset({ sex, age, stature, sittingHeight }: MooreInput): number | null {
  if (sex === 'female') return -7.709133 + 0.0042232 * age * stature;
  return sittingHeight === undefined ? null : -8.128741 + 0.0070346 * age * sittingHeight;
}
