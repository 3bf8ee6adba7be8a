import { dayNumber } from '#src/domain/calendar/dayNumber.ts';
import { DAYS_PER_YEAR } from '#src/domain/growth/ageYears.ts';
import { readBattery, type TrialReading } from '#src/services/import/readBattery.ts';
import { conditionsAtHead, readConditions, type SessionConditions } from '#src/services/import/readConditions.ts';
import { readDriver, type ShotReading } from '#src/services/import/readDriver.ts';
import { readForceCurve, type CurveReading } from '#src/services/import/readForceCurve.ts';
import { readGroundTrace, type TraceReading } from '#src/services/import/readGroundTrace.ts';
import { readGrowth, type GrowthReading } from '#src/services/import/readGrowth.ts';
import { fileLine, unusableLine } from '#src/services/import/recogniseFolder.ts';
import type { RecognisedTable } from '#src/services/import/recogniseTable.ts';
import type { KnownAthlete, Reading, ReaderSettings, Readings } from '#src/services/import/reading.ts';
import type { ReportKind, ReportLine } from '#src/services/import/seasonReport.ts';
import type { settleDateOrders } from '#src/services/import/settleDates.ts';
import type { TrialTest } from '#src/services/import/trialUnits.ts';

/** A reading that has its line in the report: recording settles the verdict on the line. */
export interface Read<T> {
  value: T;
  line: ReportLine;
}

/** All that a season's files hold, and every line of the report so far. */
export interface Season {
  trials: Read<TrialReading>[];
  growth: Read<GrowthReading>[];
  shots: Read<ShotReading>[];
  traces: Read<TraceReading>[];
  curves: Read<CurveReading>[];
  conditions: SessionConditions[];
  lines: ReportLine[];
  /** Rows read, by file. */
  rowsRead: Map<string, number>;
}

export interface SeasonSettings {
  athletes: readonly KnownAthlete[];
  tests: readonly TrialTest[];
  dates: ReturnType<typeof settleDateOrders>;
}

const AGES = { youngest: 4, oldest: 25 } as const;

/** Reads every table of a season but the list of athletes. */
export function readSeason(tables: readonly RecognisedTable[], { athletes, tests, dates }: SeasonSettings): Season {
  const season: Season = {
    ...{ trials: [], growth: [], shots: [], traces: [], curves: [], conditions: [] },
    ...{ lines: [], rowsRead: new Map() },
  };
  const born = new Map(athletes.map(({ id, birthDate }) => [id, birthDate]));
  for (const table of tables) {
    const settings = { athletes, dateOrder: dates.orderOf(table), nameOrder: dates.forNames };
    season.rowsRead.set(table.file, table.body.length);
    const add = <T extends { athleteId: string }>(
      kind: ReportKind,
      into: Read<T>[],
      read: Readings<T>,
      on: (value: T) => string,
    ) => {
      addReadings(season, table.file, kind, read, (reading, line) => {
        const age = ageProblem(born.get(reading.athleteId), on(reading));
        if (age === null) into.push({ value: reading, line });
        else Object.assign(line, { verdict: 'refused', reason: age });
      });
    };
    for (const kind of table.kinds) {
      try {
        if (kind === 'battery')
          add('trials', season.trials, readBattery(table, { ...settings, tests }), ({ heldOn }) => heldOn);
        if (kind === 'growth')
          add('growth', season.growth, readGrowth(table, settings), ({ measuredOn }) => measuredOn);
        if (kind === 'driver') {
          const read = readDriver(table, settings);
          add('shots', season.shots, read, ({ heldOn }) => heldOn);
          const heldOn = read.readings.find(({ value }) => value !== null)?.value?.heldOn;
          const atHead = heldOn === undefined ? null : conditionsAtHead(table, heldOn);
          if (atHead) season.conditions.unshift(atHead);
        }
        if (kind === 'conditions') {
          addReadings(season, table.file, 'conditions', readConditions(table, settings), (value) =>
            season.conditions.push(value),
          );
        }
      } catch (error) {
        season.lines.push(unusableLine(table.file, 'file', error));
      }
    }
    readRecording(season, table, settings, born);
  }
  return season;
}

/** A trace or a curve: one file, one line of the report. */
function readRecording(
  season: Season,
  table: RecognisedTable,
  settings: ReaderSettings,
  born: ReadonlyMap<string, string>,
): void {
  const isTrace = table.kinds[0] === 'ground trace';
  if (!isTrace && table.kinds[0] !== 'force curve') return;
  const kind = isTrace ? 'traces' : 'curves';
  const line: ReportLine = { ...fileLine(table.file, 'taken', ''), kind };
  const take = <T extends { athleteId: string; recordedOn: string }>(value: T | string, into: Read<T>[]) => {
    const problem = typeof value === 'string' ? value : ageProblem(born.get(value.athleteId), value.recordedOn);
    if (problem === null) into.push({ value: value as T, line });
    else Object.assign(line, { verdict: 'refused', reason: problem });
    season.lines.push(line);
  };
  try {
    if (isTrace) take(readGroundTrace(table, settings), season.traces);
    else take(readForceCurve(table, settings), season.curves);
  } catch (error) {
    season.lines.push(unusableLine(table.file, kind, error));
  }
}

function addReadings<T>(
  { lines }: Season,
  file: string,
  kind: ReportKind,
  { readings, leftOut, notes }: Readings<T>,
  keep: (value: T, line: ReportLine) => void,
): void {
  for (const reading of readings) {
    const line = lineOf(reading, kind);
    lines.push(line);
    if (reading.value !== null) keep(reading.value, line);
  }
  lines.push(...leftOut.map(({ line, why }) => ({ ...fileLine(file, 'left out', why), row: line })));
  lines.push(...notes.map((note) => fileLine(file, 'note', note)));
}

const lineOf = <T>({ file, line, column, label, refused }: Reading<T>, kind: ReportKind): ReportLine => ({
  ...{ file, row: line, column, kind, what: label },
  verdict: refused === null ? 'taken' : 'refused',
  reason: refused ?? '',
});

/** A date that makes an athlete a toddler, or unborn, is a wrong date. */
function ageProblem(birthDate: string | undefined, on: string): string | null {
  if (birthDate === undefined) return 'no such athlete';
  const years = (dayNumber(on) - dayNumber(birthDate)) / DAYS_PER_YEAR;
  if (years >= AGES.youngest && years <= AGES.oldest) return null;
  return `on ${on} the athlete ${years < 0 ? 'was not born' : `was ${Math.floor(years)}`}: a wrong date`;
}
