import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dateOrder } from '#src/domain/units/dateOrder.ts';
import { parseDate } from '#src/domain/units/parseDate.ts';
import type { DateOrder } from '#src/domain/units/parseDate.ts';

describe('parseDate', () => {
  it.each<[string, DateOrder | null, string | null]>([
    ['08/07/2012', 'dmy', '2012-07-08'],
    ['08/07/2012', 'mdy', '2012-08-07'],
    ['08/07/2012', 'ymd', null],
    ['08/07/2012', null, null],
    ['08/08/2012', null, '2012-08-08'],
    ['16/12/2011', null, '2011-12-16'],
    ['12/16/2011', null, '2011-12-16'],
    ['12/16/2011', 'dmy', null],
    ['8.7.2012', 'dmy', '2012-07-08'],
    ['2024-09-14', null, '2024-09-14'],
    ['2024-09-14', 'dmy', '2024-09-14'],
    ['2024/9/4', 'ymd', '2024-09-04'],
    ['2024-09-14T10:30:00Z', null, '2024-09-14'],
    ['2024-09-14 10:30', null, '2024-09-14'],
    ['14/09/2024 10:30', 'dmy', '2024-09-14'],
    ['14 Sep 2024', null, '2024-09-14'],
    ['14th September 2024', 'mdy', '2024-09-14'],
    ['Sept 14, 2024', null, '2024-09-14'],
    ['14-Sep-2024', null, '2024-09-14'],
    ['08/07/12', 'dmy', '2012-07-08'],
    ['08/07/75', 'dmy', '1975-07-08'],
    ['12/07/08', 'ymd', '2012-07-08'],
    ['08/07/12', null, null],
    ['29/02/2023', 'dmy', null],
    ['29/02/2024', 'dmy', '2024-02-29'],
    ['31/04/2024', 'dmy', null],
    ['00/04/2024', 'dmy', null],
    ['14/09-2024', 'dmy', null],
    ['14 Foo 2024', null, null],
    ['1899-12-31', null, null],
    ['', null, null],
    ['20240914', null, null],
    ['14 Septembre 2024', null, null],
  ])('reads "%s" in order %s as %s', (text, order, expected) => {
    expect(parseDate(text, order)).toBe(expected);
  });

  it('reads back every date of 1900 to 2199 in each order', () => {
    const pad = (part: number) => String(part).padStart(2, '0');
    fc.assert(
      fc.property(
        fc.date({ min: new Date('1900-01-01'), max: new Date('2199-12-31'), noInvalidDate: true }),
        fc.constantFrom<DateOrder>('dmy', 'mdy', 'ymd'),
        fc.constantFrom('/', '.', '-', ' '),
        (date, order, separator) => {
          const parts = { y: String(date.getUTCFullYear()), m: pad(date.getUTCMonth() + 1), d: pad(date.getUTCDate()) };
          const text = [...order].map((part) => parts[part as 'd' | 'm' | 'y']).join(separator);
          expect(parseDate(text, order)).toBe(date.toISOString().slice(0, 10));
        },
      ),
    );
  });
});

describe('dateOrder', () => {
  it.each<[string[], DateOrder | null]>([
    [['08/07/2012', '16/12/2011'], 'dmy'],
    [['07/08/2012', '12/16/2011'], 'mdy'],
    [['08/07/2012', '03/04/2011'], null],
    [['16/12/2011', '12/16/2011'], null],
    [['2024-09-14', '2024-09-15'], 'ymd'],
    [['2024-09-14', '', '16/12/2011'], 'dmy'],
    [['2024-09-14', '06/12/2011'], null],
    [['14 Sep 2024'], 'ymd'],
    [['08/07/12', '31/07/12'], null],
    [['08/07/12', '31/07/75'], 'dmy'],
    [['not a date', '16/12/2011'], null],
    [['', ' '], null],
    [[], null],
  ])('of %j is %s', (texts, expected) => {
    expect(dateOrder(texts)).toBe(expected);
  });
});
