import { careItems } from '#src/components/marks/careItems.ts';
import { recordSections, type RecordHead } from '#src/layouts/recordHead.ts';
import { plainNumber } from '#src/ui/words/numberWords.ts';
import type { RecordHeader } from '#src/services/records/loadHeader.ts';
import { Z90 } from '#src/domain/statistics/z90.ts';

/** Growth velocity with half of its 90 % interval, `7.4 ± 1.2`, or null where it cannot be given. */
export function growthWords(velocity: RecordHeader['velocity']): string | null {
  if (!velocity || velocity.perYear === null || velocity.standardError === null) return null;
  return `${plainNumber(velocity.perYear, 1)} ± ${plainNumber(Z90 * velocity.standardError, 1)}`;
}

/** The head of a record as it is said. */
export function recordHead(header: RecordHeader): RecordHead {
  return {
    name: header.name,
    squad: header.squadName,
    age: plainNumber(header.age, 1),
    plays: header.plays,
    growth: growthWords(header.velocity),
  };
}

/** What `Record.astro` needs of an athlete, for staff. */
export const staffRecord = (header: RecordHeader, section: string) => ({
  head: recordHead(header),
  cautions: careItems(header.cautions),
  sections: recordSections(header.id),
  section,
});
