import type { Sex } from '#src/domain/growth/sex.ts';

/**
 * Years from peak height velocity after Moore, from age and sitting height. The boys' intercept is −8.128741; one
 * open table misprints it as −8.125741.
 *
 * Source: Moore 2015, Medicine & Science in Sports & Exercise 47:1755–1764; error in other samples 0.85–0.89 (boys),
 * 0.65–0.70 (girls) years.
 *
 * @param input age in years, sitting height in cm
 * @returns years, negative before peak height velocity
 * @example mooreOffset({ sex: 'male', age: 12, sittingHeight: 78 }) // → −1.544355
 */
export function mooreOffset({ sex, age, sittingHeight }: { sex: Sex; age: number; sittingHeight: number }): number {
  return sex === 'male' ? -8.128741 + 0.0070346 * age * sittingHeight : -7.709133 + 0.0042232 * age * sittingHeight;
}
