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

const ROUTE_NAMES: Readonly<Record<string, string>> = {
  build: 'Build',
  hold: 'Hold',
  'club set-up': 'Club set-up',
  'ask a clinician': 'Ask a clinician',
};

/** The name of a Route as it is shown. */
export const routeName = (route: string): string => ROUTE_NAMES[route] ?? route;

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
