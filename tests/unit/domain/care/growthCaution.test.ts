import { expect, it } from 'vitest';
import { growthCaution } from '#src/domain/care/growthCaution.ts';
import { REFER_RULES, REFER_RULES_NOTE } from '#src/domain/care/referRules.ts';

/** Bands: our own proposal (SCIENCE §5), no published cut-off. */
it.each([
  { sex: 'male', velocity: 8, days: 150, cautions: true },
  { sex: 'male', velocity: 7.9, days: 182, cautions: false },
  { sex: 'female', velocity: 7, days: 182, cautions: true },
  { sex: 'female', velocity: 6.9, days: 182, cautions: false },
  { sex: 'male', velocity: 9.63, days: 91, cautions: false },
  { sex: 'male', velocity: 9.63, days: 149, cautions: false },
] as const)('$sex $velocity cm a year over $days days: $cautions', ({ sex, velocity, days, cautions }) => {
  expect(growthCaution({ sex, velocity, days, standardError: 0.8 }) !== null).toBe(cautions);
});

it('gives the rate with its interval, by hand: 9 ± 1.644854·0.8485', () => {
  const text = growthCaution({ sex: 'male', velocity: 9, days: 182, standardError: 0.8485 });
  expect(text).toContain('9.0 cm a year over 182 days (90 % interval 7.6 to 10.4)');
});

it('refuses a negative or broken figure', () => {
  expect(() => growthCaution({ sex: 'male', velocity: 9, days: 182, standardError: -1 })).toThrow(RangeError);
  expect(() => growthCaution({ sex: 'male', velocity: Number.NaN, days: 182, standardError: 1 })).toThrow(RangeError);
});

it('the refer rules are whole sentences and say that a person must verify them', () => {
  for (const { sentence } of REFER_RULES) expect(sentence).toMatch(/^[A-Z].*\.$/);
  expect(REFER_RULES.filter(({ urgent }) => urgent)).toHaveLength(2);
  expect(REFER_RULES_NOTE).toContain('to be verified by a person');
});
