import type { Sex } from '#src/domain/growth/sex.ts';

const BEST_AGES: Readonly<Record<Sex, { from: number; to: number; who: string }>> = Object.freeze({
  male: { from: 12, to: 16, who: 'boys' },
  female: { from: 9, to: 13, who: 'girls' },
});

/**
 * What to keep in mind with an estimate of maturity, as sentences.
 *
 * Sources: Mirwald 2002 (ages 8 to 16; best within a year of peak height velocity), Kozieł & Malina 2018 (pull towards
 * the mean), Nevill & Burton 2018 (criticism of the ratio, read as a mention).
 *
 * @param input age in years, the offset that the band rests on, and whether the Fransen ratio is given
 * @example maturityCautions({ sex: 'male', age: 17, offset: 2.4, ratioUsed: false }).length // → 5
 */
export function maturityCautions({
  sex,
  age,
  offset,
  ratioUsed,
}: {
  sex: Sex;
  age: number;
  offset: number;
  ratioUsed: boolean;
}): string[] {
  const cautions: string[] = [];
  const best = BEST_AGES[sex];
  if (age < 8 || age > 16) {
    cautions.push('The age is outside 8 to 16 years, the range that the formulas were made from.');
  }
  if (age < best.from || age > best.to) {
    cautions.push(`The formulas do best in ${best.who} of ${best.from} to ${best.to} years.`);
  }
  if (Math.abs(offset) > 1) {
    cautions.push('The estimate is more than a year from peak height velocity, where the formulas are less exact.');
  }
  cautions.push('Read any estimate as a band of at least one year either side, not as a date.');
  cautions.push(
    'All these formulas pull towards the mean: they put peak height velocity too late in early maturers and too early in late maturers.',
  );
  if (ratioUsed) {
    cautions.push('The Fransen ratio is criticised: dividing by age makes the fit look better than it is.');
  }
  return cautions;
}
