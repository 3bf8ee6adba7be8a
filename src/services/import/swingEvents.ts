import { wordsOf } from '#src/domain/catalogue/wordsOf.ts';
import { GROUND_EVENTS, type GroundEvent, type GroundEventTimes } from '#src/domain/ground/groundEvents.ts';
import { parseNumber } from '#src/domain/units/parseNumber.ts';
import { parseUnit } from '#src/domain/units/parseUnit.ts';
import { cellOf, columnOf, type RecognisedTable } from '#src/services/import/recogniseTable.ts';

/** What files call the moments of the swing, words put together. */
const NAMES: Readonly<Record<string, GroundEvent>> = {
  ...{ takeaway: 'takeaway', ta: 'takeaway', startofswing: 'takeaway', swingstart: 'takeaway', start: 'takeaway' },
  ...{ latebackswing: 'lateBackswing', lb: 'lateBackswing' },
  ...{ top: 'top', topofbackswing: 'top', tb: 'top', topofswing: 'top', backswingtop: 'top' },
  ...{ earlydownswing: 'earlyDownswing', ed: 'earlyDownswing' },
  ...{ leadarmparallel: 'leadArmParallel', lap: 'leadArmParallel', armparallel: 'leadArmParallel' },
  ...{ leadarmparalleldown: 'leadArmParallel', leadarmparalleldownswing: 'leadArmParallel' },
  ...{ middownswing: 'midDownswing', md: 'midDownswing' },
  ...{ impact: 'impact', contact: 'impact', ballcontact: 'impact', bc: 'impact', strike: 'impact' },
  ...{ finish: 'finish', end: 'finish', endofswing: 'finish', finishofswing: 'finish' },
};
const NEEDED = ['takeaway', 'top', 'leadArmParallel', 'impact'] as const;

/**
 * The moments of a swing, from comments, the rows above the headings, or a column that names them.
 *
 * @param startS the clock's reading at the first sample, from which the moments are counted
 * @returns the times in s, or why they do not do
 */
export function swingEvents(table: RecognisedTable, startS: number): GroundEventTimes | string {
  const found: Partial<Record<GroundEvent, number>> = {};
  for (const { key, value, line } of table.context.entries) {
    const name = eventOf(key);
    if (name === null) continue;
    const time = secondsOf(value, key);
    if (time === null) return `row ${line}: “${value}” is no time of ${name}`;
    found[name] ??= time - startS;
  }
  const eventColumn = columnOf(table, 'event');
  const timeColumn = columnOf(table, 'time');
  for (const row of eventColumn && timeColumn ? table.body : []) {
    const name = eventOf(wordsOf(cellOf(row, eventColumn)).join(' '));
    if (name === null || found[name] !== undefined) continue;
    const time = secondsOf(cellOf(row, timeColumn), '', timeColumn!.unit?.factor);
    if (time !== null) found[name] = time - startS;
  }
  const missing = NEEDED.filter((name) => found[name] === undefined);
  if (missing.length > 0) return `the moments of the swing are not all given: ${missing.map(eventWords).join(', ')}`;
  return Object.fromEntries(
    GROUND_EVENTS.flatMap((name) => (found[name] === undefined ? [] : [[name, round(found[name])]])),
  ) as GroundEventTimes;
}

const eventOf = (key: string): GroundEvent | null =>
  NAMES[key.replace(/\b(ms|s|sec|time|at|event|t)\b/g, '').replace(/\s+/g, '')] ?? null;

const eventWords = (name: GroundEvent): string => name.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);

function secondsOf(text: string, key: string, factor?: number): number | null {
  // No moment of a swing lies a thousand seconds on: a comma is the decimal mark.
  const number = parseNumber(text) ?? parseNumber(text, ',');
  if (number === null) return null;
  const unit = number.unit === null ? null : parseUnit(number.unit);
  if (number.unit !== null && unit?.quantity !== 'time') return null;
  return number.value * (unit?.factor ?? factor ?? (/\bms\b/.test(key) ? 0.001 : 1));
}

const round = (time: number): number => Math.round(time * 1e9) / 1e9;
