import { wordsOf } from '#src/domain/catalogue/wordsOf.ts';
import { parseUnit } from '#src/domain/units/parseUnit.ts';
import type { Unit } from '#src/domain/units/unitTable.ts';

/** A heading as words without its unit: `standing height cm` → height words and cm. */
export interface Heading {
  words: readonly string[];
  /** The words with single spaces between them. */
  name: string;
  unit: Unit | null;
}

/** Words that are a unit elsewhere and a part of the body, or of speech, in a heading. */
const NEVER_UNITS = new Set(['foot', 'feet', 'second', 'pound', 'l', 'r', 'c', 'f', "'", '"']);
const FILLERS = new Set(['in', 'of', 'the', 'at', 'per']);

/**
 * Reads a column's heading.
 *
 * @example readHeading('Ball speed (mph)') // → words ball, speed; unit mph
 * @example readHeading('carry_m')          // → words carry; unit m
 */
export function readHeading(written: string): Heading {
  const text = written.replace(/#/g, ' no ');
  const bracket = /[([]([^)\]]*)[)\]]\s*$/.exec(text);
  const bracketed = bracket ? parseUnit(bracket[1]!) : null;
  if (bracket && bracketed) return heading(text.slice(0, bracket.index), bracketed);
  const tokens = text
    .trim()
    .split(/[\s_,:]+/)
    .filter((token) => token !== '');
  for (const length of [2, 1]) {
    if (tokens.length <= length) continue;
    const last = tokens.slice(-length).join('');
    const unit = unitAtEnd(last, text);
    if (unit) return heading(tokens.slice(0, -length).join(' '), unit, true);
  }
  const slashed = /^(.*\S)\s*[/|]\s*(\S+)$/.exec(text);
  const afterSlash = slashed ? unitAtEnd(slashed[2]!, text) : null;
  if (afterSlash) return heading(slashed![1]!, afterSlash);
  return heading(text, unitWithin(text, tokens));
}

/** A unit with words behind it: `wind m/s (+ = following)`, `height (cm) without shoes`. */
function unitWithin(text: string, tokens: readonly string[]): Unit | null {
  const bracketed = [...text.matchAll(/[([]([^)\]]*)[)\]]/g)].map(([, inner]) => parseUnit(inner!));
  const plain = tokens
    .slice(1)
    .filter((token) => token.length > 1 && !FILLERS.has(token.toLowerCase()))
    .map((token) => unitAtEnd(token, text));
  return [...bracketed, ...plain].find((unit) => unit !== null) ?? null;
}

function unitAtEnd(token: string, whole: string): Unit | null {
  const lower = token.toLowerCase();
  // `air temperature C`: the letter is a unit of temperature and nothing else.
  if ((lower === 'c' || lower === 'f') && /temp/i.test(whole)) return parseUnit(lower);
  return NEVER_UNITS.has(lower) ? null : parseUnit(token);
}

function heading(text: string, unit: Unit | null, stripped = false): Heading {
  const words = wordsOf(text);
  if (stripped && words.length > 1 && FILLERS.has(words.at(-1)!)) words.pop();
  return { words, name: words.join(' '), unit };
}
