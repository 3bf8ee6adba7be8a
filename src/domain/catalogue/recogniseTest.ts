import { wordsOf } from '#src/domain/catalogue/wordsOf.ts';

const has = (words: readonly string[], ...any: string[]): boolean => any.some((word) => words.includes(word));
const starts = (words: readonly string[], ...any: string[]): boolean =>
  any.some((beginning) => words.some((word) => word.startsWith(beginning)));

/** A test is known by its words, first match first: the more particular before the more general. */
const TESTS: readonly [key: string, matches: (words: readonly string[]) => boolean][] = [
  ['hip-internal-rotation', (w) => has(w, 'hip') && (starts(w, 'rot', 'intern') || has(w, 'ir'))],
  ['rotational-throw', (w) => starts(w, 'throw', 'medball') || (has(w, 'ball') && starts(w, 'med', 'rotat'))],
  ['grip', (w) => starts(w, 'grip', 'handgrip')],
  ['sit-to-stand', (w) => has(w, 'sts', 'slsts') || (has(w, 'sit') && has(w, 'stand'))],
  ['bridge', (w) => starts(w, 'bridge') && !has(w, 'side')],
  ['knee-extension', (w) => has(w, 'knee') && (starts(w, 'exten') || has(w, 'ext'))],
  ['posteromedial-reach', (w) => starts(w, 'posteromed') || has(w, 'pm') || (starts(w, 'poster') && starts(w, 'med'))],
  ['posterolateral-reach', (w) => starts(w, 'posterolat') || has(w, 'pl') || (starts(w, 'poster') && starts(w, 'lat'))],
  ['anterior-reach', (w) => starts(w, 'anterior', 'reach') || has(w, 'ant', 'ybt')],
  ['triple-hop', (w) => starts(w, 'hop') && has(w, 'triple', '3', 'three', 'x3', '3x')],
  ['triple-hop', (w) => has(w, 'triplehop', 'slth', 'tht')],
  ['other', (w) => starts(w, 'hop') && starts(w, 'cross', 'timed', 'time', '6m')],
  ['hop', (w) => starts(w, 'hop') || has(w, 'slh', 'slhd', 'slhop')],
  ['other', (w) => starts(w, 'jump') && starts(w, 'drop', 'squat', 'depth', 'tuck', 'bilateral', 'double', 'two')],
  ['hop', (w) => starts(w, 'jump') && has(w, 'long', 'broad', 'horizontal')],
  ['jump', (w) => starts(w, 'jump', 'cmj', 'slcmj', 'countermovement') || (has(w, 'counter') && has(w, 'movement'))],
  ['push', (w) => starts(w, 'push', 'isometric', 'slisopush', 'isopush') || has(w, 'iso', 'isom', 'imtp', 'slimtp')],
  ['push', (w) => has(w, 'leg') && has(w, 'press')],
];

/**
 * The catalogue key of the test that a heading or a cell speaks of.
 *
 * @param text as `Single-leg countermovement jump`, `jump`, `SLCMJ`, `Y anterior`
 * @returns the key, or null where the words name no test of the catalogue
 * @example recogniseTest('jump height') // → 'jump'
 */
export function recogniseTest(text: string): string | null {
  const words = wordsOf(text);
  const key = TESTS.find(([, matches]) => matches(words))?.[0] ?? null;
  return key === 'other' ? null : key;
}
