/** What stands between the cells. */
export type Delimiter = '\t' | ';' | '|' | ',';

/** In this order: a comma is also a decimal mark, so that it is taken last. */
const CANDIDATES: readonly Delimiter[] = ['\t', ';', '|', ','];
const LINES_LOOKED_AT = 60;
const LEAST_SHARE = 0.5;

/**
 * The delimiter of a table: the first of tab, semicolon, bar and comma that cuts most lines into the same number of
 * cells; where none does, the one that occurs most.
 *
 * @param lines the table's lines, comments left out
 * @returns the delimiter; a comma for a single column
 * @example sniffDelimiter(['time (s);force (N)', '0,000;520,7']) // → ';'
 */
export function sniffDelimiter(lines: readonly string[]): Delimiter {
  const filled = lines.filter((line) => line.trim() !== '').slice(0, LINES_LOOKED_AT);
  const counted = CANDIDATES.map((delimiter) => ({
    delimiter,
    counts: filled.map((line) => cellsOf(line, delimiter)),
  }));
  const steady = counted.find(({ counts }) => steadyShare(counts) > LEAST_SHARE);
  if (steady) return steady.delimiter;
  const total = ({ counts }: { counts: number[] }) => counts.reduce((sum, count) => sum + count - 1, 0);
  return counted.reduce((most, each) => (total(each) > total(most) ? each : most), counted.at(-1)!).delimiter;
}

function cellsOf(line: string, delimiter: Delimiter): number {
  let quoted = false;
  let cells = 1;
  for (const character of line) {
    if (character === '"') quoted = !quoted;
    else if (character === delimiter && !quoted) cells += 1;
  }
  return cells;
}

/** The share of lines that have the most frequent number of cells, of two or more. */
function steadyShare(counts: readonly number[]): number {
  const times = new Map<number, number>();
  for (const count of counts) if (count > 1) times.set(count, (times.get(count) ?? 0) + 1);
  return counts.length === 0 ? 0 : Math.max(0, ...times.values()) / counts.length;
}
