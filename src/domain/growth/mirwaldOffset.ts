import type { Sex } from '#src/domain/growth/sex.ts';

/**
 * Years from peak height velocity after Mirwald. The weight-for-height term is a percentage, 100 · kg ÷ cm: without
 * the 100 the result is wrong by about 0.6 years.
 *
 * Source: Mirwald 2002, Medicine & Science in Sports & Exercise 34:689–694; standard error of estimate 0.592 (boys),
 * 0.569 (girls) years.
 *
 * @param input age in years, stature and sitting height in cm, mass in kg
 * @returns years, negative before peak height velocity
 * @example mirwaldOffset({ sex: 'female', age: 12, stature: 151.5, sittingHeight: 79.5, mass: 41.8 }) // → −0.036325
 */
export function mirwaldOffset({
  sex,
  age,
  stature,
  sittingHeight,
  mass,
}: {
  sex: Sex;
  age: number;
  stature: number;
  sittingHeight: number;
  mass: number;
}): number {
  const leg = stature - sittingHeight;
  const weightByHeightPct = (100 * mass) / stature;
  if (sex === 'male') {
    return (
      -9.236 +
      0.0002708 * leg * sittingHeight -
      0.001663 * age * leg +
      0.007216 * age * sittingHeight +
      0.02292 * weightByHeightPct
    );
  }
  return (
    -9.376 +
    0.0001882 * leg * sittingHeight +
    0.0022 * age * leg +
    0.005841 * age * sittingHeight -
    0.002658 * age * mass +
    0.07693 * weightByHeightPct
  );
}
