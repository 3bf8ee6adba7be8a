import type { CareItem } from '#src/components/marks/careItem.ts';
import { dateWords } from '#src/ui/words/dateWords.ts';

interface Cautions {
  restrictions: readonly { allowed: string; setBy: string | null; setOn: string }[];
  growth: string | null;
}

/** Care as the bar above a record says it: a restriction that staff set before anything else, then growth. */
export function careItems({ restrictions, growth }: Cautions): CareItem[] {
  return [
    ...restrictions.map(({ allowed, setBy, setOn }) => ({
      kind: 'restriction' as const,
      title: 'Restriction',
      text: `${allowed.replace(/[.\s]+$/, '')}. Set by ${setBy ?? 'a coach'}, ${dateWords(setOn)}.`,
    })),
    ...(growth ? [{ kind: 'caution' as const, title: 'Growing', text: growth }] : []),
  ];
}
