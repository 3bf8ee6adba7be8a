export type OutrunState = 'raised' | 'discussed' | 'in hand' | 'cleared' | 'set aside';

const WORDS: Readonly<Record<OutrunState, string>> = {
  raised: 'Raised',
  discussed: 'Discussed',
  'in hand': 'In hand',
  cleared: 'Cleared',
  'set aside': 'Set aside',
};

/**
 * The steps of an outrun with how far it has come. One that was set aside ends there; which steps came before it only
 * its notes can say, so they are drawn as passed.
 *
 * @example statePath('discussed').map(({ reached }) => reached) // → [true, true, false, false]
 */
export function statePath(state: OutrunState): { step: OutrunState; word: string; reached: boolean; now: boolean }[] {
  const steps: OutrunState[] = ['raised', 'discussed', 'in hand', state === 'set aside' ? 'set aside' : 'cleared'];
  const at = steps.indexOf(state);
  return steps.map((step, i) => ({ step, word: WORDS[step], reached: i <= at, now: i === at }));
}
