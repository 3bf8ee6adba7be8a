import { inTerm, TERMS, type Truth } from '#db/seed/truth.ts';
import type { Random } from '#db/seed/random.ts';
import { ageMonths } from '#src/domain/growth/ageMonths.ts';
import { cdc2000Lms } from '#src/domain/growth/cdc2000Lms.ts';
import { lmsValue } from '#src/domain/growth/lmsValue.ts';

export interface Body {
  statureM: number;
  sittingHeightM: number;
  massKg: number;
}

/** The body that is true of an athlete on a date: the reference curve of sex, shifted by tempo and by stature. */
export function trueBody(truth: Truth, on: string): Body {
  const months = Math.min(238, Math.max(74, ageMonths(truth.birthDate, on) + truth.tempoMonths));
  const statureM = referenceValue('stature', truth, months) / 100;
  return { statureM, sittingHeightM: statureM * 0.521, massKg: referenceValue('weight', truth, months) };
}

/** What the tape and the scales said that day. */
export function measuredBody(body: Body, random: Random): Body {
  const rounded = (value: number, step: number) => Math.round(value / step) * step;
  return {
    statureM: rounded(body.statureM + random.normal(0, 0.0025), 0.001),
    sittingHeightM: rounded(body.sittingHeightM + random.normal(0, 0.003), 0.001),
    massKg: rounded(body.massKg + random.normal(0, 0.3), 0.1),
  };
}

function referenceValue(measure: 'stature' | 'weight', { sex, statureZ }: Truth, ageMonths: number): number {
  const lms = cdc2000Lms({ measure, sex, ageMonths });
  const value = lms && lmsValue(lms, statureZ);
  if (value === null) throw new RangeError(`referenceValue requires an age in the tables, got ${ageMonths} months`);
  return value;
}

/** Push of the stronger leg (N), and of each side, in a term. */
export function trueLegs(truth: Truth, term: number): { lead: number; trail: number } {
  const { massKg } = trueBody(truth, TERMS[term]!.testedOn);
  const strong = massKg * (truth.pushPerKg + truth.pushPerKgATerm * term);
  const lead = inTerm(truth.leadPct, term) / 100;
  return lead >= 0 ? { lead: strong, trail: strong * (1 - lead) } : { lead: strong * (1 + lead), trail: strong };
}
