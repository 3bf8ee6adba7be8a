import { wordsOf } from '#src/domain/catalogue/wordsOf.ts';

/** A side as a file says it: by name, or by its part in the swing, which only handedness turns into a name. */
export type WrittenSide = 'left' | 'right' | 'lead' | 'trail';

const SIDES: Readonly<Record<string, WrittenSide>> = {
  left: 'left',
  l: 'left',
  lt: 'left',
  lft: 'left',
  lh: 'left',
  lhs: 'left',
  right: 'right',
  r: 'right',
  rt: 'right',
  rgt: 'right',
  rh: 'right',
  rhs: 'right',
  lead: 'lead',
  leading: 'lead',
  front: 'lead',
  target: 'lead',
  trail: 'trail',
  trailing: 'trail',
  rear: 'trail',
  back: 'trail',
};

/** A side and an attempt found among words, and the words left over. */
export interface SideAndAttempt {
  side: WrittenSide | null;
  attempt: number | null;
  rest: string[];
}

const JOINED = /^(left|right|lead|trail|l|r)(\d{1,2})$/;
const JOINED_BACK = /^(\d{1,2})(left|right|l|r)$/;
const NUMBERED = /^(?:t|trial|attempt|rep|try|no|set|a)?(\d{1,2})(?:st|nd|rd|th)?$/;
const COUNT_WORDS = new Set([
  'trial',
  'attempt',
  'rep',
  'repetition',
  'try',
  'no',
  'nr',
  'number',
  't',
  'leg',
  'foot',
  'side',
  'limb',
]);

/**
 * Takes the side and the attempt out of a heading's words.
 *
 * @example sideAndAttempt(['jump', 'l1']) // → left, 1, rest jump
 * @example sideAndAttempt(['trail', 'hop', 'trial', '2']) // → trail, 2, rest hop
 */
export function sideAndAttempt(words: readonly string[]): SideAndAttempt {
  let side: WrittenSide | null = null;
  let attempt: number | null = null;
  const rest: string[] = [];
  words.forEach((word, i) => {
    const joined = JOINED.exec(word);
    const back = JOINED_BACK.exec(word);
    const number = NUMBERED.exec(word);
    if (side === null && SIDES[word] !== undefined && !(word === 'target' && words[i - 1] === 'along')) {
      side = SIDES[word];
    } else if (joined && side === null) {
      side = SIDES[joined[1]!]!;
      attempt = Number(joined[2]);
    } else if (back && side === null) {
      side = SIDES[back[2]!]!;
      attempt = Number(back[1]);
    } else if (number && attempt === null) {
      attempt = Number(number[1]);
    } else if (!COUNT_WORDS.has(word)) {
      rest.push(word);
    }
  });
  return { side, attempt, rest };
}

/** The side that a cell names, or null. */
export function readSide(text: string): WrittenSide | null {
  const { side } = sideAndAttempt(wordsOf(text));
  return side;
}

/** Turns a written side into a stored one. The lead side is the other side of what the athlete plays. */
export function storedSide(side: WrittenSide, plays: 'left' | 'right'): 'left' | 'right' {
  if (side === 'left' || side === 'right') return side;
  const lead = plays === 'right' ? 'left' : 'right';
  return side === 'lead' ? lead : plays;
}
