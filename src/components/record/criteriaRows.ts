import type { Criterion } from '#src/domain/outrun/criterion.ts';
import type { OutrunResult } from '#src/domain/outrun/outrun.ts';
import { CRITERION_LABELS } from '#src/domain/outrun/criterionLabels.ts';
import { intervalWords, signedNumber, plainNumber } from '#src/ui/words/numberWords.ts';

const UNITS: Readonly<Record<string, { unit: string; digits: number; signed: boolean }>> = {
  'lead-deficit': { unit: '%', digits: 1, signed: true },
  divergence: { unit: '%', digits: 1, signed: true },
  demand: { unit: '', digits: 2, signed: false },
  'late-return': { unit: 'points', digits: 1, signed: true },
  'ahead-of-strength': { unit: 'm/s', digits: 1, signed: true },
  'late-peak': { unit: 'ms', digits: 0, signed: true },
  delivery: { unit: '°', digits: 1, signed: true },
  context: { unit: '', digits: 0, signed: false },
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
  const { unit, digits, signed } = UNITS[name]!;
  const number = value === null ? '' : (signed ? signedNumber : plainNumber)(value, digits);
  return {
    value: value === null ? 'none' : [number, unit].filter(Boolean).join(' '),
    interval: interval90 ? `(${intervalWords(interval90, digits)})` : null,
  };
}
