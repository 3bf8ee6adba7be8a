/**
 * Age ÷ age at peak height velocity after Fransen: boys only. The intercept is +6.986547255416; one open table prints
 * a minus, which gives ratios near −13.
 *
 * Source: Fransen 2018, Pediatric Exercise Science 30:296–307.
 *
 * @param input age in years, stature and sitting height in cm, mass in kg
 * @returns ratio without unit, 1 at peak height velocity
 * @example fransenRatio({ age: 12, stature: 150, sittingHeight: 78, mass: 40 }) // → 0.870463
 */
export function fransenRatio({
  age,
  stature,
  sittingHeight,
  mass,
}: {
  age: number;
  stature: number;
  sittingHeight: number;
  mass: number;
}): number {
  const leg = stature - sittingHeight;
  return (
    6.986547255416 +
    0.115802846632 * age +
    0.001450825199 * age ** 2 +
    0.004518400406 * mass -
    0.000034086447 * mass ** 2 -
    0.151951447289 * stature +
    0.000932836659 * stature ** 2 -
    0.000001656585 * stature ** 3 +
    0.032198263733 * leg -
    0.000269025264 * leg ** 2 -
    0.000760897942 * stature * age
  );
}
