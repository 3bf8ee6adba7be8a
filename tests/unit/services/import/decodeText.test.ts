import { describe, expect, it } from 'vitest';
import { decodeText } from '#src/services/import/decodeText.ts';

const utf16 = (text: string, big: boolean) => {
  const bytes = Buffer.from(`\ufeff${text}`, 'utf16le');
  return big ? bytes.swap16() : bytes;
};

describe('decodeText', () => {
  it.each([
    { bytes: Buffer.from('Łukasz;é\r\n'), encoding: 'utf-8' },
    { bytes: Buffer.from('\ufeffŁukasz;é\r\n'), encoding: 'utf-8' },
    { bytes: utf16('Łukasz;é\r\n', false), encoding: 'utf-16le' },
    { bytes: utf16('Łukasz;é\r\n', true), encoding: 'utf-16be' },
    { bytes: utf16('Łukasz;é\r\n', false).subarray(2), encoding: 'utf-16le' },
  ])('reads $encoding', ({ bytes, encoding }) => {
    const decoded = decodeText(bytes, 'a.csv');
    expect(decoded).toMatchObject({ text: 'Łukasz;é\n', encoding });
  });

  it('reads Windows-1252 with a note, its 0x80 to 0x9f included', () => {
    const decoded = decodeText(Buffer.from([0x4f, 0x92, 0x42, 0xe9, 0x80]), 'a.csv');
    expect(decoded.text).toBe('O’Bé€');
    expect(decoded.note).toContain('Windows-1252');
  });

  it('turns the line ends of every system into one', () => {
    expect(decodeText(Buffer.from('a\rb\r\nc\n'), 'a.csv').text).toBe('a\nb\nc\n');
  });

  it.each([
    { bytes: Buffer.from(''), says: 'a.csv: the file is empty' },
    { bytes: Buffer.from(' \n \n'), says: 'a.csv: the file is empty' },
    { bytes: Buffer.from('a,b\nc,\u0000d\n'), says: 'a.csv, row 2, column 2: not text' },
    { bytes: Buffer.from([0x50, 0x4b, 3, 4, 0, 0]), says: 'a.csv, row 1, column 1: not text' },
    { bytes: Buffer.from([0xff, 0xfe, 0x00, 0xd8]), says: 'says it is UTF-16LE and is not' },
    { bytes: new Uint8Array(25_000_001), says: 'more than the 25 MB' },
  ])('refuses: $says', ({ bytes, says }) => {
    expect(() => decodeText(bytes, 'a.csv')).toThrow(says);
  });
});
