import { describe, expect, it } from 'vitest';
import { CATALOGUE } from '#src/domain/catalogue/catalogue.ts';
import { firstMedian } from '#src/domain/catalogue/firstMedian.ts';
import { recogniseTest } from '#src/domain/catalogue/recogniseTest.ts';
import { suspectValue } from '#src/domain/catalogue/suspectValue.ts';
import { wordsOf } from '#src/domain/catalogue/wordsOf.ts';

describe('the catalogue', () => {
  it('knows every test by its own name and key, once', () => {
    for (const { key, name } of CATALOGUE) {
      expect(recogniseTest(name), name).toBe(key);
      expect(recogniseTest(key), key).toBe(key);
    }
    expect(new Set(CATALOGUE.map(({ key }) => key)).size).toBe(CATALOGUE.length);
  });

  it('judges by push, jump and hop with the noise of SCIENCE §9', () => {
    // SCIENCE §9: push CV 4, jump CV 5, hop CV 4.5.
    expect(CATALOGUE.flatMap(({ capacity, cvPct }) => (capacity ? [[capacity, cvPct]] : []))).toEqual([
      ['push', 4],
      ['jump', 5],
      ['hop', 4.5],
    ]);
  });

  it('takes no median as suspect, and compares joint ranges in degrees', () => {
    for (const { key, firstMediansSi, lowestSi, highestSi } of CATALOGUE) {
      for (const value of firstMediansSi) {
        expect(suspectValue({ value, lowest: lowestSi, highest: highestSi, reference: value }).verdict, key).toBe(
          'taken',
        );
      }
    }
    expect(CATALOGUE.find(({ key }) => key === 'hip-internal-rotation')?.comparesIn).toBe('degrees');
  });
});

describe('recogniseTest', () => {
  it.each([
    ['SLCMJ', 'jump'],
    ['SL jump height', 'jump'],
    ['Y anterior', 'anterior-reach'],
    ['3 hop', 'triple-hop'],
    ['Single leg broad jump', 'hop'],
    ['ISO leg press', 'push'],
    ['Hip IR', 'hip-internal-rotation'],
    ['Med ball rotational throw', 'rotational-throw'],
    ['Drop jump', null],
    ['Squat jump', null],
    ['Crossover hop', null],
    ['Bench press', null],
    ['', null],
  ])('“%s” is %s', (text, key) => expect(recogniseTest(text)).toBe(key));
});

describe('firstMedian', () => {
  it.each([
    [10.99, 600],
    [11, 730],
    [12.99, 730],
    [13, 880],
    [15, 1030],
    [18, 1030],
  ])('at %s years', (age, expected) => expect(firstMedian([600, 730, 880, 1030], age)).toBe(expected));
  it('is null without medians', () => expect(firstMedian(null, 12)).toBeNull());
});

describe('suspectValue', () => {
  const push = { lowest: 50, highest: 4000 };
  // By hand, from the rule of issue 2: outside ⅔ to 1½ asked, ten times off asked, outside the range refused.
  it.each([
    { value: 900, reference: 900, verdict: 'taken' },
    { value: 600, reference: 900, verdict: 'taken' },
    { value: 1350, reference: 900, verdict: 'taken' },
    { value: 599, reference: 900, verdict: 'asked' },
    { value: 1351, reference: 900, verdict: 'asked' },
    { value: 13540.7, reference: 1040, verdict: 'asked' },
    { value: 90, reference: 900, verdict: 'asked' },
    { value: 45, reference: 450, verdict: 'asked' },
    { value: 99_999, reference: 900, verdict: 'refused' },
    { value: 30_000, reference: 900, verdict: 'refused' },
    { value: 0, reference: 900, verdict: 'refused' },
    { value: 900, reference: null, verdict: 'taken' },
    { value: 9000, reference: null, verdict: 'asked' },
    { value: 90_000, reference: null, verdict: 'refused' },
  ] as const)('$value beside $reference is $verdict', ({ value, reference, verdict }) => {
    const found = suspectValue({ value, reference, ...push });
    expect(found.verdict).toBe(verdict);
    expect(found.reason === null).toBe(verdict === 'taken');
  });
  it('requires a finite value', () => {
    expect(() => suspectValue({ value: NaN, reference: 1, ...push })).toThrow(RangeError);
  });
});

describe('wordsOf', () => {
  it.each([
    ['jump_L1 (cm)', ['jump', 'l1', 'cm']],
    ['ballSpeed', ['ball', 'speed']],
    ['Łukasz Ørsted-Großmann', ['lukasz', 'orsted', 'grossmann']],
    ["O'Brien", ['obrien']],
    ['  ', []],
  ])('%s', (text, words) => expect(wordsOf(text)).toEqual(words));
});
