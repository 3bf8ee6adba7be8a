import { describe, expect, it } from 'vitest';
import { CATALOGUE } from '#src/domain/catalogue/catalogue.ts';
import { readAthletes } from '#src/services/import/readAthletes.ts';
import { readBattery } from '#src/services/import/readBattery.ts';
import { conditionsAtHead, readConditions } from '#src/services/import/readConditions.ts';
import { readDriver } from '#src/services/import/readDriver.ts';
import { readGrowth } from '#src/services/import/readGrowth.ts';
import { SETTINGS, tableFrom } from '#tests/unit/services/import/tableFrom.ts';

const battery = (text: string, file = 'battery_2026-05-09.csv') =>
  readBattery(tableFrom(text, file), { ...SETTINGS, tests: CATALOGUE });
const values = (text: string, file?: string) =>
  battery(text, file).readings.map(({ value, refused }) =>
    value === null ? refused : [value.athleteId, value.heldOn, value.testKey, value.side, value.attempt, value.valueSi],
  );

describe('readBattery', () => {
  it('reads a row a trial', () => {
    const text = 'Athlete,Test,Leg,Trial,Result,Unit,Remark\nAmara Novak,Single-leg hop,left,1,54.2,in,\n';
    expect(values(text)).toEqual([['amara', '2026-05-09', 'hop', 'left', 1, expect.closeTo(1.37668, 9)]]);
  });

  it('reads a column a trial, in any order of test, side and attempt, a blank cell as none', () => {
    const text =
      'Name;jump L1 (cm);Left hop, trial 2 [m];R1 push N;CMJ left mean (cm)\nNovak, Amara;13,6;1,3;;13\nOkafor, Vesna;-;;902,4;12\n';
    expect(values(text)).toEqual([
      ['amara', '2026-05-09', 'jump', 'left', 1, 0.136],
      ['amara', '2026-05-09', 'hop', 'left', 2, 1.3],
      ['vesna', '2026-05-09', 'push', 'right', 1, 902.4],
    ]);
    expect(battery(text).notes).toEqual(['columns left out: cmj left mean']);
  });

  it('reads what lies between: sides or attempts as columns, the test in the row', () => {
    expect(values('Player,Exercise,Try,Left,Right,Unit\nAmara Novak,Hop,2,1.3,1.4,m\n')).toEqual([
      ['amara', '2026-05-09', 'hop', 'left', 2, 1.3],
      ['amara', '2026-05-09', 'hop', 'right', 2, 1.4],
    ]);
    expect(values('Player,Exercise,Side,1,2\nAmara Novak,Push (N),L,800,810\n')[1]).toEqual([
      'amara',
      '2026-05-09',
      'push',
      'left',
      2,
      810,
    ]);
  });

  it('reads headings of two and three levels', () => {
    const two = 'Name;jump;;hop;\n;L1 (cm);R1 (cm);L1 (m);R1 (m)\nAmara Novak;13,6;14;1,3;1,4\n';
    const three = 'Name,jump cm,,,\n,Left,,Right,\n,1,2,1,2\nAmara Novak,13,14,15,16\n';
    expect(values(two).map((value) => value?.slice(2))).toEqual([
      ['jump', 'left', 1, expect.closeTo(0.136, 9)],
      ['jump', 'right', 1, expect.closeTo(0.14, 9)],
      ['hop', 'left', 1, 1.3],
      ['hop', 'right', 1, 1.4],
    ]);
    expect(values(three).map((value) => value?.slice(3))).toEqual([
      ['left', 1, 0.13],
      ['left', 2, 0.14],
      ['right', 1, 0.15],
      ['right', 2, 0.16],
    ]);
  });

  it('reads a unit in the test’s own cell, and a name that stands over several rows', () => {
    const text =
      'Athlete,Test,Leg,Result\nAmara Novak,Hop (cm),L,130\n,Hop (cm),R,140\n,Hop (cm),R,141\nVesna Okafor,Hop (cm),L,120\n,Hop (cm),L,121\n,Hop (cm),R,125\n';
    expect(values(text).map((value) => [value?.[0], value?.[5]])).toEqual([
      ['amara', 1.3],
      ['amara', expect.closeTo(1.4, 9)],
      ['amara', 1.41],
      ['vesna', 1.2],
      ['vesna', 1.21],
      ['vesna', 1.25],
    ]);
    // Where most rows have a name, a row without one is nobody's.
    expect(values('Athlete,Test,Leg,Result\nAmara Novak,Hop (cm),L,130\n,Hop (cm),R,140\n')[1]).toBe(
      'no athlete is named',
    );
  });

  it('mirrors lead and trail by what the child plays', () => {
    const text = 'Name,lead jump 1 (cm)\nAmara Novak,14\nVesna Okafor,15\n';
    expect(values(text)).toEqual([
      ['amara', '2026-05-09', 'jump', 'left', 1, 0.14],
      ['vesna', '2026-05-09', 'jump', 'right', 1, 0.15],
    ]);
  });

  it('numbers attempts that nothing numbers', () => {
    const text = 'Name,Test,Side,Result\nAmara Novak,Hop,L,1.30 m\nAmara Novak,Hop,L,1.32 m\nAmara Novak,Hop,R,1.4 m\n';
    expect(values(text).map((value) => value?.slice(3, 5))).toEqual([
      ['left', 1],
      ['left', 2],
      ['right', 1],
    ]);
  });

  it('takes the date of the row before the date of the file', () => {
    const text = 'Name,Date,Test,Side,Result\nAmara Novak,13/02/2026,Hop,L,1.3 m\n';
    expect(values(text)[0]?.[1]).toBe('2026-02-13');
    expect(values('Name,Test,Side,Result\nAmara Novak,Hop,L,1.3 m\n', 'battery.csv')).toEqual([
      'no date in the row, at the head of the file or in its name',
    ]);
  });

  it('reads thousands by the other decimal mark, the file’s delimiter deciding where both fit', () => {
    expect(values('Name,push L1 (N)\nAmara Novak,"1,041"\n')[0]?.[5]).toBe(1041);
    expect(values('Name;push L1 (N);push L2 (N)\nAmara Novak;1.041,5;902\n')[0]?.[5]).toBe(1041.5);
  });

  it('takes force in kg and lb as weights', () => {
    // By hand: 100 kg × 9.80665 m/s²; 200 lb × 0.45359237 × 9.80665.
    expect(values('Name,push L1 (kg),push L2\nAmara Novak,100,200 lb\n').map((value) => value?.[5])).toEqual([
      expect.closeTo(980.665, 9),
      expect.closeTo(889.644323, 5),
    ]);
  });

  it('reads values without any unit in the only one that they fit, and says so', () => {
    const text = 'Name,jump L1,jump L2,push L1\nAmara Novak,14.1,13.9,850\n';
    expect(values(text).map((value) => value?.[5])).toEqual([expect.closeTo(0.141), expect.closeTo(0.139), 850]);
    expect(battery(text).notes[0]).toBe(
      'Single-leg countermovement jump: no unit is named; by their size the values are in cm',
    );
  });

  it.each([
    ['Nobody,Hop,L,1,1.3,m', 'no athlete is called “Nobody”'],
    ['A. Novak,Hop,L,1,1.3,m', '“A. Novak” may be more than one athlete'],
    ['Amara Novak,Crossover hop,L,1,1.3,m', 'no test of the academy is called “Crossover hop”'],
    ['Amara Novak,Squat jump,L,1,1.3,m', 'no test of the academy is called “Squat jump”'],
    ['Amara Novak,Hop,middle,1,1.3,m', '“middle” is neither left nor right'],
    ['Amara Novak,Hop,,1,1.3,m', 'no side is named'],
    ['Amara Novak,Hop,L,12,1.3,m', 'trial 12: a test has 1 to 9 trials'],
    ['Amara Novak,Hop,L,x,1.3,m', '“x” is no number of a trial'],
    ['Amara Novak,Hop,L,1,far,m', '“far” is no number'],
    ['Amara Novak,Hop,L,1,1.3,kg', 'kg is no unit of length'],
    ['Amara Novak,Hop,L,1,1.3,ell', 'no unit is called “ell”'],
  ])('refuses %s: %s', (row, reason) => {
    expect(values(`Athlete,Test,Leg,Trial,Result,Unit\n${row}\n`)).toEqual([reason]);
  });

  it('voids by a remark, by words in the cell, and without a value', () => {
    const text = [
      'Athlete,Test,Leg,Trial,Result,Remark',
      'Amara Novak,Hop,L,1,1.3 m,"foot slipped, void"',
      'Amara Novak,Hop,L,2,1.3 m no rep,',
      'Amara Novak,Hop,L,3,-,fell',
      'Amara Novak,Hop,R,1,1.3 m,well done',
      'Amara Novak,Hop,R,2,,',
    ].join('\n');
    expect(battery(text).readings.map(({ value }) => [value?.valueSi, value?.voidReason])).toEqual([
      [1.3, 'foot slipped, void'],
      [1.3, 'no rep'],
      [null, 'fell'],
      [1.3, null],
    ]);
  });

  it('voids one trial of a wide row only where the remark says which', () => {
    const text =
      'Name;hop L1 (m);hop L2 (m);Remark\nAmara Novak;1,3;1,2;hop L2 slipped\nVesna Okafor;1,3;1,2;slipped\n';
    expect(battery(text).readings.map(({ value }) => value?.voidReason)).toEqual([null, 'hop L2 slipped', null, null]);
  });

  it('leaves out averages of people and of trials', () => {
    const text = 'Athlete,Test,Leg,Trial,Result\nAmara Novak,Hop,L,mean,1.3 m\nSquad average,Hop,L,1,1.3 m\n';
    expect(battery(text)).toMatchObject({ readings: [], leftOut: [{ line: 2 }, { line: 3 }] });
  });
});

describe('readAthletes', () => {
  const list = (text: string) => readAthletes(tableFrom(text), 'dmy', '2026-12-01');

  it('reads names in one column or two, sexes and hands as they are written', () => {
    const text = [
      'Name,Gender,Born,Hand,Group,Mother e-mail,Father e-mail',
      '"Novak, Amara",Girl,08/07/2012,RH,Dunlin,A@B.example,"c@d.example; e@f.example"',
      'Vesna van der Okafor,m,13/09/2013,left-handed,,,',
    ].join('\n');
    expect(list(text).readings.map(({ value }) => value)).toEqual([
      {
        ...{ givenName: 'Amara', familyName: 'Novak', birthDate: '2012-07-08', sex: 'female', plays: 'right' },
        ...{ squad: 'Dunlin', guardianEmails: ['a@b.example', 'c@d.example', 'e@f.example'] },
      },
      {
        ...{ givenName: 'Vesna', familyName: 'van der Okafor', birthDate: '2013-09-13', sex: 'male', plays: 'left' },
        ...{ squad: 'Squad', guardianEmails: [] },
      },
    ]);
  });

  it('refuses a row without a name, a birth date or a sex, and leaves out a repeated one', () => {
    const text =
      'First name,Surname,DOB,Sex\nA,,01/01/2012,F\nA,B,30/02/2012,F\nA,B,01/01/2012,?\nA,B,01/01/2012,F\nA,B,01/01/2012,F\n';
    const { readings, leftOut } = list(text);
    expect(readings.map(({ refused }) => refused)).toEqual([
      'no given and family name',
      expect.stringContaining('“30/02/2012” is no date'),
      expect.stringContaining('“?” is neither female nor male'),
      null,
    ]);
    expect(leftOut).toEqual([{ file: 'file.csv', line: 6, why: 'the same athlete again' }]);
  });
});

describe('readGrowth', () => {
  it('reads cm, m, feet and inches, kg, lb and stones', () => {
    const text = [
      'date,athlete,standing height,sitting height cm,weight',
      '2026-01-17,Amara Novak,154.5 cm,80.1,95.7 lb',
      '2026-01-17,Vesna Okafor,"5\' 1""",0.8 m,7 st 2 lb',
      '2026-01-17,Anton Novak,,,',
    ].join('\n');
    const { readings, leftOut } = readGrowth(tableFrom(text), SETTINGS);
    expect(readings.map(({ value }) => [value?.statureM, value?.sittingHeightM, value?.massKg])).toEqual([
      // By hand: 95.7 × 0.45359237 kg; 61 × 0.0254 m; 100 × 0.45359237 kg.
      [expect.closeTo(1.545, 9), expect.closeTo(0.801, 9), expect.closeTo(43.408789809, 9)],
      [expect.closeTo(1.5494, 9), 0.8, expect.closeTo(45.359237, 9)],
    ]);
    expect(leftOut).toEqual([{ file: 'file.csv', line: 4, why: 'no measure in the row' }]);
  });

  it('tells cm from m and inches by size, but no pounds from kilograms', () => {
    const { readings } = readGrowth(tableFrom('date,athlete,height,mass\n2026-01-17,Amara Novak,154.5,43\n'), SETTINGS);
    expect(readings[0]?.refused).toBe('no unit for 43');
    const { readings: tall } = readGrowth(
      tableFrom('date,athlete,height,mass\n2026-01-17,Amara Novak,154.5,\n'),
      SETTINGS,
    );
    expect(tall[0]?.value?.statureM).toBeCloseTo(1.545, 9);
  });
});

describe('readConditions', () => {
  const read = (text: string) => readConditions(tableFrom(text), SETTINGS).readings;

  it('reads other units, and a head wind as against the ball', () => {
    const text = 'Day,Temp (°F),Pressure inHg,Head wind mph,Altitude ft,Humidity %\n14/05/2026,68,29.92,10,1000,55\n';
    expect(read(text)[0]?.value).toMatchObject({
      heldOn: '2026-05-14',
      temperatureC: expect.closeTo(20, 9),
      // NIST SP 811: 1 inHg = 3386.389 Pa (conventional).
      pressurePa: expect.closeTo(29.92 * 3386.389, -1),
      windMps: expect.closeTo(-4.4704, 9),
      altitudeM: expect.closeTo(304.8, 9),
      humidityPct: 55,
    });
  });

  it('refuses a value out of its range or without a unit', () => {
    expect(read('date,temp C,wind m/s\n2026-05-14,99,1\n')[0]?.refused).toBe('99 is outside -20 to 55');
    expect(read('date,temp C,wind\n2026-05-14,9,1\n')[0]?.refused).toBe('no unit for “1”');
  });

  it('finds conditions at the head of a driver file', () => {
    const table = tableFrom(
      '# temperature: 16 °C; wind: 2 m/s into\nPlayer,Club,Carry (m),Ball speed (m/s)\nA,D,1,2\n',
    );
    expect(conditionsAtHead(table, '2026-05-14')).toMatchObject({ temperatureC: 16, windMps: -2 });
  });
});

describe('readDriver', () => {
  const driver = (text: string) => readDriver(tableFrom(text, 'driver_2026-05-14.csv'), SETTINGS);
  const HEAD =
    'No,Player,Club,Club speed,Ball speed,Launch angle,Spin,Attack angle,Carry,Side\n,,,mph,mph,deg,rpm,deg,yd,yd\n';

  it('reads units in a row, other clubs, and a reading that is missing', () => {
    const { readings, leftOut } = driver(
      `${HEAD}1,Amara Novak,Driver,80,120,12,2500,-,150,3 L\n2,Amara Novak,7 iron,60,80,18,5500,-3,110,0\n,Amara Novak,Average,,,,,,140,\n`,
    );
    expect(readings.map(({ value }) => value)).toEqual([
      {
        ...{ athleteId: 'amara', heldOn: '2026-05-14', place: '', shotNo: 1, club: 'driver', clubLabel: 'Driver' },
        // Exact by definition: 1 mph = 0.44704 m/s, 1 yd = 0.9144 m.
        ...{ clubSpeedMps: expect.closeTo(35.7632, 9), ballSpeedMps: expect.closeTo(53.6448, 9), launchDeg: 12 },
        ...{
          spinRpm: 2500,
          attackDeg: null,
          dynamicLoftDeg: null,
          carryM: 137.16,
          offlineM: expect.closeTo(-2.7432, 9),
        },
      },
      expect.objectContaining({ club: 'other', clubLabel: '7 iron', shotNo: 2 }),
    ]);
    expect(leftOut.map(({ why }) => why)).toEqual(['a row of units', 'an average row']);
  });

  it.each(['DR', '1W', 'driver 10.5', 'Driver (10.5°)', 'W1'])('knows “%s” as a driver', (club) => {
    expect(driver(`${HEAD}1,Amara Novak,${club},80,120,12,2500,1,150,3\n`).readings[0]?.value?.club).toBe('driver');
  });

  it.each([
    ['1,Amara Novak,Driver,80,120,12,2500,1,,3', 'no carry was read'],
    ['1,Amara Novak,Driver,80,120,12,2500,1,-150,3', 'carry “-150” is outside what a shot can give'],
    ['1,Amara Novak,Driver,80,120,128,2500,1,150,3', 'launch angle “128” is outside what a shot can give'],
    ['1,Amara Novak,,80,120,12,2500,1,150,3', 'no club is named'],
    ['1,Amara Novak,Driver,80,fast,12,2500,1,150,3', '“fast” is no number'],
    ['1,Who Ever,Driver,80,120,12,2500,1,150,3', 'no athlete is called “Who Ever”'],
  ])('refuses %s: %s', (row, reason) => {
    expect(driver(`${HEAD}${row}\n`).readings[0]?.refused).toBe(reason);
  });

  it('does not guess whether a carry is in metres or in yards', () => {
    expect(() => driver('Player,Club,Carry,Ball speed (mph)\nAmara Novak,Driver,150,100\n')).toThrow(
      'driver_2026-05-14.csv, row 1, column 3: no unit for carry',
    );
  });
});
