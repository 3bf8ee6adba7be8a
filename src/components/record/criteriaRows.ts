import type { Criterion, CriterionName } from '#src/domain/outrun/criterion.ts';
import type { OutrunResult } from '#src/domain/outrun/outrun.ts';
import { CRITERION_LABELS } from '#src/domain/outrun/criterionLabels.ts';
import { intervalWords, signedNumber, plainNumber } from '#src/ui/words/numberWords.ts';

interface Words {
  /** What the criterion compares, under its label. */
  about: string;
  unit: string;
  digits: number;
  signed: boolean;
  metWhen: 'above' | 'below';
}

/** How each criterion is said. */
export const CRITERION_WORDS: Readonly<Record<CriterionName, Words>> = {
  'lead-deficit': { about: 'push, jump and hop of two sessions', unit: '%', digits: 1, signed: true, metWhen: 'below' },
  divergence: { about: 'carry ahead of growth and strength', unit: '%', digits: 1, signed: true, metWhen: 'above' },
  demand: { about: 'peak lead force ÷ lead push', unit: '', digits: 2, signed: false, metWhen: 'above' },
  'late-return': {
    ...{
      about: 'lead share at impact − at early downswing',
      unit: 'points',
      digits: 1,
      signed: true,
      metWhen: 'below',
    },
  },
  'ahead-of-strength': {
    about: 'club speed for the lead push',
    unit: 'm/s',
    digits: 1,
    signed: true,
    metWhen: 'above',
  },
  'late-peak': { about: 'lead peak after lead arm parallel', unit: 'ms', digits: 0, signed: true, metWhen: 'above' },
  delivery: { about: 'attack angle and loft', unit: '°', digits: 1, signed: true, metWhen: 'above' },
  context: { about: 'hip turn, growth, driver balls', unit: '', digits: 0, signed: false, metWhen: 'above' },
};

/** The four counted criteria of a stored judgement, as they are said beside the season. */
export function criteriaRows(result: unknown) {
  const { criteria } = result as Pick<OutrunResult, 'criteria'>;
  return criteria
    .filter(({ kind }) => kind !== 'information')
    .map((criterion) => ({
      label: CRITERION_LABELS[criterion.name],
      verdict: criterion.verdict,
      ...criterionWords(criterion),
    }));
}

/** Value and interval of a criterion with its unit. */
export function criterionWords({ name, value, interval90 }: Pick<Criterion, 'name' | 'value' | 'interval90'>) {
  const { unit, digits, signed } = CRITERION_WORDS[name];
  const number = value === null ? '' : (signed ? signedNumber : plainNumber)(value, digits);
  return {
    value: value === null ? '–' : [number, unit].filter(Boolean).join(' '),
    interval: interval90 ? intervalWords(interval90, digits) : null,
  };
}
