import { describe, expect, it } from 'vitest';
import { readColumns } from '#src/client/method/readColumns.ts';

const rows = (count: number, line: (i: number) => string, heading?: string) =>
  [...(heading === undefined ? [] : [heading]), ...Array.from({ length: count }, (_, i) => line(i))].join('\n');

describe('readColumns', () => {
  it.each([
    ['one column', rows(4, (i) => String(490 + i)), ['Column 1'], null],
    ['one column, decimal comma', rows(4, (i) => `5${i},5`), ['Column 1'], null],
    ['semicolons and decimal commas', rows(4, (i) => `0,00${i};49${i},5`, 'Time (s);Force (N)'), ['Force (N)'], 1000],
    ['commas and dots', rows(4, (i) => `${i / 500},${490.5 + i}`, 'time,force'), ['force'], 500],
    ['tabs, milliseconds', rows(4, (i) => `${2 * i}\t490\t5`, 't (ms)\tleft\tright'), ['left', 'right'], 500],
    ['numbered samples', rows(4, (i) => `${i},49${i}`, 'n,force'), ['force'], null],
    ['numbered samples without a heading', rows(4, (i) => `${i},49${i}`), ['Column 2'], null],
    ['two columns without a time', rows(4, (i) => `${(i * 7) % 3} ${490 + i}`), ['Column 1', 'Column 2'], null],
    ['words before', `Trial 1\nRate;1000\n\n${rows(4, (i) => `${i / 1000};490`, 's;N')}`, ['N'], 1000],
    [
      'a byte order mark, quotes and Windows line ends',
      '\uFEFF"s";"N"\r\n"0.00";"490"\r\n"0.01";"491"\r\n"0.02";"492"\r\n',
      ['N'],
      100,
    ],
  ])('reads %s', (_, text, names, sampleRate) => {
    const read = readColumns(text);
    expect(read.names).toEqual(names);
    expect(read.sampleRate).toBe(sampleRate);
    for (const column of read.columns) expect(column.length).toBeGreaterThanOrEqual(3);
  });

  it('keeps the values', () => {
    expect(readColumns('s;N\n0,000;490,5\n0,001;491,25\n0,002;-2').columns).toEqual([[490.5, 491.25, -2]]);
    expect(readColumns('50,5\n51,5\n50,1').columns).toEqual([[50.5, 51.5, 50.1]]);
  });

  it.each([
    ['There are no samples', ''],
    ['There are no samples', 'force\nheavy'],
    ['Line 3 does not hold 2 numbers', '0.0;490\n0.1;491\n0.2\n0.3;492'],
    ['Line 2 does not hold 1 number', '490\nheavy\n491'],
  ])('says: %s', (message, text) => expect(() => readColumns(text)).toThrow(message));
});
