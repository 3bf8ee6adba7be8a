/** What the report says of a row, a cell or a file. */
export type Verdict = 'taken' | 'void' | 'asked' | 'refused' | 'excluded' | 'other club' | 'left out' | 'note';

export type ReportKind = 'athletes' | 'conditions' | 'trials' | 'growth' | 'shots' | 'traces' | 'curves' | 'file';

/** One line of the report. Rows and columns count from 1; 0 stands for the whole file. */
export interface ReportLine {
  file: string;
  row: number;
  column: number;
  kind: ReportKind;
  what: string;
  verdict: Verdict;
  reason: string;
}

/** The one object at the end of an import. */
export interface SeasonSummary {
  academy: string;
  athletes: number;
  trials: { taken: number; void: number; asked: number; refused: number };
  growth: { taken: number; refused: number };
  sessions: number;
  shots: { taken: number; excluded: number; otherClubs: number; refused: number };
  traces: { taken: number; refused: number };
  curves: { taken: number; refused: number };
  outruns: { athlete: string; level: string; criteria: string[] }[];
}

/**
 * Counts a report's lines. Within a kind the counts are disjoint and sum to the rows or cells read: what is left out
 * (units, averages, blank cells) was not read as one. An asked growth measure is kept, and counts as taken.
 */
export function summarise(
  lines: readonly ReportLine[],
  known: Pick<SeasonSummary, 'academy' | 'athletes' | 'sessions' | 'outruns'>,
): SeasonSummary {
  const count = (kind: ReportKind, ...verdicts: Verdict[]) =>
    lines.filter((line) => line.kind === kind && verdicts.includes(line.verdict)).length;
  const whole = (kind: ReportKind) => ({ taken: count(kind, 'taken', 'asked'), refused: count(kind, 'refused') });
  return {
    academy: known.academy,
    athletes: known.athletes,
    trials: {
      taken: count('trials', 'taken'),
      void: count('trials', 'void'),
      asked: count('trials', 'asked'),
      refused: count('trials', 'refused'),
    },
    growth: whole('growth'),
    sessions: known.sessions,
    shots: {
      taken: count('shots', 'taken'),
      excluded: count('shots', 'excluded'),
      otherClubs: count('shots', 'other club'),
      refused: count('shots', 'refused'),
    },
    traces: whole('traces'),
    curves: whole('curves'),
    outruns: known.outruns,
  };
}

/** The report as CSV, UTF-8. A cell that a spreadsheet would take for a formula gets an apostrophe. */
export function reportCsv(lines: readonly ReportLine[]): string {
  const cell = (value: string | number) => {
    const text = typeof value === 'number' ? String(value) : value.replace(/^([=+\-@\t\r])/, "'$1");
    return /[",\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
  };
  const keys = ['file', 'row', 'column', 'kind', 'what', 'verdict', 'reason'] as const;
  return [keys.join(','), ...lines.map((line) => keys.map((key) => cell(line[key])).join(','))].join('\n') + '\n';
}
