import { describe, expect, it } from 'vitest';
import { dateWords } from '#src/ui/words/dateWords.ts';
import { forestSentence, isBeyondNoise } from '#src/ui/words/forestSentence.ts';
import { intervalWords, plainNumber, signedNumber } from '#src/ui/words/numberWords.ts';
import { sparklineSentence } from '#src/ui/words/sparklineSentence.ts';
import { thresholdSentence } from '#src/ui/words/thresholdSentence.ts';

describe('numbers (by hand)', () => {
  it.each([
    [-1003.46, 1, '−1\u202f003.5'],
    [1234567, 0, '1\u202f234\u202f567'],
    [-0.04, 1, '0.0'],
    [892, 0, '892'],
    [999.96, 1, '1\u202f000.0'],
  ])('%s with %s decimals reads %s', (value, digits, expected) => {
    expect(plainNumber(value, digits)).toBe(expected);
  });

  it('shows a sign where it matters, and none on nothing', () => {
    expect([7.44, -7.44, 0.04, 0].map((value) => signedNumber(value, 1))).toEqual(['+7.4', '−7.4', '0.0', '0.0']);
    expect(intervalWords([-11.44, -4.61], 1)).toBe('−11.4 to −4.6');
  });
});

describe('dateWords (by hand)', () => {
  it('reads a date as text', () => {
    expect([dateWords('2026-09-12'), dateWords('2026-09-12', 'short'), dateWords('2026-03-01', 'day')]).toEqual([
      '12 September 2026',
      '12 Sep',
      '1 March',
    ]);
    expect(() => dateWords('12/09/2026')).toThrow(RangeError);
    expect(() => dateWords('2026-13-01')).toThrow(RangeError);
  });
});

describe('forestSentence: the words say the numbers that are drawn (by hand)', () => {
  it.each([
    [
      { estimate: -11.1, interval: [-15.2, -7], noise: 4.1 },
      'Lead 11.1 % below trail, 90 % interval −15.2 to −7.0 %, beyond the noise of ±4.1 %',
    ],
    [
      { estimate: -3.4, interval: [-7.5, 0.7], noise: 4.1 },
      'Lead 3.4 % below trail, 90 % interval −7.5 to 0.7 %, inside the noise of ±4.1 %',
    ],
    [
      { estimate: 6, interval: [1, 11], noise: 5 },
      'Lead 6.0 % above trail, 90 % interval 1.0 to 11.0 %, beyond the noise of ±5.0 %',
    ],
    [
      { estimate: 0.02, interval: [-4, 4.04], noise: null },
      'Lead level with trail, 90 % interval −4.0 to 4.0 %, inside noise',
    ],
    [{ estimate: 2, interval: null, noise: null }, 'Lead 2.0 % above trail, no interval: too few trials'],
  ] as const)('%j', (difference, expected) => {
    expect(forestSentence(difference)).toBe(expected);
  });

  it('calls nothing beyond noise that touches 0', () => {
    expect(isBeyondNoise({ interval: [-8, 0] })).toBe(false);
    expect(isBeyondNoise({ interval: null })).toBeNull();
  });
});

describe('other sentences (by hand)', () => {
  it('says a criterion against its threshold', () => {
    expect(
      thresholdSentence({ value: 1.11, interval: [1.02, 1.2], threshold: 0.85, metWhen: 'above', unit: '', digits: 2 }),
    ).toBe('1.11, 90 % interval 1.02 to 1.20; met above 0.85');
    expect(
      thresholdSentence({
        value: 0.4,
        interval: null,
        threshold: 2,
        metWhen: 'above',
        unit: '°',
        digits: 1,
        signed: true,
      }),
    ).toBe('+0.4°, no interval; met above 2.0°');
  });

  it.each([
    [[163, null, 185], 'Carry 163 m to 185 m over three terms, one without a value'],
    [[163, 170], 'Carry 163 m to 170 m over two terms'],
    [[null, 170], 'Carry 170 m, one value'],
    [[null], 'Carry: no value yet'],
  ])('says a sparkline: %j', (values, expected) => {
    expect(sparklineSentence(values, 'Carry', 'm')).toBe(expected);
  });
});
