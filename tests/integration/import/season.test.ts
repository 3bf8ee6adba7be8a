import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import pg from 'pg';
import { beforeAll, describe, expect, it } from 'vitest';
import type { ReportLine, Verdict } from '#src/services/import/seasonReport.ts';
import { useTestDatabase } from '#tests/config/testDatabase.ts';
import { importFrom } from '#tests/integration/import/inFolder.ts';

const FOLDER = join(process.cwd(), 'tests/fixtures/season');
type Cell = [file: string, row: number, column: number, ...rest: (string | number)[]];
type Row = [file: string, row: number, ...rest: (string | number)[]];
const blemishes = JSON.parse(readFileSync('tests/fixtures/season-blemishes.json', 'utf8')) as {
  trials: { read: number; asked: Cell[]; void: Cell[]; blankCells: Cell[]; inches: Cell[] };
  growth: { read: number; pounds: Row[] };
  shots: {
    read: number;
    sessions: number;
    excluded: Row[];
    otherClubs: Row[];
    averageRows: Row[];
    unitRows: Row[];
    blankReadings: Cell[];
  };
  recordings: { traces: number; curves: number };
  athletes: { read: number; leftHanded: string[] };
};

const database = useTestDatabase();

async function query<T extends pg.QueryResultRow>(text: string, values: unknown[] = []): Promise<T[]> {
  const client = new pg.Client({ connectionString: database().superuserUrl });
  await client.connect();
  try {
    return (await client.query<T>(text, values)).rows;
  } finally {
    await client.end();
  }
}

const cells = (lines: readonly ReportLine[], kind: ReportLine['kind'], ...verdicts: Verdict[]) =>
  lines
    .filter((line) => line.kind === kind && verdicts.includes(line.verdict))
    .map(({ file, row, column }) => `${file} ${row} ${column}`)
    .sort();
const rows = (lines: readonly ReportLine[], kind: ReportLine['kind'], ...verdicts: Verdict[]) =>
  lines
    .filter((line) => line.kind === kind && verdicts.includes(line.verdict))
    .map(({ file, row }) => `${file} ${row}`)
    .sort();
const cellKeys = (list: readonly Cell[]) => list.map(([file, row, column]) => `${file} ${row} ${column}`).sort();
const rowKeys = (list: readonly Row[]) => list.map(([file, row]) => `${file} ${row}`).sort();
const sum = (counts: object) => Object.values(counts).reduce((total: number, count: number) => total + count, 0);

describe('the season', () => {
  let first: Awaited<ReturnType<typeof importFrom>>;
  beforeAll(async () => {
    first = await importFrom(FOLDER, 'Dunes Junior Academy');
  });

  it('accounts for every row and cell, each once', () => {
    const { summary } = first;
    expect(summary.athletes).toBe(blemishes.athletes.read);
    expect(sum(summary.trials)).toBe(blemishes.trials.read);
    expect(sum(summary.growth)).toBe(blemishes.growth.read);
    expect(sum(summary.shots)).toBe(blemishes.shots.read);
    expect(sum(summary.traces)).toBe(blemishes.recordings.traces);
    expect(sum(summary.curves)).toBe(blemishes.recordings.curves);
    expect(summary.sessions).toBe(blemishes.shots.sessions);
  });

  it('gives every blemish its verdict and nothing else one', () => {
    const { lines, summary } = first;
    expect(cells(lines, 'trials', 'asked')).toEqual(cellKeys(blemishes.trials.asked));
    expect(cells(lines, 'trials', 'void')).toEqual(cellKeys(blemishes.trials.void));
    expect(rows(lines, 'shots', 'excluded')).toEqual(rowKeys(blemishes.shots.excluded));
    expect(rows(lines, 'shots', 'other club')).toEqual(rowKeys(blemishes.shots.otherClubs));
    const leftOut = [...blemishes.shots.averageRows, ...blemishes.shots.unitRows];
    expect(rows(lines, 'file', 'left out')).toEqual(rowKeys(leftOut));
    const spoken = new Set(cells(lines, 'trials', 'taken', 'void', 'asked', 'refused'));
    expect(cellKeys(blemishes.trials.blankCells).filter((cell) => spoken.has(cell))).toEqual([]);
    expect(lines.filter(({ verdict }) => verdict === 'refused' || verdict === 'note')).toEqual([]);
    expect(summary.trials.refused + summary.growth.refused + summary.shots.refused).toBe(0);
  });

  it('says why a value is asked and a shot excluded', () => {
    const reason = (verdict: Verdict, [file, row]: Row | Cell) =>
      first.lines.find((line) => line.file === file && line.row === row && line.verdict === verdict)?.reason;
    for (const cell of blemishes.trials.asked) expect(reason('asked', cell)).toBe(`looks ${cell[3]}`);
    for (const cell of blemishes.trials.void) expect(reason('void', cell)).toBe(cell[3]);
    const rules = {
      'short of the model': /% of the .* that its launch/,
      'far from the median': /scaled median deviations/,
    };
    for (const shot of blemishes.shots.excluded) {
      expect(reason('excluded', shot)).toMatch(rules[shot[2] as keyof typeof rules]);
    }
  });

  it('reads inches, pounds, miles and yards', async () => {
    const trials = await query<{ origin: string; value_si: number; entered_unit: string }>(
      `select origin, value_si, entered_unit from trial where entered_unit = 'in'`,
    );
    const byOrigin = new Map(trials.map((trial) => [trial.origin, trial.value_si]));
    expect(trials).toHaveLength(blemishes.trials.inches.length);
    for (const [file, row, column, , metres] of blemishes.trials.inches) {
      expect(byOrigin.get(`${file}, row ${row}, column ${column}`)).toBeCloseTo(metres as number, 8);
    }
    const masses = await query<{ mass_kg: number }>(
      `select mass_kg from growth_measure where entered ->> 'massKg' like '%lb'`,
    );
    const byMass = (a: number, b: number) => a - b;
    const kilograms = masses.map(({ mass_kg: mass }) => mass).sort(byMass);
    const written = blemishes.growth.pounds.map(([, , , kg]) => kg as number).sort(byMass);
    expect(kilograms.map((kg) => kg.toFixed(6))).toEqual(written.map((kg) => kg.toFixed(6)));
    // By hand: row 4 of driver_2025-01-22.csv, 158.6 yd × 0.9144 and 112.9 mph × 0.44704.
    const [shot] = await query<{ carry_m: number; ball_speed_mps: number }>(
      `select carry_m, ball_speed_mps from shot join driver_session s on s.id = driver_session_id
       join athlete a on a.id = athlete_id
       where held_on = '2025-01-22' and shot_no = 2 and family_name = 'Novak'`,
    );
    expect(shot).toEqual({ carry_m: expect.closeTo(145.02384, 6), ball_speed_mps: expect.closeTo(50.470816, 6) });
  });

  it('mirrors both left-handers', async () => {
    for (const name of blemishes.athletes.leftHanded) {
      const [given, family] = name.split(' ') as [string, string];
      const [hand] = await query<{ plays: string }>(
        `select plays from handedness h join athlete a on a.id = h.athlete_id where family_name = $1`,
        [family],
      );
      expect(hand?.plays).toBe('left');
      const sheet = readFileSync(join(FOLDER, 'battery_2026-09-12.csv'), 'utf8').split('\r\n');
      const valid = (leg: string) =>
        sheet
          .map((row) => row.split(','))
          .filter((row) => row[0] === name && row[1] === 'Single-leg isometric push' && row[2] === leg && !row[6])
          .map((row) => Number(row[4]));
      const [judged] = await query<{
        history: { strength: { on: string; test: string; leadTrials: number[]; trailTrials: number[] }[] };
      }>(
        `select history from judgement j join athlete a on a.id = j.athlete_id
         where given_name = $1 and family_name = $2 order by made_at desc limit 1`,
        [given, family],
      );
      const push = judged?.history.strength.filter(({ test }) => test === 'push').at(-1);
      expect(push?.on).toBe(sheet.some((row) => row.startsWith(name)) ? '2026-09-12' : '2026-05-09');
      if (push?.on === '2026-09-12') {
        expect(push.leadTrials).toEqual(valid('right'));
        expect(push.trailTrials).toEqual(valid('left'));
      }
    }
    // Castellano plays left: her lead plate is the right one (third column), its peak between top and finish.
    const file = readFileSync(join(FOLDER, 'ground/Castellano_Zora_2026-09-14_swing1.csv'), 'utf8').split('\n');
    const [, top, finish] = /top=([\d.]+).*finish=([\d.]+)/.exec(file[0]!)!.map(Number);
    const right = file
      .slice(2)
      .map((row) => row.split(',').map(Number))
      .filter(([time]) => time! >= top! && time! <= finish!)
      .map(([, , value]) => value!);
    const [trace] = await query<{ figures: Record<'left' | 'right', { peakLead: { force: number } }> }>(
      `select figures from ground_trace t join athlete a on a.id = t.athlete_id
       where family_name = 'Castellano' and recorded_on = '2026-09-14' and swing_no = 1`,
    );
    expect(trace?.figures.right.peakLead.force).toBe(Math.max(...right));
  });

  it('makes one director and two coaches for all squads, keeps parents uninvited, and shows seven terms', async () => {
    expect(first.signIns.map(({ role }) => role)).toEqual(['director', 'strength_coach', 'swing_coach']);
    expect(new Set(first.signIns.map(({ password }) => password)).size).toBe(3);
    const [counts] = await query(
      `select (select count(*)::int from squad) squads, (select count(*)::int from squad_coach) coached,
         (select count(*)::int from membership) members, (select count(*)::int from term) terms,
         (select count(*)::int from guardian_address where invited_at is null) addresses,
         (select count(*)::int from guardian_address where invited_at is not null) invited`,
    );
    expect(counts).toEqual({ squads: 2, coached: 4, members: 3, terms: 7, addresses: 24, invited: 0 });
  });

  it('raises outruns and tells those that are open, with the criteria of the judgement that held the level', async () => {
    expect(first.summary.outruns.length).toBeGreaterThan(0);
    const open = await query<{
      athlete: string;
      level: string;
      result: { criteria: { name: string; verdict: string }[] };
    }>(
      `select given_name || ' ' || family_name as athlete, o.level, j.result from outrun o
       join athlete a on a.id = o.athlete_id join judgement j on j.id = o.level_judgement_id
       where state in ('raised', 'discussed', 'in hand')`,
    );
    const told = open.map(({ athlete, level, result }) => ({
      athlete,
      level,
      criteria: result.criteria.filter(({ verdict }) => /^(met|strong)$/.test(verdict)).map(({ name }) => name),
    }));
    const byName = (a: { athlete: string }, b: { athlete: string }) => (a.athlete < b.athlete ? -1 : 1);
    expect([...first.summary.outruns].sort(byName)).toEqual(told.sort(byName));
    for (const { criteria } of first.summary.outruns) expect(criteria).toContain('lead-deficit');
  });

  it('takes nothing twice, and tells the same', async () => {
    const counted = () =>
      query(
        [
          'athlete',
          'trial',
          'curve',
          'growth_measure',
          'driver_session',
          'shot',
          'ground_trace',
          'ground_channel',
          'judgement',
          'outrun',
          'outrun_event',
          'membership',
          'import_file',
          'audit',
        ]
          .map((table) => `select '${table}' as name, count(*)::int from ${table}`)
          .join(' union all '),
      );
    const before = await counted();
    const second = await importFrom(FOLDER, 'Dunes Junior Academy');
    expect(await counted()).toEqual(before);
    expect(second.summary).toEqual(first.summary);
    expect(second.lines).toEqual(first.lines);
    expect(second.signIns).toEqual([]);
  });
});
