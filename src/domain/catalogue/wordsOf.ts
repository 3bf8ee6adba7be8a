const MARKS = /[\u0300-\u036f]/g;
const LETTERS: Readonly<Record<string, string>> = {
  ß: 'ss',
  ø: 'o',
  ł: 'l',
  æ: 'ae',
  œ: 'oe',
  đ: 'd',
  ð: 'd',
  þ: 'th',
};

/** Text without accents, in lower case: `Łukasz Ørsted` → `lukasz orsted`. */
export const plainLetters = (text: string): string =>
  text
    .normalize('NFKD')
    .replace(MARKS, '')
    .toLowerCase()
    .replace(/[ßøłæœđðþ]/g, (letter) => LETTERS[letter]!);

/**
 * The words of a heading, a name or a file's name: accents, case, punctuation and joined-up capitals do not matter.
 *
 * @example wordsOf('jump_L1 (cm)') // → ['jump', 'l1', 'cm']
 * @example wordsOf('ballSpeed')    // → ['ball', 'speed']
 */
export function wordsOf(text: string): string[] {
  const spaced = text.replace(/(\p{Ll})(\p{Lu})/gu, '$1 $2');
  return plainLetters(spaced)
    .replace(/['’`´]/g, '')
    .split(/[^\p{L}\p{N}]+/u)
    .filter((word) => word !== '');
}
