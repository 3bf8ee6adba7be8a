import { describe, expect, it } from 'vitest';
import { driverSessions } from '#src/services/import/driverSessions.ts';
import type { ShotReading } from '#src/services/import/readDriver.ts';
import { reportCsv, summarise, type ReportLine } from '#src/services/import/seasonReport.ts';

const line = (part: Partial<ReportLine>): ReportLine => ({
  ...{ file: 'a.csv', row: 1, column: 2, kind: 'trials', what: 'A', verdict: 'taken', reason: '' },
  ...part,
});

describe('the report', () => {
  it('counts disjointly; an asked growth measure is kept and counts as taken', () => {
    const lines = [
      line({}),
      line({ verdict: 'void' }),
      line({ verdict: 'left out' }),
      line({ kind: 'growth', verdict: 'asked' }),
      line({ kind: 'shots', verdict: 'excluded' }),
      line({ kind: 'file', verdict: 'refused' }),
    ];
    expect(summarise(lines, { academy: 'X', athletes: 2, sessions: 1, outruns: [] })).toEqual({
      ...{ academy: 'X', athletes: 2, sessions: 1, outruns: [] },
      trials: { taken: 1, void: 1, asked: 0, refused: 0 },
      growth: { taken: 1, refused: 0 },
      shots: { taken: 0, excluded: 1, otherClubs: 0, refused: 0 },
      traces: { taken: 0, refused: 0 },
      curves: { taken: 0, refused: 0 },
    });
  });

  it('quotes cells, and disarms what a spreadsheet would run', () => {
    const csv = reportCsv([line({ what: '=HYPERLINK("x")', reason: 'a, b' })]);
    expect(csv).toBe(`file,row,column,kind,what,verdict,reason\na.csv,1,2,trials,"'=HYPERLINK(""x"")",taken,"a, b"\n`);
  });
});

describe('driverSessions', () => {
  const shot = (shotNo: number | null, carryM: number, place = ''): { value: ShotReading; line: ReportLine } => ({
    value: {
      ...{ athleteId: 'a', heldOn: '2026-05-14', place, shotNo, club: 'driver', clubLabel: 'Driver', carryM },
      ...{ clubSpeedMps: 40, ballSpeedMps: 57, launchDeg: 12, spinRpm: 2500 },
      ...{ attackDeg: null, dynamicLoftDeg: null, offlineM: null },
    },
    line: line({}),
  });
  const numbers = (...shots: ReturnType<typeof shot>[]) =>
    driverSessions('2026-05-14', shots, []).flatMap((session) => session.shots.map(({ shotNo }) => shotNo));

  it('keeps the numbers of the file', () => expect(numbers(shot(7, 150), shot(9, 151))).toEqual([7, 9]));
  it('numbers by order where the file does not', () =>
    expect(numbers(shot(null, 150), shot(null, 151))).toEqual([1, 2]));
  it('numbers by order where two different shots bear one number', () => {
    expect(numbers(shot(1, 150), shot(2, 151), shot(1, 152))).toEqual([1, 2, 3]);
  });
  it('gives a row written twice the number of the first', () => {
    expect(numbers(shot(1, 150), shot(1, 150), shot(2, 151))).toEqual([1, 1, 2]);
  });
  it('makes a session of each place', () => {
    expect(driverSessions('2026-05-14', [shot(1, 150, 'Range'), shot(2, 150, 'Dome')], [])).toHaveLength(2);
  });
});
