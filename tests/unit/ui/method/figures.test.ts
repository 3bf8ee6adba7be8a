import { describe, expect, it } from 'vitest';
import { jumpCurve } from '#src/domain/jump/jumpCurve.ts';
import { exampleJump, exampleSwing } from '#src/services/method/content/exampleCurves.ts';
import { tracesOf } from '#src/ui/method/tracesOf.ts';
import { figureRows, figureText } from '#src/ui/words/figureRows.ts';
import { partTables } from '#src/ui/words/partTables.ts';

describe('figureText', () => {
  it.each([
    [-10.714285714, '−10.714286'],
    [0, '0'],
    [0.1 + 0.2, '0.3'],
    [1e-9, '1e−9'],
    [123456789, '123456790'],
  ])('%d', (value, text) => expect(figureText(value)).toBe(text));
});

describe('figureRows', () => {
  it('names every figure and leaves out the reason and what is hidden', () => {
    const answer = {
      value: 1.5,
      interval90: [-1, 2],
      level: null,
      met: true,
      daily: [1, 2, 3],
      notes: ['One.', 'Two.'],
      criteria: [{ name: 'lead-deficit', verdict: 'met', interval90: null }],
      shots: [{ carry: 150 }],
      policy: { look: 3 },
      odd: { deep: 4 },
      reason: 'not a row',
    };
    const labels = {
      value: 'Value, m',
      interval90: 'Interval, m',
      'criteria.*.verdict': 'verdict',
      'lead-deficit': 'Lead deficit',
      'shots.*.carry': 'carry, m',
      policy: '',
    };
    expect(figureRows(answer, labels).map(({ path, label, lines }) => [path, label, ...lines])).toEqual([
      ['value', 'Value, m', '1.5'],
      ['interval90', 'Interval, m', '−1 to 2'],
      ['level', 'level'],
      ['met', 'met', 'yes'],
      ['daily', 'daily', '1, 2, 3'],
      ['notes', 'notes', 'One.', 'Two.'],
      ['criteria.0.verdict', 'Lead deficit: verdict', 'met'],
      ['criteria.0.interval90', 'Lead deficit: interval90'],
      ['shots.0.carry', '1: carry, m', '150'],
      ['odd.deep', 'deep', '4'],
    ]);
    expect(partTables(figureRows(answer, { ...labels, shots: 'Shot by shot' }))).toMatchObject([
      {
        list: 'criteria',
        columns: [
          { figure: 'verdict', numeric: false },
          { figure: 'interval90', numeric: false },
        ],
        rows: [{ name: 'Lead deficit', cells: [{ lines: ['met'] }, { lines: [] }] }],
      },
      {
        list: 'Shot by shot',
        columns: [{ figure: 'carry, m', numeric: true }],
        rows: [{ name: '1', cells: [{ lines: ['150'] }] }],
      },
    ]);
  });

  it('a part that lacks a figure of its neighbours leaves its cell empty', () => {
    const [table] = partTables(figureRows({ shots: [{ carry: 150 }, { reason: 'no spin' }] }, {}));
    expect(table!.columns.map(({ figure }) => figure)).toEqual(['carry', 'reason']);
    expect(table!.rows.map(({ cells }) => cells.map((cell) => cell?.lines))).toEqual([
      [['150'], undefined],
      [undefined, ['no spin']],
    ]);
  });
});

describe('tracesOf', () => {
  it('draws a jump with its moments in order, and its motion up to take-off', () => {
    const jump = exampleJump();
    const answer = jumpCurve(jump);
    const [force, velocity, displacement] = tracesOf('jump-curve', jump, answer);
    expect(force!.marks.map(({ label }) => label)).toEqual([
      'first movement',
      'braking',
      'propulsion',
      'take-off',
      'landing',
    ]);
    const times = force!.marks.map(({ at }) => at);
    expect(times).toEqual([...times].sort((a, b) => a - b));
    // by hand, from the two lobes: velocity turns at 1.3 s, is 0 at 1.4333 s
    expect(times[1]).toBeCloseTo(1.3, 2);
    expect(times[2]).toBeCloseTo(1.4333, 2);
    expect(velocity!.lines[0]!.points.at(-1)![1]).toBe(answer.takeoffVelocity);
    expect(Math.min(...displacement!.lines[0]!.points.map(([, y]) => y))).toBeCloseTo(answer.lowestDisplacement!, 6);
  });

  it('draws a refused jump as its force alone', () => {
    const flat = { sampleRate: 1000, force: Array.from({ length: 2000 }, () => 490.5) };
    const traces = tracesOf('jump-curve', flat, jumpCurve(flat));
    expect(traces.map(({ yUnit, marks }) => [yUnit, marks.length])).toEqual([['force, N', 0]]);
  });

  it('leaves out moments that lie beyond the trace', () => {
    const swing = exampleSwing();
    const late = { ...swing, events: { ...swing.events, finish: 9 } };
    expect(tracesOf('ground-trace', late, {})[0]!.marks.map(({ label }) => label)).not.toContain('finish');
    expect(tracesOf('ground-trace', swing, {})[0]!.marks).toHaveLength(8);
  });

  it('draws nothing for figures alone', () => expect(tracesOf('week-change', {}, {})).toEqual([]));
});
