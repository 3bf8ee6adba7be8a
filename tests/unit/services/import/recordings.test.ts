import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { readForceCurve } from '#src/services/import/readForceCurve.ts';
import { readGroundTrace } from '#src/services/import/readGroundTrace.ts';
import { timeSeries } from '#src/services/import/timeSeries.ts';
import { SETTINGS, tableFrom } from '#tests/unit/services/import/tableFrom.ts';

const EVENTS = '# takeaway=0.200 s; top=0.980 s; earlyDownswing=1.060 s; leadArmParallel=1.130 s; impact=1.240 s';
const rows = (count: number, row: (i: number) => string) => Array.from({ length: count }, (_, i) => row(i)).join('\n');
const samples = rows(800, (i) => `${(i / 500).toFixed(3)},${300 + (i % 7)},${200 + (i % 5)}`);
const trace = (text: string, file = 'ground/Okafor_Vesna_2026-01-21_swing3.csv') =>
  readGroundTrace(tableFrom(text, file), SETTINGS);

describe('readGroundTrace', () => {
  it('reads samples, moments, athlete, date and number', () => {
    const read = trace(`${EVENTS}\ntime s,left Fz N,right Fz N\n${samples}\n`);
    expect(read).toMatchObject({
      ...{ athleteId: 'vesna', recordedOn: '2026-01-21', swingNo: 3, club: 'driver', rig: 'Ground rig' },
      ...{ measure: 'force', sampleRateHz: 500 },
      events: { takeaway: 0.2, top: 0.98, earlyDownswing: 1.06, leadArmParallel: 1.13, impact: 1.24 },
    });
    if (typeof read === 'string') throw new Error(read);
    expect([read.left[1], read.right[1], read.left.length]).toEqual([301, 201, 800]);
  });

  it('turns lead and trail into sides, a clock that starts late into seconds from the first sample, kgf into N', () => {
    const body = rows(800, (i) => `${5000 + i * 2};${10 + (i % 2)};${20}`);
    const read = trace(
      `athlete: Okafor, Vesna\ndate: 14 May 2026\nclub: 7 iron\nta: 5200 ms\nTop of backswing: 5980 ms\nlead arm parallel: 6130 ms\nBall contact: 6240 ms\nTime (ms);Lead Fz (kgf);Trail Fz (kgf)\n${body}\n`,
      'one.csv',
    );
    if (typeof read === 'string') throw new Error(read);
    // Vesna plays left: the lead side is the right one. 1 kgf = 9.80665 N exactly.
    expect([read.right[0], read.left[0]]).toEqual([expect.closeTo(98.0665, 9), expect.closeTo(196.133, 9)]);
    expect(read).toMatchObject({ recordedOn: '2026-05-14', club: '7 iron', events: { takeaway: 0.2, impact: 1.24 } });
  });

  it.each([
    [
      `time s,left Fz N,right Fz N\n${samples}`,
      'the moments of the swing are not all given: takeaway, top, lead arm parallel, impact',
    ],
    [
      `${EVENTS.replace('impact=1.240 s', 'impact=?')}\ntime s,left Fz N,right Fz N\n${samples}`,
      'row 1: “?” is no time of impact',
    ],
    [
      `${EVENTS}\ntime s,left Fz N,right Fz N\n${samples.replace('0.100,301,200', '0.100,-90,200')}`,
      'a plate reads below zero: its zero was not set',
    ],
  ])('refuses', (text, reason) => expect(trace(text)).toBe(reason));

  it('reads moments with a decimal comma', () => {
    const text = `${EVENTS.replaceAll('.', ',')}\ntime s;left Fz N;right Fz N\n${samples.replaceAll(',', ';').replaceAll('.', ',')}`;
    expect(trace(text)).toMatchObject({ events: { leadArmParallel: 1.13, impact: 1.24 }, sampleRateHz: 500 });
  });

  it('refuses a trace of nobody and of no day', () => {
    const text = `${EVENTS}\ntime s,left Fz N,right Fz N\n${samples}`;
    expect(trace(text, 'swing3_2026-01-21.csv')).toBe('no athlete is named, neither in the file nor in its name');
    expect(trace(text, 'Okafor Vesna.csv')).toBe('no date in the file, nor in its name');
  });
});

describe('timeSeries', () => {
  const series = (text: string) => timeSeries(tableFrom(text, 'a.csv'));
  const force = (count: number, row: (i: number) => string) => `time s,force N\n${rows(count, row)}\n`;

  it('takes the rate from a rounded clock', () => {
    expect(series(force(1000, (i) => `${(i / 240).toFixed(3)},500`)).sampleRateHz).toBe(240);
  });

  it.each([
    [force(100, (i) => `${i / 100},${i === 50 ? 'NaN' : 500}`), 'a.csv, row 52, column 2: “NaN” is no number'],
    [force(100, (i) => (i === 99 ? '0.99' : `${i / 100},500`)), 'a.csv, row 101, column 2: a sample is missing'],
    [force(100, (i) => `${(i < 50 ? i : i + 9) / 100},500`), 'a.csv, row 52, column 1: the time moves on by 0.1000 s'],
    [force(100, () => `1,500`), 'a.csv, column 1: the time does not move on'],
    [force(5, (i) => `${i},500`), 'a.csv: only 5 samples'],
  ])('refuses', (text, reason) => expect(() => series(text)).toThrow(reason));
});

describe('readForceCurve', () => {
  const text = readFileSync('tests/fixtures/season/jumps/Okafor_Vesna_left_2026-09-12.csv', 'utf8');
  const curve = (head: string, file: string) => readForceCurve(tableFrom(`${head}${text}`, file), SETTINGS);

  it('reads decimal commas, and side and date from the name', () => {
    const read = curve('', 'jumps/Okafor_Vesna_left_2026-09-12.csv');
    expect(read).toMatchObject({
      athleteId: 'vesna',
      recordedOn: '2026-09-12',
      side: 'left',
      testKey: 'jump',
      sampleRateHz: 1000,
    });
    // By hand: the first rows of the file.
    if (typeof read === 'string') throw new Error(read);
    expect(read.samples[0]).toBeCloseTo(Number(text.split('\n')[1]!.split(';')[1]!.replace(',', '.')), 9);
  });

  it('lets the head of the file speak before its name, and mirrors the lead side', () => {
    const head = '# athlete: Okafor, Vesna; leg: lead; date: 2026-09-13; test: isometric push\n';
    expect(curve(head, 'x_left.csv')).toMatchObject({ side: 'right', recordedOn: '2026-09-13', testKey: 'push' });
  });

  it('refuses a curve without a side', () => {
    expect(curve('', 'Okafor_Vesna_2026-09-12.csv')).toBe('no side is named, neither in the file nor in its name');
  });
});
