/**
 * Years from peak height velocity after Moore's second formula, from age and stature: boys only.
 *
 * Source: Moore 2015, Medicine & Science in Sports & Exercise 47:1755–1764.
 *
 * @param input age in years, stature in cm
 * @returns years, negative before peak height velocity
 * @example mooreStatureOffset({ age: 12, stature: 150 }) // → −1.497674
 */
export function mooreStatureOffset({ age, stature }: { age: number; stature: number }): number {
  return -7.999994 + 0.0036124 * age * stature;
}
