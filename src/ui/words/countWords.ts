import { numberWord } from '#src/ui/words/numberWord.ts';

/**
 * A count with its noun, small numbers in words, the first letter large.
 *
 * @example countWords(2, 'athlete', 'athletes') // → 'Two athletes'
 */
export function countWords(count: number, one: string, many: string): string {
  const number = numberWord(count);
  return `${number.charAt(0).toUpperCase()}${number.slice(1)} ${count === 1 ? one : many}`;
}
