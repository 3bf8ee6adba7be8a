import { decodeText } from '#src/services/import/decodeText.ts';
import { parseTable } from '#src/services/import/parseTable.ts';
import type { KnownAthlete, ReaderSettings } from '#src/services/import/reading.ts';
import { recogniseTable, type RecognisedTable } from '#src/services/import/recogniseTable.ts';

/** A file's text as the importer sees it. */
export function tableFrom(text: string, file = 'file.csv'): RecognisedTable {
  const table = recogniseTable(parseTable(decodeText(Buffer.from(text), file), file));
  if (table === null) throw new Error('the headings were not recognised');
  return table;
}

/** Invented athletes: two Novaks, one left-hander, accents. */
export const ATHLETES: readonly KnownAthlete[] = [
  { id: 'amara', givenName: 'Amara', familyName: 'Novak', plays: 'right', birthDate: '2012-07-08' },
  { id: 'vesna', givenName: 'Vesna', familyName: 'Okafor', plays: 'left', birthDate: '2013-09-13' },
  { id: 'anton', givenName: 'Anton', familyName: 'Novak', plays: 'right', birthDate: '2014-01-02' },
  { id: 'lukasz', givenName: 'Łukasz', familyName: "O'Brien-Ørsted", plays: 'right', birthDate: '2011-03-04' },
  { id: 'ana', givenName: 'Ana Maria', familyName: 'van der Berg', plays: 'right', birthDate: '2011-03-04' },
];

export const SETTINGS: ReaderSettings = { athletes: ATHLETES, dateOrder: 'dmy', nameOrder: 'dmy' };
