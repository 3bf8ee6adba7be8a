import { recogniseTest } from '#src/domain/catalogue/recogniseTest.ts';
import { wordsOf } from '#src/domain/catalogue/wordsOf.ts';
import { fileSubject } from '#src/services/import/fileSubject.ts';
import { readSide, sideAndAttempt, storedSide, type WrittenSide } from '#src/services/import/readSide.ts';
import type { ReaderSettings } from '#src/services/import/reading.ts';
import { cellOf, columnOf, type RecognisedTable } from '#src/services/import/recogniseTable.ts';
import { timeSeries } from '#src/services/import/timeSeries.ts';

/** One leg's force curve of a jump or a push, N. */
export interface CurveReading {
  athleteId: string;
  recordedOn: string;
  testKey: 'jump' | 'push';
  side: 'left' | 'right';
  device: string | null;
  sampleRateHz: number;
  samples: Float64Array;
}

/**
 * Reads one force curve. It is a jump's unless its head, a heading or its name speaks of a push: a jump without a
 * take-off is refused, never read as a push.
 *
 * @returns the curve, or why it is refused
 * @throws {AppError} invalid with file, row and column where a sample cannot be read
 */
export function readForceCurve(table: RecognisedTable, settings: ReaderSettings): CurveReading | string {
  const subject = fileSubject(table, settings);
  if (typeof subject === 'string') return subject;
  const { channels, sampleRateHz } = timeSeries(table);
  if (channels.length !== 1) return `${channels.length} columns of force where one leg has one`;
  const { column, samples, measure } = channels[0]!;
  if (measure === 'pressure') return 'pressure, where a force is needed';
  const { find } = table.context;
  const row = table.body[0]!;
  const written =
    column.side ??
    readSide(cellOf(row, columnOf(table, 'side'))) ??
    readSide(find('side', 'leg', 'limb', 'foot') ?? '') ??
    sideInName(table.file);
  if (written === null) return 'no side is named, neither in the file nor in its name';
  const said = [find('test', 'exercise', 'movement') ?? '', column.heading.name, cellOf(row, columnOf(table, 'test'))];
  const testKey = [...said, table.file].map(curveTest).find((key) => key !== null) ?? 'jump';
  return {
    ...{ athleteId: subject.athlete.id, recordedOn: subject.recordedOn, testKey, sampleRateHz, samples },
    side: storedSide(written, subject.athlete.plays),
    device: find('device', 'rig', 'plate'),
  };
}

/** The side in a file's name: a whole word before a single letter, which may be an initial. */
function sideInName(path: string): WrittenSide | null {
  const words = wordsOf(path.replace(/\.[a-z]+$/i, ''));
  return sideAndAttempt(words.filter((word) => word.length > 2)).side ?? sideAndAttempt(words).side;
}

function curveTest(text: string): 'jump' | 'push' | null {
  const key = recogniseTest(text);
  return key === 'jump' || key === 'push' ? key : null;
}
