import { describe, expect, it } from 'vitest';
import { matchFileName, matchName } from '#src/services/import/athleteNames.ts';
import { numberInName } from '#src/services/import/fileSubject.ts';
import { ATHLETES } from '#tests/unit/services/import/tableFrom.ts';

const find = (text: string) => matchName(ATHLETES, text).athlete?.id ?? null;
const inFile = (path: string) => matchFileName(ATHLETES, path).athlete?.id ?? null;

describe('matchName', () => {
  it.each([
    ['Amara Novak', 'amara'],
    ['Novak, Amara', 'amara'],
    ['NOVAK Amara', 'amara'],
    ['  amara   novak ', 'amara'],
    ['lukasz obrien orsted', 'lukasz'],
    ['O’BRIEN-ORSTED, Lukasz', 'lukasz'],
    ['V. Okafor', 'vesna'],
    ['Vesna O.', 'vesna'],
    ['Anton N', 'anton'],
    ['Okafor V', 'vesna'],
    ['VanDerBerg, Ana Maria', 'ana'],
    ['A. M. van der Berg', null],
    ['A. van der Berg', 'ana'],
    ['A. Novak', null],
    ['Novak', null],
    ['Amara', null],
    ['Amara Novakova', null],
    ['', null],
  ])('%s', (text, id) => expect(find(text)).toBe(id));

  it('says why', () => {
    expect(matchName(ATHLETES, 'A. Novak').reason).toBe('“A. Novak” may be more than one athlete');
    expect(matchName(ATHLETES, 'Jo Bloggs').reason).toBe('no athlete is called “Jo Bloggs”');
    expect(matchName(ATHLETES, ' ').reason).toBe('no athlete is named');
  });
});

describe('matchFileName', () => {
  it.each([
    ['ground/Okafor_Vesna_2026-01-21_swing1.csv', 'vesna'],
    ['2026/AmaraNovak-left.csv', 'amara'],
    ['van-der-berg ana maria 3.csv', 'ana'],
    ['Novak A/left.csv', null],
    ['V Okafor/left.csv', 'vesna'],
    ['swing1.csv', null],
  ])('%s', (path, id) => expect(inFile(path)).toBe(id));

  it('reads the number of a swing', () => {
    expect(numberInName('a/Okafor_2026-01-21_swing3.csv', 'swing')).toBe(3);
    expect(numberInName('Swing 12 Okafor.csv', 'swing')).toBe(12);
    expect(numberInName('Okafor_2026-01-21.csv', 'swing')).toBeNull();
  });
});
