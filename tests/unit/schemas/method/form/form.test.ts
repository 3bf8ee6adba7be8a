import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bodyOf } from '#src/schemas/method/form/bodyOf.ts';
import type { FormField } from '#src/schemas/method/form/formField.ts';
import { placeErrors } from '#src/schemas/method/form/placeErrors.ts';
import { readNumber, readTokens } from '#src/schemas/method/form/readTokens.ts';
import { textsOf } from '#src/schemas/method/form/textsOf.ts';

const FIELDS: FormField[] = [
  { path: 'lead', label: 'Lead', kind: 'numbers' },
  { path: 'noise.typicalErrorPct.lead', label: 'Typical error', kind: 'number' },
  { path: 'under18', label: 'Under 18', kind: 'flag' },
  { path: 'pairs', label: 'Pairs', kind: 'table' },
  {
    path: 'reports',
    label: 'Reports',
    kind: 'rows',
    columns: [
      { name: 'on', label: 'Date', kind: 'text' },
      { name: 'pain', label: 'Pain', kind: 'number' },
      { name: 'nextMorning', label: 'Next morning', kind: 'number', optional: true },
      { name: 'nightPain', label: 'Pain at night', kind: 'flag', optional: true },
    ],
  },
  {
    path: 'days.0',
    label: 'Day 1',
    kind: 'rows',
    oneLine: true,
    columns: [{ name: 'rpe', label: 'Effort', kind: 'number' }],
  },
  {
    path: 'days.1',
    label: 'Day 2',
    kind: 'rows',
    oneLine: true,
    columns: [{ name: 'rpe', label: 'Effort', kind: 'number' }],
  },
];

describe('readTokens', () => {
  it.each([
    ['500 510 505', ['500', '510', '505']],
    ['500, 510, 505', ['500', '510', '505']],
    ['500,510,505', ['500', '510', '505']],
    ['500,510', ['500', '510']],
    ['14,8 15,2', ['14,8', '15,2']],
    ['14.8,15.2', ['14.8', '15.2']],
    ['14.8\t15.2', ['14.8', '15.2']],
    [' , ', []],
    ['', []],
  ])('reads %j', (line, tokens) => expect(readTokens(line)).toEqual(tokens));
});

describe('readNumber', () => {
  it.each([
    ['14,8', 14.8],
    ['−2.5', -2.5],
    ['.5', 0.5],
    ['1e3', 1000],
    ['12m', '12m'],
    ['0x10', '0x10'],
    ['Infinity', 'Infinity'],
  ])('reads %j', (token, value) => expect(readNumber(token)).toBe(value));
});

describe('bodyOf', () => {
  it('puts each text where the request has it', () => {
    const texts = {
      lead: '500, 510\n505',
      'noise.typicalErrorPct.lead': '3,4',
      under18: 'yes',
      pairs: 'lead trail\nnone lead',
      reports: '2026-05-02 2 - yes\n2026-05-03 1',
      'days.0': '6; 4',
      'days.1': '',
    };
    expect(bodyOf(FIELDS, texts)).toEqual({
      lead: [500, 510, 505],
      noise: { typicalErrorPct: { lead: 3.4 } },
      under18: true,
      pairs: [
        ['lead', 'trail'],
        ['none', 'lead'],
      ],
      reports: [
        { on: '2026-05-02', pain: 2, nightPain: true },
        { on: '2026-05-03', pain: 1 },
      ],
      days: [[{ rpe: 6 }, { rpe: 4 }], []],
    });
  });

  it('leaves out what is empty, and keeps what is wrong for the schema to say', () => {
    expect(bodyOf(FIELDS.slice(0, 3), {})).toEqual({});
    expect(bodyOf(FIELDS.slice(0, 3), { lead: '5 heavy', under18: 'perhaps' })).toEqual({
      lead: [5, 'heavy'],
      under18: 'perhaps',
    });
    expect(bodyOf([FIELDS[4]!], { reports: '2026-05-02 2 1 no surplus' })).toEqual({
      reports: [{ on: '2026-05-02', pain: 2, nextMorning: 1, nightPain: false, 'part 5': 'surplus' }],
    });
  });

  it('reads back whatever numbers it wrote', () => {
    const number = fc.double({ noNaN: true, noDefaultInfinity: true }).map((value) => value + 0);
    fc.assert(
      fc.property(fc.array(number, { minLength: 1 }), number, (lead, error) => {
        const body = { lead, noise: { typicalErrorPct: { lead: error } } };
        const fields = FIELDS.slice(0, 2);
        expect(bodyOf(fields, textsOf(fields, body))).toEqual(body);
      }),
    );
  });
});

describe('placeErrors', () => {
  it.each([
    ['lead', 'Give one number a trial', 'lead', 'Give one number a trial'],
    ['lead.2', 'Give a number', 'lead', 'Value 3: Give a number'],
    ['pairs.0.1', 'Choose', 'pairs', 'Line 1, value 2: Choose'],
    ['reports.1.nextMorning', 'Give a number', 'reports', 'Line 2, next morning: Give a number'],
    ['noise', 'Give either', 'noise.typicalErrorPct.lead', 'Give either'],
    ['days.1.0.rpe', 'Give 10 or less', 'days.1', 'Line 1, effort: Give 10 or less'],
    ['elsewhere', 'No', null, 'No'],
    ['', 'Not now', null, 'Not now'],
  ])('%s', (path, message, place, words) => {
    expect(placeErrors(FIELDS, [{ path, message }])).toEqual([{ path: place, message: words }]);
  });

  it('says one thing a field', () => {
    const errors = [0, 1, 2].map((i) => ({ path: `lead.${i}`, message: 'Give a number' }));
    expect(placeErrors(FIELDS, errors)).toEqual([{ path: 'lead', message: 'Value 1: Give a number' }]);
  });
});
