import { dateWords } from '#src/ui/words/dateWords.ts';

interface Outrun {
  level: 'look' | 'act';
  state: string;
  raisedOn: string;
  levelSince: string;
  route: string | null;
  lookAgainOn: string | null;
  mayBeCleared: boolean;
}

/** The four Routes: what the coaches can agree to do. */
export const ROUTES = [
  { key: 'build', name: 'Build', about: 'a lead-side block; hold the swing as it is' },
  { key: 'hold', name: 'Hold', about: 'no new driver speed work until the retest' },
  { key: 'club set-up', name: 'Club set-up', about: 'more loft from the club instead of from backing up' },
  { key: 'ask a clinician', name: 'Ask a clinician', about: 'before anything else changes' },
] as const;

/** The name of a Route as it is shown. */
export const routeName = (route: string): string => ROUTES.find(({ key }) => key === route)?.name ?? route;

type State = 'raised' | 'discussed' | 'in hand' | 'cleared' | 'set aside';
const STATES: readonly State[] = ['raised', 'discussed', 'in hand', 'cleared', 'set aside'];

/** A stored state as one of the five. */
export const outrunState = (state: string): State => STATES.find((known) => known === state) ?? 'raised';

/** Where an open outrun stands and what it asks next, in words. */
export function outrunWords({ level, state, raisedOn, levelSince, route, lookAgainOn, mayBeCleared }: Outrun) {
  const since = levelSince === raisedOn ? dateWords(raisedOn, 'short') : dateWords(levelSince, 'short');
  if (mayBeCleared) return { state: `${stateName(state)}, since ${since}`, next: 'may be cleared: the coaches decide' };
  if (state === 'in hand') {
    const look = lookAgainOn ? `look again ${dateWords(lookAgainOn, 'short')}` : 'set a date to look again';
    return { state: `In hand: ${routeName(route ?? '')}`, next: look };
  }
  if (state === 'discussed') return { state: `Discussed, since ${since}`, next: 'choose a Route' };
  const asks =
    level === 'act' ? 'a Route within a week, no new driver speed work until then' : 'talk before the next block';
  return { state: `Raised ${since}`, next: asks };
}

const stateName = (state: string): string => `${state.charAt(0).toUpperCase()}${state.slice(1)}`;

/** A stored level as the two that there are. */
export const levelOf = (level: string): 'look' | 'act' => (level === 'act' ? 'act' : 'look');
