import { wordsOf } from '#src/domain/catalogue/wordsOf.ts';
import { matchFileName, matchName } from '#src/services/import/athleteNames.ts';
import { dateInName } from '#src/services/import/fileDates.ts';
import type { KnownAthlete, ReaderSettings } from '#src/services/import/reading.ts';
import { cellOf, columnOf, type RecognisedTable } from '#src/services/import/recogniseTable.ts';
import { dateAtHead, nameOf } from '#src/services/import/rowContext.ts';
import { readDate } from '#src/services/import/settleDates.ts';

/** Whose recording a file is, and of what day. */
export interface FileSubject {
  athlete: KnownAthlete;
  recordedOn: string;
}

/** Finds athlete and date of a recording: in its columns, at its head, or else in its name. A reason if it cannot. */
export function fileSubject(table: RecognisedTable, settings: ReaderSettings): FileSubject | string {
  const row = table.body[0];
  const name = row === undefined ? '' : nameOf(table, row);
  const match = name === '' ? matchFileName(settings.athletes, table.file) : matchName(settings.athletes, name);
  if (match.athlete === null) return match.reason;
  const cell = row === undefined ? '' : cellOf(row, columnOf(table, 'date'));
  const order = settings.dateOrder ?? settings.nameOrder;
  const inRow = cell === '' ? null : readDate(cell, order);
  const recordedOn = inRow ?? dateAtHead(table, order) ?? dateInName(table.file, settings.nameOrder);
  return recordedOn === null ? 'no date in the file, nor in its name' : { athlete: match.athlete, recordedOn };
}

/** The number behind a word in the file's name (`swing3`, `swing_03`), or null. */
export function numberInName(path: string, ...before: string[]): number | null {
  const words = wordsOf(path.replace(/\.[a-z]{2,4}$/i, '')).flatMap(
    (word) => /^([a-z]+)(\d+)$/.exec(word)?.slice(1) ?? [word],
  );
  const at = words.findIndex((word, i) => before.includes(word) && /^\d{1,3}$/.test(words[i + 1] ?? ''));
  return at === -1 ? null : Number(words[at + 1]);
}
