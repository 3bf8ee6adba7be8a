import { describe, expect, it } from 'vitest';
import { columnField } from '#src/services/import/columnField.ts';
import { readHeading } from '#src/services/import/readHeading.ts';
import { tableFrom } from '#tests/unit/services/import/tableFrom.ts';

describe('readHeading and columnField', () => {
  it.each([
    ['Parent e-mail', 'email', null],
    ['D.O.B.', 'birthDate', null],
    ['Surname', 'familyName', null],
    ['standing height cm', 'stature', 'cm'],
    ['Sitting Height [mm]', 'sittingHeight', 'mm'],
    ['Body mass (lb)', 'mass', 'lb'],
    ['Clubhead speed (km/h)', 'clubSpeed', 'km/h'],
    ['BallSpeed_mph', 'ballSpeed', 'mph'],
    ['carry_m', 'carry', 'm'],
    ['Carry Flat - Length (yds)', 'carry', 'yd'],
    ['Launch angle', 'launch', null],
    ['Launch direction', null, null],
    ['Spin axis', null, null],
    ['AoA (°)', 'attack', 'deg'],
    ['air temperature C', 'temperature', '°C'],
    ['Temp (°F)', 'temperature', '°F'],
    ['pressure in Hg', 'pressure', 'inHg'],
    ['wind m/s (+ = following)', 'wind', 'm/s'],
    ['left Fz N', 'force', 'N'],
    ['Foot', 'side', null],
    ['Left foot', null, null],
    ['#', 'attempt', null],
    ['s', 'time', null],
    ['Ball', 'ball', null],
  ])('%s is %s in %s', (text, field, unit) => {
    const heading = readHeading(text);
    expect(columnField(heading)).toBe(field);
    expect(heading.unit?.symbol ?? null).toBe(unit);
  });
});

describe('recogniseTable', () => {
  it.each([
    { text: 'Name,Born,Sex\nA B,2012-01-01,F\n', kinds: ['athletes'] },
    { text: 'Athlete,Test,Leg,Trial,Result,Unit\nA,Hop,L,1,1.3,m\n', kinds: ['battery'] },
    { text: 'Name;jump L1 (cm);push R2 (N)\nA;1;2\n', kinds: ['battery'] },
    { text: 'Player,Exercise,Left,Right\nA,Hop,1,2\n', kinds: ['battery'] },
    { text: 'Name,Height (cm),Weight (kg)\nA,150,40\n', kinds: ['growth'] },
    { text: 'Name,Height (cm),jump L1 (cm)\nA,150,14\n', kinds: ['battery', 'growth'] },
    { text: 'Date,Temp (°F),Wind mph\n2026-01-01,50,3\n', kinds: ['conditions'] },
    { text: 'Player,Club,Carry (m),Ball speed (m/s)\nA,Driver,150,50\n', kinds: ['driver'] },
    { text: '# top=1 s\ntime s,left Fz N,right Fz N\n0,1,2\n', kinds: ['ground trace'] },
    { text: 'time (s);force (N)\n0,0;500\n', kinds: ['force curve'] },
    { text: '# sample rate: 1000 Hz\nforce N\n500\n', kinds: ['force curve'] },
  ])('knows $kinds by what they say', ({ text, kinds }) => {
    expect(tableFrom(text, 'whatever.csv').kinds).toEqual(kinds);
  });

  it('does not guess at a table of nothing it knows', () => {
    expect(() => tableFrom('just,some,thing\n1,2,3\n')).toThrow('not recognised');
  });

  it('finds the headings below other rows, and leaves out units and repeated headings', () => {
    const table = tableFrom(
      'Range report\nDate,14.05.2026\nPlayer,Club,Carry,Ball speed\n,,yd,mph\nA,D,150,100\nPlayer,Club,Carry,Ball speed\nA,D,151,101\n',
    );
    expect(table.body.map(({ line }) => line)).toEqual([5, 7]);
    expect(table.leftOut).toEqual([
      { line: 4, why: 'a row of units' },
      { line: 6, why: 'the headings again' },
    ]);
    expect(table.columns.map(({ unit }) => unit?.symbol)).toEqual([undefined, undefined, 'yd', 'mph']);
    expect(table.context.find('date')).toBe('14.05.2026');
  });
});
