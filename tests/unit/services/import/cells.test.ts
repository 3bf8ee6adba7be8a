import { describe, expect, it } from 'vitest';
import { readCell } from '#src/services/import/readCell.ts';
import { readSide, sideAndAttempt, storedSide } from '#src/services/import/readSide.ts';
import { isSummaryLabel } from '#src/services/import/summaryRow.ts';
import { unitBySize } from '#src/services/import/siValue.ts';
import { voidReasonOf } from '#src/services/import/voidRemark.ts';

describe('readCell', () => {
  it.each([
    { text: '13,6', decimal: ',' as const, value: 13.6, unit: null, remark: '' },
    { text: '43.4 kg', value: 43.4, unit: 'kg', remark: '' },
    { text: '1 041,2 N', decimal: ',' as const, value: 1041.2, unit: 'N', remark: '' },
    { text: '54.2 in (void)', value: 54.2, unit: 'in', remark: 'void' },
    { text: '13.6 slipped', value: 13.6, unit: null, remark: 'slipped' },
    { text: '13.6*', value: 13.6, unit: null, remark: '*' },
    { text: '5\' 3"', value: 1.6002, unit: 'm', remark: '' },
    { text: '5 ft 3 in', value: 1.6002, unit: 'm', remark: '' },
    { text: '7 st 3 lb', value: 45.81282937, unit: 'kg', remark: '' },
    { text: '−0.3', value: -0.3, unit: null, remark: '' },
  ])('reads $text', ({ text, decimal, value, unit, remark }) => {
    const cell = readCell(text, decimal);
    expect(cell).toMatchObject({ kind: 'number', remark });
    if (cell.kind !== 'number') throw new Error('no number');
    // By hand: 63 in × 0.0254; 101 lb × 0.45359237.
    expect(cell.value).toBeCloseTo(value, 9);
    expect(cell.unit?.symbol ?? null).toBe(unit);
  });

  it.each(['', ' ', '-', '–', 'n/a', 'NaN', 'DNS', '.'])('takes “%s” as blank', (text) => {
    expect(readCell(text)).toEqual({ kind: 'blank' });
  });

  it('leaves words as words', () => {
    expect(readCell('foot slipped')).toEqual({ kind: 'words', text: 'foot slipped' });
  });
});

describe('voidReasonOf', () => {
  it.each(['foot slipped, void', 'SLIPPED', 'no rep', 'lost her balance', 'did not count', 'Fault', 'stepped off'])(
    '“%s” voids',
    (remark) => expect(voidReasonOf(remark)).toBe(remark),
  );
  it.each(['', 'good', 'no slip', 'not void', 'personal best', 'windy', 'asphalt'])('“%s” does not', (remark) => {
    expect(voidReasonOf(remark)).toBeNull();
  });
  it('reads a column of yes and no by its heading', () => {
    expect(voidReasonOf('no', 'valid')).toBe('marked as not valid');
    expect(voidReasonOf('yes', 'valid')).toBeNull();
    expect(voidReasonOf('x', 'void')).toBe('marked void');
    expect(voidReasonOf('no', 'void')).toBeNull();
  });
});

describe('sides', () => {
  it.each([
    [['jump', 'l1'], 'left', 1, ['jump']],
    [['left', 'cmj', 'trial', '2'], 'left', 2, ['cmj']],
    [['trail', 'hop', '3'], 'trail', 3, ['hop']],
    [['push', '2r'], 'right', 2, ['push']],
    [['reach', 'lead', 'attempt', '1'], 'lead', 1, ['reach']],
    [['weight'], null, null, ['weight']],
  ])('%j', (words, side, attempt, rest) => {
    expect(sideAndAttempt(words)).toEqual({ side, attempt, rest });
  });

  it('turns lead and trail into sides by what the child plays', () => {
    expect(storedSide('lead', 'right')).toBe('left');
    expect(storedSide('lead', 'left')).toBe('right');
    expect(storedSide('trail', 'left')).toBe('left');
    expect(storedSide('right', 'left')).toBe('right');
    expect(readSide('middle')).toBeNull();
  });
});

describe('summary labels', () => {
  it.each(['Average', 'Squad mean', 'Std. Dev.', 'Mean (7 shots)', 'TOTAL'])('“%s” is one', (text) => {
    expect(isSummaryLabel(text)).toBe(true);
  });
  it.each(['Max Miller', 'Best, George', 'Driver', '', '7 iron'])('“%s” is none', (text) => {
    expect(isSummaryLabel(text)).toBe(false);
  });
});

describe('unitBySize', () => {
  it('names the one unit that the values fit', () => {
    expect(unitBySize([13.6, 14, 12.9], 0.15, 'length')?.symbol).toBe('cm');
    expect(unitBySize([136, 140], 0.15, 'length')?.symbol).toBe('mm');
    expect(unitBySize([5.4, 5.9], 0.15, 'length')?.symbol).toBe('in');
    expect(unitBySize([90, 100], 880, 'force')?.symbol).toBe('kgf');
    expect(unitBySize([5000], 0.15, 'length')).toBeNull();
  });
});
