import type { OutrunState } from '#src/components/marks/statePath.ts';
import { dateWords } from '#src/ui/words/dateWords.ts';
import { routeName } from '#src/ui/words/outrunWords.ts';

interface Event {
  kind: string;
  on: string;
  level: string | null;
  by: string | null;
}

/** What stands under each step of an outrun's way. */
export function pathNotes(
  events: readonly Event[],
  { route, lookAgainOn }: { route: string | null; lookAgainOn: string | null },
): Partial<Record<OutrunState, string>> {
  const short = (on: string) => dateWords(on, 'short');
  const levels = events.filter(({ kind }) => ['raised', 'level up', 'level down'].includes(kind));
  const raised = levels.map(({ on, level }) => `${short(on)} ${level === 'act' ? 'Act' : 'Look'}`).join(', ');
  const discussed = events.findLast(({ kind }) => kind === 'discussed');
  const ended = (kind: string) => events.find((event) => event.kind === kind);
  const cleared = ended('cleared');
  const aside = ended('set aside');
  return {
    raised,
    ...(discussed ? { discussed: `${short(discussed.on)}, both coaches` } : {}),
    ...(route
      ? { 'in hand': `${routeName(route)}${lookAgainOn ? `, look again ${short(lookAgainOn)}` : ''}` }
      : cleared || aside
        ? { 'in hand': 'no Route was needed' }
        : {}),
    ...(cleared ? { cleared: short(cleared.on) } : { cleared: 'by tests, or set aside with a reason' }),
    ...(aside ? { 'set aside': short(aside.on) } : {}),
  };
}
