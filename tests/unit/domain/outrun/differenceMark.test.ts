import { describe, expect, it } from 'vitest';
import { differenceMark } from '#src/domain/outrun/differenceMark.ts';
import { session } from '#tests/unit/domain/outrun/historyOf.ts';

const DATES = ['2025-01-18', '2025-05-10', '2025-09-13', '2026-01-17'];
const push = (...leads: number[]) => leads.map((lead, i) => session(DATES[i]!, 'push', lead, 560));
const markOf = (...leads: number[]) => differenceMark({ sessions: push(...leads) }).mark;

it('gives the difference with its error between days, by hand: A13 −10.714286, SE (500/560)·√2·3.403430', () => {
  const result = differenceMark({ sessions: push(500, 500) });
  expect(result.differencePct).toBeCloseTo(-10.714286, 6);
  expect(result.standardErrorPct).toBeCloseTo((500 / 560) * Math.SQRT2 * 3.4034296427770228, 9);
  const [low, high] = result.interval90Pct!;
  expect((high - low) / 2).toBeCloseTo(1.6448536269514722 * result.standardErrorPct!, 12);
  expect(result).toMatchObject({ mark: 'beyond noise', on: '2025-05-10', nLead: 3, nTrail: 3, reason: null });
});

describe('the marks (our own words; the first session of a test is for learning it)', () => {
  it.each([
    { leads: [500], mark: null },
    { leads: [500, 550], mark: 'inside noise' },
    { leads: [500, 500], mark: 'beyond noise' },
    { leads: [500, 550, 500], mark: 'beyond noise' },
    { leads: [500, 500, 500], mark: 'same side twice' },
    { leads: [500, 500, 500, 550], mark: 'inside noise' },
    { leads: [500, 500, 560], mark: null },
    { leads: [500, 500, 700], mark: null },
  ])('$leads of 560: $mark', ({ leads, mark }) => expect(markOf(...leads)).toBe(mark));

  it('tells a stronger lead leg from nothing to judge', () => {
    expect(differenceMark({ sessions: push(500, 700) })).toMatchObject({ mark: null, reason: null });
    expect(differenceMark({ sessions: push(500) }).reason).toContain('learning');
    expect(differenceMark({ sessions: [] }).reason).toBe('Not tested yet.');
    expect(differenceMark({ sessions: push(0, 0).map((row) => ({ ...row, trailTrials: [0, 0] })) }).mark).toBeNull();
  });

  it('leaves out sessions after a date, and needs one test', () => {
    const result = differenceMark({ sessions: push(500, 500, 700), asOf: '2025-05-10' });
    expect(result.mark).toBe('beyond noise');
    expect(() => differenceMark({ sessions: [...push(500), session('2025-05-10', 'hop', 1, 1)] })).toThrow(RangeError);
  });
});
