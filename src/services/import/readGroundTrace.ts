import type { GroundEventTimes } from '#src/domain/ground/groundEvents.ts';
import { wordsOf } from '#src/domain/catalogue/wordsOf.ts';
import { fileSubject, numberInName } from '#src/services/import/fileSubject.ts';
import { storedSide } from '#src/services/import/readSide.ts';
import type { ReaderSettings } from '#src/services/import/reading.ts';
import { cellOf, columnOf, type RecognisedTable } from '#src/services/import/recogniseTable.ts';
import { swingEvents } from '#src/services/import/swingEvents.ts';
import { timeSeries } from '#src/services/import/timeSeries.ts';

/** One swing's ground trace: N, or the unit of a pressure mat. */
export interface TraceReading {
  athleteId: string;
  recordedOn: string;
  swingNo: number;
  club: string;
  rig: string;
  measure: 'force' | 'pressure';
  sampleRateHz: number;
  events: GroundEventTimes;
  left: Float64Array;
  right: Float64Array;
}

const DEFAULT_RIG = 'Ground rig';

/**
 * Reads one swing.
 *
 * @returns the trace, or why it is refused
 * @throws {AppError} invalid with file, row and column where a sample cannot be read
 */
export function readGroundTrace(table: RecognisedTable, settings: ReaderSettings): TraceReading | string {
  const subject = fileSubject(table, settings);
  if (typeof subject === 'string') return subject;
  const { athlete, recordedOn } = subject;
  const { channels, sampleRateHz, startS } = timeSeries(table);
  const sided = channels.filter(({ column }) => column.side !== null);
  const of = (wanted: 'left' | 'right') =>
    sided.filter(({ column }) => storedSide(column.side!, athlete.plays) === wanted);
  const [left, right] = [of('left'), of('right')];
  if (left.length !== 1 || right.length !== 1) return 'not one column for the left and one for the right';
  const events = swingEvents(table, startS);
  if (typeof events === 'string') return events;
  const { find } = table.context;
  const club = find('club') ?? cellOf(table.body[0]!, columnOf(table, 'club'));
  const swing = Number(/\d+/.exec(find('swing', 'swing no', 'swing number') ?? '')?.[0] ?? NaN);
  const trace: TraceReading = {
    ...{ athleteId: athlete.id, recordedOn },
    swingNo: Number.isFinite(swing) ? swing : (numberInName(table.file, 'swing', 'shot', 's', 'trial', 'no') ?? 0),
    club: club === '' ? clubInName(table.file) : club.toLowerCase(),
    rig: find('rig', 'device', 'plate', 'plates', 'mat') ?? DEFAULT_RIG,
    measure: left[0]!.measure === 'force' && right[0]!.measure === 'force' ? 'force' : 'pressure',
    ...{ sampleRateHz, events, left: left[0]!.samples, right: right[0]!.samples },
  };
  return withoutNoise(trace) ?? 'a plate reads below zero: its zero was not set';
}

/** An unloaded plate's noise goes a little below zero; beyond 20 N its zero is wrong. */
const NOISE_N = 20;

function withoutNoise(trace: TraceReading): TraceReading | null {
  if (Math.min(lowestOf(trace.left), lowestOf(trace.right)) < -NOISE_N) return null;
  const atLeastZero = (samples: Float64Array) => samples.map((value) => Math.max(0, value));
  return { ...trace, left: atLeastZero(trace.left), right: atLeastZero(trace.right) };
}

function lowestOf(samples: Float64Array): number {
  let lowest = Infinity;
  for (const value of samples) if (value < lowest) lowest = value;
  return lowest;
}

function clubInName(path: string): string {
  const words = wordsOf(path).join(' ');
  const iron = /\b(\d) ?(iron|i)\b/.exec(words);
  if (iron) return `${iron[1]} iron`;
  return /\b(wedge|hybrid|putter|iron)\b/.exec(words)?.[1] ?? 'driver';
}
