import { describe, expect, it } from 'vitest';
import { decodeText } from '#src/services/import/decodeText.ts';
import { parseTable } from '#src/services/import/parseTable.ts';
import { sniffDelimiter } from '#src/services/import/sniffDelimiter.ts';

const parse = (text: string) => parseTable(decodeText(Buffer.from(text), 'a.csv'), 'a.csv');

describe('sniffDelimiter', () => {
  it.each([
    { lines: ['a,b,c', '1,2,3'], delimiter: ',' },
    { lines: ['time (s);force (N)', '0,000;520,7', '0,001;514,8'], delimiter: ';' },
    { lines: ['a\tb', '1,5\t2,5'], delimiter: '\t' },
    { lines: ['a|b', '1,5|2,5'], delimiter: '|' },
    { lines: ['Name,Remark', '"Novak; Amara",ok', '"x;y",ok'], delimiter: ',' },
    { lines: ['Testing in the hall', '', 'a;b;c', '1,5;2;3', '1,5;2;3'], delimiter: ';' },
    { lines: ['force', '1', '2'], delimiter: ',' },
  ])('finds $delimiter in $lines', ({ lines, delimiter }) => {
    expect(sniffDelimiter(lines)).toBe(delimiter);
  });
});

describe('parseTable', () => {
  it('keeps the line of each row past comments, empty rows and a cell of two lines', () => {
    const { rows, comments } = parse('# top=1.0 s; impact=1.2 s\na,b\n\n"x\ny",2\n3,4\n,\n');
    expect(comments).toEqual([{ line: 1, text: 'top=1.0 s; impact=1.2 s' }]);
    expect(rows).toEqual([
      { line: 2, cells: ['a', 'b'] },
      { line: 4, cells: ['x\ny', '2'] },
      { line: 6, cells: ['3', '4'] },
    ]);
  });

  it('takes a hash that heads a column as a heading', () => {
    expect(parse('#;Name\n1;Amara\n').rows[0]!.cells).toEqual(['#', 'Name']);
  });

  it('obeys the separator that a spreadsheet declares', () => {
    expect(parse('sep=;\na;b,c\n1;2,5\n').rows).toEqual([
      { line: 2, cells: ['a', 'b,c'] },
      { line: 3, cells: ['1', '2,5'] },
    ]);
  });

  it('keeps an inch mark within a cell', () => {
    expect(parse('height,n\n5\'3",x\n').rows[1]!.cells).toEqual(['5\'3"', 'x']);
  });

  it.each([
    { text: 'a,b\nc,"d\n', says: 'a.csv, row 2, column 2: a quotation mark is never closed' },
    { text: `a,b\n${'x'.repeat(100_001)}\n`, says: 'a.csv, row 2: the line is longer' },
    { text: `${'a,'.repeat(601)}\n`, says: 'a.csv, row 1, column 600: more than 600 columns' },
    { text: 'a\n'.repeat(200_001), says: 'more than 200000 rows' },
  ])('refuses: $says', ({ text, says }) => {
    expect(() => parse(text)).toThrow(says);
  });
});
