import { COMMON_ROOTS, COMMON_RUNS } from '#src/domain/account/commonPasswords.ts';

export const SHORTEST_PASSWORD = 8;
export const LONGEST_PASSWORD = 256;

/**
 * What speaks against a password, or null. Length is what counts: at least 8 characters, at most 256, any of them, no
 * composition asked for (NIST SP 800-63B, 5.1.1.2). Refused are common ones and words that anyone would guess here.
 *
 * @param password as typed; compared after NFKC
 * @param words    names of the academy and of the person, in any spelling
 */
export function passwordProblem(password: string, words: readonly string[]): 'short' | 'long' | 'common' | null {
  const plain = password.normalize('NFKC');
  const length = [...plain].length;
  if (length < SHORTEST_PASSWORD) return 'short';
  if (length > LONGEST_PASSWORD) return 'long';
  const small = plain.toLowerCase();
  if (new Set(small).size < 3 || COMMON_RUNS.some((run) => run.includes(small))) return 'common';
  const root = small.replace(/^[^\p{L}]+|[^\p{L}]+$/gu, '');
  if (root === '' && /^(.{1,4})\1+$/u.test(small)) return 'common';
  if (COMMON_ROOTS.has(root) || COMMON_ROOTS.has(halfOf(root))) return 'common';
  const letters = small.replace(/[^\p{L}]+/gu, '');
  return letters !== '' && guessable(words).has(letters) ? 'common' : null;
}

// "summersummer" is "summer".
const halfOf = (root: string): string => {
  const half = root.slice(0, root.length / 2);
  return half + half === root ? half : root;
};

/** Each word, each two and three that stand together, and all of them. */
function guessable(texts: readonly string[]): Set<string> {
  const found = new Set<string>();
  for (const text of texts) {
    const words = text.toLowerCase().match(/\p{L}+/gu) ?? [];
    for (let from = 0; from < words.length; from += 1) {
      for (let to = from + 1; to <= words.length; to += 1) found.add(words.slice(from, to).join(''));
    }
  }
  return found;
}
