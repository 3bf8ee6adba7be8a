import { recogniseTest } from '#src/domain/catalogue/recogniseTest.ts';
import { wordsOf } from '#src/domain/catalogue/wordsOf.ts';
import { batteryColumns } from '#src/services/import/batteryColumns.ts';
import { isBlankCell, readCell } from '#src/services/import/readCell.ts';
import { readHeading } from '#src/services/import/readHeading.ts';
import type { Reading, ReaderSettings, Readings } from '#src/services/import/reading.ts';
import { readSide, sideAndAttempt, storedSide } from '#src/services/import/readSide.ts';
import type { SourceRow } from '#src/services/import/parseTable.ts';
import { cellOf, columnOf, type Column, type RecognisedTable } from '#src/services/import/recogniseTable.ts';
import { athleteFinder, dateFinder, isSummaryRow, nameOf } from '#src/services/import/rowContext.ts';
import { isSummaryLabel } from '#src/services/import/summaryRow.ts';
import { tableDecimal } from '#src/services/import/tableDecimal.ts';
import { trialUnits, type TrialTest } from '#src/services/import/trialUnits.ts';
import { voidReasonOf } from '#src/services/import/voidRemark.ts';

/** One trial as a file gives it, its value in the base unit of the test; null for a void trial without a value. */
export interface TrialReading {
  athleteId: string;
  heldOn: string;
  testKey: string;
  side: 'left' | 'right' | null;
  attempt: number;
  valueSi: number | null;
  enteredValue: string;
  enteredUnit: string;
  voidReason: string | null;
}

/** A trial before its unit is settled, which the other cells of its file may have to do. */
export interface RawTrial extends Omit<TrialReading, 'valueSi' | 'enteredUnit'> {
  value: number | null;
  unitText: string;
}

const MOST_ATTEMPTS = 9;

/**
 * Reads a battery in any layout: a row a trial, a row an athlete with a column a trial, or anything between. What a
 * heading does not say of test, side and attempt, the row must; attempts that nothing numbers are numbered in order.
 * Blank cells are not trials.
 */
export function readBattery(
  table: RecognisedTable,
  settings: ReaderSettings & { tests: readonly TrialTest[] },
): Readings<TrialReading> {
  const { values, remarks, leftOut: unused } = batteryColumns(table);
  const athleteOf = athleteFinder(table, settings.athletes);
  const dateOf = dateFinder(table, settings);
  const decimal = tableDecimal(table, values);
  const counted = new Map<string, number>();
  const leftOut = table.leftOut.map((row) => ({ file: table.file, ...row }));
  const raw: Reading<RawTrial>[] = [];
  for (const row of table.body) {
    if (isSummaryRow(table, row) || isSummaryLabel(cellOf(row, columnOf(table, 'side')))) {
      leftOut.push({ file: table.file, line: row.line, why: 'a summary row' });
      continue;
    }
    for (const column of values) {
      const text = cellOf(row, column);
      const remark = remarkOf(row, column, remarks, values.length === 1);
      if (isBlankCell(text) && remark === null) continue;
      const label = labelOf(table, row, column);
      const at = { file: table.file, line: row.line, column: column.index + 1, label };
      const refuse = (refused: string) => raw.push({ ...at, value: null, refused });
      const cell = readCell(text, decimal);
      const said = cell.kind === 'words' ? cell.text : cell.kind === 'number' ? cell.remark : '';
      const voidReason = remark ?? voidReasonOf(said);
      if (cell.kind === 'words' && voidReason === null) {
        refuse(`“${cell.text}” is no number`);
        continue;
      }
      const { athlete, reason: nobody } = athleteOf(row);
      const { date, reason: undated } = dateOf(row);
      const which = whichTrial(table, row, column, settings.tests);
      if (athlete === null || date === null || typeof which === 'string') {
        refuse(nobody ?? undated ?? (which as string));
        continue;
      }
      const side = which.side === null ? null : storedSide(which.side, athlete.plays);
      const group = [athlete.id, date, which.testKey, side].join(' ');
      const attempt = which.attempt ?? (counted.get(group) ?? 0) + 1;
      counted.set(group, Math.max(attempt, counted.get(group) ?? 0));
      if (attempt < 1 || attempt > MOST_ATTEMPTS) {
        refuse(`trial ${attempt}: a test has 1 to ${MOST_ATTEMPTS} trials`);
        continue;
      }
      const unitText = (cell.kind === 'number' ? cell.unit?.symbol : undefined) ?? unitTextOf(table, row, column) ?? '';
      const value = cell.kind === 'number' ? cell.value : null;
      raw.push({
        ...at,
        value: {
          ...{ athleteId: athlete.id, heldOn: date, testKey: which.testKey, side, attempt },
          ...{ value, unitText, enteredValue: text, voidReason },
        },
        refused: null,
      });
    }
  }
  const { readings, notes } = trialUnits(raw, settings.tests);
  const columnsNote = unused.length === 0 ? [] : [`columns left out: ${unused.join(', ')}`];
  return { readings, leftOut, notes: [...notes, ...columnsNote] };
}

type Which = Pick<Column, 'side' | 'attempt'> & { testKey: string };

function whichTrial(
  table: RecognisedTable,
  row: SourceRow,
  column: Column,
  tests: readonly TrialTest[],
): Which | string {
  const testText = cellOf(row, columnOf(table, 'test'));
  const inTest = sideAndAttempt(wordsOf(testText));
  const testKey = column.testKey ?? recogniseTest(inTest.rest.join(' '));
  const test = tests.find(({ key }) => key === testKey);
  if (test === undefined) {
    return testText === '' ? 'no test is named' : `no test of the academy is called “${testText}”`;
  }
  const sideText = cellOf(row, columnOf(table, 'side'));
  const side = column.side ?? readSide(sideText) ?? inTest.side ?? headSide(table);
  if (test.sided && side === null)
    return sideText === '' ? 'no side is named' : `“${sideText}” is neither left nor right`;
  const attemptText = cellOf(row, columnOf(table, 'attempt'));
  const inRow = /\d+/.exec(attemptText)?.[0];
  if (attemptText !== '' && inRow === undefined) return `“${attemptText}” is no number of a trial`;
  const attempt = column.attempt ?? (inRow === undefined ? inTest.attempt : Number(inRow));
  return { testKey: test.key, side: test.sided ? side : null, attempt };
}

const headSide = ({ context }: RecognisedTable) => readSide(context.find('side', 'leg', 'limb') ?? '');

function unitTextOf(table: RecognisedTable, row: SourceRow, column: Column): string | undefined {
  const inRow = cellOf(row, columnOf(table, 'unit'));
  if (inRow !== '') return inRow;
  const inTest = readHeading(cellOf(row, columnOf(table, 'test'))).unit;
  return column.unit?.symbol ?? inTest?.symbol ?? table.context.find('unit', 'units') ?? undefined;
}

/** A remark voids the trial it stands beside; in a row of several trials it must say which. */
function remarkOf(row: SourceRow, column: Column, remarks: readonly Column[], alone: boolean): string | null {
  for (const remark of remarks) {
    const reason = voidReasonOf(cellOf(row, remark), remark.heading.name);
    if (reason === null) continue;
    const headed = remark.testKey !== null || remark.side !== null || remark.attempt !== null;
    const spoken = sideAndAttempt(wordsOf(reason));
    const meant = headed
      ? remark
      : { side: spoken.side, attempt: spoken.attempt, testKey: recogniseTest(spoken.rest.join(' ')) };
    const same = (['testKey', 'side', 'attempt'] as const).every(
      (part) => meant[part] === null || meant[part] === column[part],
    );
    if (alone || (same && meant.attempt !== null)) return reason;
  }
  return null;
}

function labelOf(table: RecognisedTable, row: SourceRow, column: Column): string {
  const parts = (['test', 'side', 'attempt'] as const).map((field) => cellOf(row, columnOf(table, field)));
  return [nameOf(table, row), ...parts, column.field === null ? column.heading.name : '']
    .filter((part) => part !== '')
    .join(', ');
}
