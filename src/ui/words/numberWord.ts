const SMALL = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten', 'eleven', 'twelve'];

/**
 * A small count as a word, above twelve its digits.
 *
 * @example numberWord(3) // → 'three'
 */
export const numberWord = (count: number): string => SMALL[count] ?? String(count);
