import { join } from 'node:path';
import pg from 'pg';
import { describe, expect, it } from 'vitest';
import { useTestDatabase } from '#tests/config/testDatabase.ts';
import { importFrom, withFolder } from '#tests/integration/import/inFolder.ts';

const database = useTestDatabase();
const count = async (sql: string): Promise<number> => {
  const client = new pg.Client({ connectionString: database().superuserUrl });
  await client.connect();
  try {
    const { rows } = await client.query<{ count: string }>(sql);
    return Number(rows[0]?.count ?? 0);
  } finally {
    await client.end();
  }
};

const LIST = 'First name,Surname,Date of birth,Sex,Plays\nAmara,Novak,08/07/2012,F,R\nVesna,Okafor,16/12/2013,M,L\n';
const TRIALS = [
  'Athlete,Test,Leg,Trial,Result,Unit',
  ...['Amara Novak', 'Vesna Okafor'].flatMap((name) =>
    ['left', 'right'].flatMap((leg) => [1, 2, 3].map((n) => `${name},Single-leg hop,${leg},${n},1.4${n},m`)),
  ),
].join('\n');

describe('a folder that cannot be used', () => {
  it.each<{ why: string; files: Record<string, string | Buffer> | null; says: string }>([
    { why: 'there is none', files: null, says: 'There is no folder' },
    { why: 'without a table', files: { 'a.pdf': 'x' }, says: 'There is no CSV file in' },
    { why: 'without a list of athletes', files: { 'battery_2026-01-01.csv': TRIALS }, says: 'is a list of athletes' },
    {
      why: 'with a list that cannot be read',
      files: { 'list.csv': Buffer.from('First name,Sur\u0000name\n') },
      says: '(list.csv, row 1: not text',
    },
    {
      why: 'with a list of nobody',
      files: { 'list.csv': 'First name,Surname,Date of birth,Sex\nA,B,30/02/2012,F\n' },
      says: 'No athlete of list.csv can be read: row 2, “30/02/2012” is no date',
    },
  ])('says so: $why', async ({ files, says }) => {
    const run = () =>
      files === null
        ? importFrom(join('/nowhere', 'at-all'), 'Nowhere')
        : withFolder(files, (folder) => importFrom(folder, 'Nowhere'));
    await expect(run()).rejects.toThrow(says);
    expect(await count(`select count(*) from academy where name = 'Nowhere'`)).toBe(0);
  });

  it('is not mixed into an academy of the same name with other athletes', async () => {
    await withFolder({ 'list.csv': LIST, 'battery_2026-01-01.csv': TRIALS }, (folder) => importFrom(folder, 'Taken'));
    const others = 'Name,Born,Sex\nJo Bloggs,25/05/2012,F\n';
    await withFolder({ 'list.csv': others }, async (folder) => {
      await expect(importFrom(folder, 'Taken')).rejects.toThrow('An academy called “Taken” is here already');
    });
    expect(await count(`select count(*) from athlete where family_name = 'Bloggs'`)).toBe(0);
  });
});

describe('files that cannot be read', () => {
  it('are refused with row and column, and the rest goes on', async () => {
    const files = {
      'list.csv': LIST,
      'battery_2026-01-10.csv': TRIALS,
      'quote.csv': 'Athlete,Test\n"Amara,Push\n',
      'picture.csv': Buffer.from([0x89, 0x50, 0x4e, 0x47, 0, 0, 0]),
      'notes.csv': 'just,some,thing\n1,2,3\n',
      'driver_2026-01-11.csv': 'Player,Club,Carry,Ball speed (mph)\nAmara Novak,Driver,150,100\n',
      'ground/Novak_Amara_2026-01-11_swing1.csv': `# top=1 s\ntime s,left N,right N\n0.00,1,2\n0.01,1\n${'0.02,1,2\n'.repeat(40)}`,
      'sheet.xlsx': 'PK',
    };
    const { summary, lines } = await withFolder(files, (folder) => importFrom(folder, 'Mixed'));
    expect(summary.trials).toEqual({ taken: 12, void: 0, asked: 0, refused: 0 });
    expect(summary.traces).toEqual({ taken: 0, refused: 1 });
    const about = (file: string) =>
      lines
        .filter((line) => line.file === file)
        .map(({ row, column, verdict, reason }) => ({ row, column, verdict, reason }));
    expect(about('quote.csv')).toEqual([
      { row: 2, column: 1, verdict: 'refused', reason: 'a quotation mark is never closed' },
    ]);
    expect(about('picture.csv')[0]).toMatchObject({ row: 1, column: 1, verdict: 'refused' });
    expect(about('notes.csv')[0]).toMatchObject({ verdict: 'refused', reason: expect.stringContaining('headings') });
    expect(about('driver_2026-01-11.csv')[0]).toMatchObject({
      row: 1,
      column: 3,
      reason: expect.stringContaining('no unit'),
    });
    expect(about('ground/Novak_Amara_2026-01-11_swing1.csv')).toEqual([
      { row: 4, column: 3, verdict: 'refused', reason: 'a sample is missing: the file may be cut off' },
    ]);
    expect(about('sheet.xlsx')).toEqual([{ row: 0, column: 0, verdict: 'left out', reason: 'not a table of text' }]);
  });
});

describe('rows that cannot be taken', () => {
  it('are refused one by one, duplicates among them, in a copied file too', async () => {
    const more = [
      'Nobody Known,Single-leg hop,left,1,1.3,m',
      'Amara Novak,Single-leg hop,left,1,1.41,m',
      'Amara Novak,Single-leg hop,left,2,1.99,m',
      'Amara Novak,Single-leg hop,left,4,99,m',
      'Amara Novak,Single-leg hop,left,5,14.1,m',
      'Amara Novak,Single-leg hop,left,6,0.7,m',
    ].join('\n');
    const files = {
      'list.csv': LIST,
      'battery_2026-01-10.csv': `${TRIALS}\n${more}\n`,
      'copy of battery_2026-01-10.csv': `${TRIALS}\n${more}\n`,
      'growth.csv':
        'date,athlete,height cm,mass kg\n2026-01-10,Amara Novak,150,40\n2026-01-10,Amara Novak,150,40\n2026-01-10,Vesna Okafor,1500,40\n2012-01-01,Vesna Okafor,150,40\n',
    };
    const { summary, lines } = await withFolder(files, (folder) => importFrom(folder, 'Doubled'));
    expect(summary.trials).toEqual({ taken: 12, void: 0, asked: 2, refused: 4 + 18 });
    expect(summary.growth).toEqual({ taken: 1, refused: 3 });
    const reasons = lines.filter(({ file, kind }) => kind === 'trials' && !file.startsWith('copy')).slice(-6);
    expect(reasons.map(({ verdict, reason }) => [verdict, reason])).toEqual([
      ['refused', 'no athlete is called “Nobody Known”'],
      ['refused', 'the same trial a second time'],
      ['refused', 'another value for the same trial stands before it'],
      ['refused', 'outside what the test can give'],
      ['asked', 'looks ten times too high'],
      ['asked', '0.48 times the median it is compared with'],
    ]);
    expect(
      lines.filter(({ kind, verdict }) => kind === 'growth' && verdict === 'refused').map(({ reason }) => reason),
    ).toEqual([
      'the same measure a second time',
      'a height of 15.00 m is outside 0.8 to 2.3 m',
      'on 2012-01-01 the athlete was not born: a wrong date',
    ]);
  });
});

describe('an import that fails', () => {
  it('leaves nothing of that date behind, and goes on when run again', async () => {
    await withFolder({ 'list.csv': LIST }, (folder) => importFrom(folder, 'Broken'));
    const trials = `select count(*) from trial t join academy a on a.id = t.academy_id where a.name = 'Broken'`;
    const days = `select count(*) from testing_day t join academy a on a.id = t.academy_id where a.name = 'Broken'`;
    const files = { 'list.csv': LIST, 'battery_2026-01-10.csv': TRIALS };
    await count(`update policy_version set academy_id = (select id from academy where name = 'Taken'), version = 99
      where academy_id = (select id from academy where name = 'Broken')`);
    await withFolder(files, async (folder) => {
      await expect(importFrom(folder, 'Broken')).rejects.toThrow('The academy has no policy yet');
      expect([await count(trials), await count(days)]).toEqual([0, 0]);
      await count(`update policy_version set academy_id = (select id from academy where name = 'Broken'), version = 1
        where version = 99`);
      const { summary } = await importFrom(folder, 'Broken');
      expect(summary.trials.taken).toBe(12);
      expect(await count(trials)).toBe(12);
    });
  });
});

describe('another season', () => {
  it('is read by what it says: other words, units, marks, orders and layouts', async () => {
    const swing = Array.from(
      { length: 800 },
      (_, i) => `${5000 + i * 2}\t${(20 + (i % 3)).toFixed(1)}\t${(19 + (i % 2)).toFixed(1)}`,
    );
    const files = {
      'people.txt': Buffer.from(
        `\ufeffName\tGender\tBorn\tHand\tGroup\nNovák, Amara\tGirl\t7/8/2012\tRH\tDunlin\nOkafor, Vesna\tBoy\t12/16/2013\tLH\tCurlew\n`,
        'utf16le',
      ),
      'a/sheet.csv': Buffer.from(
        'Hall testing;\nComments;Attempt;Player;Limb;Exercise;Measured;Tested on\nSLIPPED;Trial 1;NOVAK Amara;L;Hop for distance, SL;1,41 m;1/17/2026\n;Trial 2;A. Nov\u00e1k;lead;Hop for distance, SL;55,5 in;1/17/2026\nComments;Attempt;Player;Limb;Exercise;Measured;Tested on\n;Trial 1;V. Okafor;lead;ISO push;1 041,5 N;1/17/2026\n;;Squad mean;;;1,4 m;\n\n',
        'latin1',
      ),
      'x_17.05.2026.csv':
        'Player,Left CMJ trial 1 [mm],Right CMJ trial 1 [mm],CMJ mean [mm]\n"Novak, Amara",141,-,141\n',
      'bodies.csv': 'Date,Player,Body mass,Height (in)\n1/17/2026,Amara Novak,95.7 lbs,61\n',
      'weather.txt': 'Day|Temp (°F)|Barometer inHg|Head wind mph|Venue\n18 May 2026|50|30|2|Range\n',
      'launch/export.csv':
        'Session;5/18/2026\nGolfer;Club name;Spin rate (rpm);Carry distance (ft);Ball velocity [km/h];Clubhead speed [km/h];Launch ang (deg)\nAmara Novak;DR;2.533;450,5;190,1;133,2;11,2\nAmara Novak;7i;5.900;300,5;140,1;105,2;18,2\nAmara Novak;Mean;;;;;\n',
      'tr/1.tsv': `athlete: Vesna Okafor\ndate: 18 May 2026\nTakeaway: 5200 ms\nTop of backswing: 5980 ms\nLead arm parallel: 6130 ms\nBall contact: 6240 ms\nTime (ms)\tLead Fz (kgf)\tTrail Fz (kgf)\n${swing.join('\n')}`,
    };
    const { summary, lines } = await withFolder(files, (folder) => importFrom(folder, 'Other'));
    expect(lines.filter(({ verdict }) => verdict === 'refused')).toEqual([]);
    expect(summary).toMatchObject({
      athletes: 2,
      trials: { taken: 3, void: 1, asked: 0, refused: 0 },
      growth: { taken: 1, refused: 0 },
      sessions: 1,
      shots: { taken: 1, excluded: 0, otherClubs: 1, refused: 0 },
      traces: { taken: 1, refused: 0 },
    });
    const client = new pg.Client({ connectionString: database().superuserUrl });
    await client.connect();
    const trials = await client.query(
      `select family_name, held_on::text, test.key, side::text, attempt, value_si from trial
       join testing_day d on d.id = testing_day_id join athlete a on a.id = athlete_id join test on test.id = test_id
       join academy on academy.id = trial.academy_id where academy.name = 'Other' order by value_si`,
    );
    const session = await client.query(
      `select held_on::text, place, temperature_c, wind_mps from driver_session s
       join academy on academy.id = s.academy_id where academy.name = 'Other'`,
    );
    await client.end();
    expect(trials.rows).toEqual([
      // By hand: 141 mm; 55.5 × 0.0254 m; Amara plays right, so lead is left; Vesna plays left, so lead is right.
      {
        family_name: 'Novák',
        held_on: '2026-05-17',
        key: 'jump',
        side: 'left',
        attempt: 1,
        value_si: expect.closeTo(0.141, 9),
      },
      {
        family_name: 'Novák',
        held_on: '2026-01-17',
        key: 'hop',
        side: 'left',
        attempt: 2,
        value_si: expect.closeTo(1.4097, 9),
      },
      { family_name: 'Novák', held_on: '2026-01-17', key: 'hop', side: 'left', attempt: 1, value_si: 1.41 },
      { family_name: 'Okafor', held_on: '2026-01-17', key: 'push', side: 'right', attempt: 1, value_si: 1041.5 },
    ]);
    // By hand: 50 °F = 10 °C; a head wind of 2 mph = −0.89408 m/s along the ball.
    expect(session.rows).toEqual([
      {
        held_on: '2026-05-18',
        place: 'Range',
        temperature_c: expect.closeTo(10, 9),
        wind_mps: expect.closeTo(-0.89408, 9),
      },
    ]);
  });
});
