const SMALL = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten', 'eleven', 'twelve'];

/**
 * A count with its noun, small numbers in words, the first letter large.
 *
 * @example countWords(2, 'athlete', 'athletes') // → 'Two athletes'
 */
export function countWords(count: number, one: string, many: string): string {
  const number = SMALL[count] ?? String(count);
  return `${number.charAt(0).toUpperCase()}${number.slice(1)} ${count === 1 ? one : many}`;
}
