import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { decimalMark } from '#src/domain/units/decimalMark.ts';
import { parseNumber } from '#src/domain/units/parseNumber.ts';
import type { DecimalMark } from '#src/domain/units/parseNumber.ts';

describe('parseNumber', () => {
  it.each<[string, DecimalMark | undefined, number, string | null]>([
    ['13,4', undefined, 13.4, null],
    ['13.4', undefined, 13.4, null],
    ['1 234,5', undefined, 1234.5, null],
    ['1\u00a0234,5', undefined, 1234.5, null],
    ['1\u202f234\u202f567', undefined, 1234567, null],
    ['1 234,567', undefined, 1234.567, null],
    ['53.2 in', undefined, 53.2, 'in'],
    ['53.2in', undefined, 53.2, 'in'],
    ['53.2"', undefined, 53.2, '"'],
    ['43.4 kg', undefined, 43.4, 'kg'],
    ['12,5°', undefined, 12.5, '°'],
    ['44 m/s', undefined, 44, 'm/s'],
    ['\u22123.1', undefined, -3.1, null],
    ['\u20133.1', undefined, -3.1, null],
    ['- 3.1', undefined, -3.1, null],
    ['+2', undefined, 2, null],
    ['-0', undefined, 0, null],
    ['1,234.5', undefined, 1234.5, null],
    ['1.234,5', undefined, 1234.5, null],
    ['1,234,567', undefined, 1234567, null],
    ['0,125', undefined, 0.125, null],
    ['12345,678', undefined, 12345.678, null],
    ['.5', undefined, 0.5, null],
    [',5', undefined, 0.5, null],
    ['1.234', undefined, 1.234, null],
    ['1.5e3', undefined, 1500, null],
    ['1,234', ',', 1.234, null],
    ['1,234', '.', 1234, null],
    ['1.234', ',', 1234, null],
    ['1.234', '.', 1.234, null],
    ['1.234.567,8', ',', 1234567.8, null],
    ['150 (cm)', undefined, 150, '(cm)'],
    ['0', undefined, 0, null],
  ])('reads "%s" (decimal mark %s)', (text, decimal, value, unit) => {
    expect(parseNumber(text, decimal)).toEqual({ value, unit });
  });

  it.each<[string, DecimalMark | undefined, string]>([
    ['1,234', undefined, 'can be read two ways'],
    ['', undefined, 'empty'],
    ['   ', undefined, 'blank'],
    ['n/a', undefined, 'no digit'],
    ['-', undefined, 'a sign alone'],
    ['12 34', undefined, 'two numbers'],
    ['13.4 12.5', undefined, 'two numbers'],
    ['2012-07-08', undefined, 'a date'],
    ['12/5', undefined, 'a fraction or a date'],
    ['1.2.3', undefined, 'no grouping'],
    ['1,23,456', undefined, 'no grouping of three'],
    ['1,234.567,8', undefined, 'marks contradict'],
    ['1.23,4', undefined, 'no grouping of three before the comma'],
    ['13,4', '.', 'a comma that cannot set thousands apart'],
    ['13.4', ',', 'a point that cannot set thousands apart'],
    ['5.', undefined, 'a mark without digits'],
    ['1e999', undefined, 'not finite'],
    ['NaN', undefined, 'no number'],
    ['Infinity', undefined, 'no number'],
    ['--3', undefined, 'two signs'],
  ])('refuses "%s" (decimal mark %s): %s', (text, decimal) => {
    expect(parseNumber(text, decimal)).toBeNull();
  });

  it('reads back what it was written from, with either mark, grouping and sign', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 99_999_999 }),
        fc.integer({ min: 0, max: 99 }),
        fc.boolean(),
        fc.constantFrom<DecimalMark>(',', '.'),
        fc.constantFrom('', ' ', '\u00a0', 'mark'),
        (whole, cents, negative, mark, group) => {
          const other = mark === ',' ? '.' : ',';
          const grouped = String(whole).replace(/\B(?=(\d{3})+$)/g, group === 'mark' ? other : group);
          const text = `${negative ? '\u2212' : ''}${grouped}${mark}${String(cents).padStart(2, '0')} kg`;
          const value = Number(`${negative ? '-' : ''}${whole}.${String(cents).padStart(2, '0')}`);
          const expected = { value: value === 0 ? 0 : value, unit: 'kg' };
          expect(parseNumber(text, mark)).toEqual(expected);
          expect(parseNumber(text)).toEqual(expected);
        },
      ),
    );
  });

  it('reads any double that JavaScript writes', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
        expect(parseNumber(String(value))?.value).toBe(value === 0 ? 0 : value);
      }),
    );
  });

  it('gives a finite number or null for any text, and is not slow on a long one', () => {
    fc.assert(
      fc.property(fc.string(), (text) => {
        const parsed = parseNumber(text);
        return parsed === null || Number.isFinite(parsed.value);
      }),
    );
    expect(parseNumber(`${'1 234 '.repeat(20_000)}x`)).toBeNull();
  });
});

describe('decimalMark', () => {
  it.each<[string[], DecimalMark | null]>([
    [['1,234', '13,4'], ','],
    [['1.234', '13.4', 'void'], '.'],
    [['1,234', '2,345'], null],
    [['12', '13'], null],
    [['13,4', '13.4'], null],
    [[], null],
  ])('of %j is %s', (texts, expected) => {
    expect(decimalMark(texts)).toBe(expected);
  });
});
