import { numberWord } from '#src/ui/words/numberWord.ts';
import { plainNumber } from '#src/ui/words/numberWords.ts';

/**
 * A small line of one value a term, in words.
 *
 * @param values oldest first, null where a term has none
 * @example sparklineSentence([163, null, 185], 'Carry', 'm') // → 'Carry 163 m to 185 m over three terms, one without a value'
 */
export function sparklineSentence(values: readonly (number | null)[], name: string, unit: string, digits = 0): string {
  const present = values.filter((value) => value !== null);
  const missing = values.length - present.length;
  const [first, last] = [present[0], present.at(-1)];
  if (first === undefined || last === undefined) return `${name}: no value yet`;
  const value = (number: number) => `${plainNumber(number, digits)} ${unit}`;
  if (present.length === 1) return `${name} ${value(first)}, one value`;
  const gaps = missing > 0 ? `, ${numberWord(missing)} without a value` : '';
  return `${name} ${value(first)} to ${value(last)} over ${numberWord(values.length)} terms${gaps}`;
}
