import { plainLetters, wordsOf } from '#src/domain/catalogue/wordsOf.ts';

/** Enough of an athlete to know the name again. */
export interface NamedAthlete {
  givenName: string;
  familyName: string;
}

/** The athlete a name means, or why it means nobody. */
export type NameMatch<A> = { athlete: A; reason: null } | { athlete: null; reason: string };

/**
 * Finds the athlete that a cell names: accents, case and punctuation do not matter, `Novak, Amara`, `Amara Novak` and
 * `Novak Amara` are one, and one of the two names may be an initial where only one athlete has it.
 *
 * @returns the athlete, or a reason that finishes "refused because …"
 */
export function matchName<A extends NamedAthlete>(athletes: readonly A[], text: string): NameMatch<A> {
  const key = nameWords(text).join('');
  if (key === '') return { athlete: null, reason: 'no athlete is named' };
  const full = athletes.filter(({ givenName, familyName }) => {
    const [given, family] = [joined(givenName), joined(familyName)];
    return key === given + family || key === family + given;
  });
  if (full.length > 0) return only(full, text);
  const words = nameWords(text);
  const shortened = (name: string, initials: readonly string[]) =>
    (words.slice(0, -1).join('') === name && initials.includes(words.at(-1)!)) ||
    (words.slice(1).join('') === name && initials.includes(words[0]!));
  const initials = athletes.filter(
    ({ givenName, familyName }) =>
      shortened(joined(familyName), initialsOf(givenName)) || shortened(joined(givenName), initialsOf(familyName)),
  );
  return only(initials, text);
}

/** Finds the athlete whose given and family names both stand in a file's name or path. */
export function matchFileName<A extends NamedAthlete>(athletes: readonly A[], path: string): NameMatch<A> {
  const words = wordsOf(path.replace(/\d+/g, ' '));
  const full = athletes.filter(
    ({ givenName, familyName }) => runAt(words, joined(givenName)) && runAt(words, joined(familyName)),
  );
  if (full.length > 0) return only(full, path);
  const initials = athletes.filter((athlete) => {
    const run = runAt(words, joined(athlete.familyName));
    return (
      run &&
      initialsOf(athlete.givenName).some((initial) => words[run.from - 1] === initial || words[run.to] === initial)
    );
  });
  if (initials.length === 0)
    return { athlete: null, reason: 'no athlete is named, neither in the file nor in its name' };
  return only(initials, path);
}

/** The words of a name; unlike a heading's, a capital inside a word (`McDonald`) begins no new one. */
const nameWords = (text: string): string[] => wordsOf(plainLetters(text));
const joined = (text: string): string => nameWords(text).join('');

function initialsOf(name: string): string[] {
  const letters = nameWords(name).map((word) => word[0]!);
  return [...new Set([letters[0] ?? '', letters.join('')])].filter((letter) => letter !== '');
}

/** Where words, put together, spell a name. */
function runAt(words: readonly string[], name: string): { from: number; to: number } | null {
  for (let from = 0; from < words.length; from += 1) {
    let spelled = '';
    for (let to = from; to < words.length && spelled.length < name.length; to += 1) {
      spelled += words[to]!;
      if (spelled === name) return { from, to: to + 1 };
    }
  }
  return null;
}

function only<A extends NamedAthlete>(found: readonly A[], text: string): NameMatch<A> {
  if (found.length === 1) return { athlete: found[0]!, reason: null };
  const many = found.length > 1;
  return { athlete: null, reason: many ? `“${text}” may be more than one athlete` : `no athlete is called “${text}”` };
}
