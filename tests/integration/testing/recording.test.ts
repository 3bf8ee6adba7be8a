import { randomUUID } from 'node:crypto';
import pg from 'pg';
import { beforeAll, describe, expect, it } from 'vitest';
import type { Role, Viewer } from '#src/access/viewer.ts';
import { asViewer } from '#src/db/client.ts';
import { listAcademyTests, listAthletesToRecord, listBatteries } from '#src/db/queries/academyTests.ts';
import { provisionAcademy } from '#src/services/programme/provisionAcademy.ts';
import { recordDriverSession, type NewShot } from '#src/services/driver/recordDriverSession.ts';
import { recordGroundTraces, type NewGroundTrace } from '#src/services/driver/recordGroundTraces.ts';
import { closeTestingDays } from '#src/services/testing/closeTestingDays.ts';
import { openTestingDay } from '#src/services/testing/openTestingDay.ts';
import { recordCurves } from '#src/services/testing/recordCurves.ts';
import { recordGrowth } from '#src/services/testing/recordGrowth.ts';
import { recordTrials, type NewTrial } from '#src/services/testing/recordTrials.ts';
import { useTestDatabase } from '#tests/config/testDatabase.ts';

const database = useTestDatabase();
let director: Viewer;
let athletes: Awaited<ReturnType<typeof listAthletesToRecord>>;
let testId: (key: string) => string;
let batteryId: string;

async function query<T extends pg.QueryResultRow>(text: string, values: unknown[] = []): Promise<T[]> {
  const client = new pg.Client({ connectionString: database().superuserUrl });
  await client.connect();
  try {
    return (await client.query<T>(text, values)).rows;
  } finally {
    await client.end();
  }
}

async function as(role: Role): Promise<Viewer> {
  const [person] = await query<{ person_id: string }>(`select person_id from membership where role = $1`, [role]);
  return { ...director, role, personId: person!.person_id };
}

beforeAll(async () => {
  const athlete = (givenName: string, plays: 'left' | 'right', squad: string) => ({
    ...{
      givenName,
      familyName: 'Test',
      birthDate: '2012-07-08',
      sex: 'female' as const,
      plays,
      squad,
      guardianEmails: [],
    },
  });
  ({ director } = await provisionAcademy({
    name: 'Recording',
    athletes: [
      athlete('Amara', 'right', 'Dunlin'),
      athlete('Vesna', 'left', 'Dunlin'),
      athlete('Zora', 'right', 'Curlew'),
    ],
    dates: ['2026-01-10'],
    batteryKeys: ['push', 'hop'],
    hashPassword: async () => '$argon2id$not-a-real-one',
  }));
  await asViewer(director, async (trx) => {
    athletes = await listAthletesToRecord(trx);
    const tests = await listAcademyTests(trx);
    testId = (key) => tests.find((test) => test.key === key)!.id;
    batteryId = (await listBatteries(trx))[0]!.id;
  });
});

const day = (heldOn: string) => openTestingDay(director, { squadId: athletes[0]!.squadId, batteryId, heldOn });
const trial = (testingDayId: string, part: Partial<NewTrial> = {}): NewTrial => ({
  ...{ id: randomUUID(), testingDayId, athleteId: athletes[0]!.id, testId: testId('push'), side: 'left', attempt: 1 },
  ...{ valueSi: 700, enteredValue: '700', enteredUnit: 'N' },
  ...part,
});

describe('testing days and trials', () => {
  it('opens a day once, takes a trial once, and judges nothing until it is closed', async () => {
    const { id } = await day('2026-01-10');
    expect((await day('2026-01-10')).id).toBe(id);
    const one = trial(id);
    const [first] = await recordTrials(director, { trials: [one] });
    expect(first).toEqual({ state: 'valid', reason: null, fresh: true });
    const [again] = await recordTrials(director, { trials: [{ ...one, id: randomUUID() }] });
    expect(again).toEqual({ state: 'valid', reason: null, fresh: false });
    expect(await query(`select from judgement`)).toHaveLength(0);

    expect(await closeTestingDays(director, [id])).toHaveLength(1);
    expect(
      await query(`select state, closed_by = $2 as mine from testing_day where id = $1`, [id, director.personId]),
    ).toEqual([{ state: 'closed', mine: true }]);
    expect(await query(`select as_of::text from judgement`)).toEqual([{ as_of: '2026-01-10' }]);
    await expect(recordTrials(director, { trials: [trial(id, { attempt: 2 })] })).rejects.toThrow(
      'This testing day is closed',
    );
  });

  it('gives each trial its verdict', async () => {
    const { id } = await day('2026-02-10');
    const verdicts = await recordTrials(director, {
      trials: [
        // Compared with 700 N of the month before: 1½ times is 1050.
        trial(id, { attempt: 1, valueSi: 1050 }),
        trial(id, { attempt: 2, valueSi: 1051 }),
        trial(id, { attempt: 3, valueSi: 7000 }),
        trial(id, { attempt: 4, valueSi: 50_000 }),
        trial(id, { attempt: 5, valueSi: 9000, voidReason: 'slipped' }),
        trial(id, { attempt: 1, valueSi: 800 }),
        trial(id, { attempt: 6, side: null }),
        trial(id, { attempt: 7, athleteId: randomUUID() }),
        // A first test on this leg: the band's 880 N at 13 years.
        trial(id, { attempt: 1, side: 'right', valueSi: 1321 }),
      ],
    });
    expect(verdicts.map(({ state, reason }) => [state, reason])).toEqual([
      ['valid', null],
      ['asked', '1.50 times the median it is compared with'],
      ['asked', 'looks ten times too high'],
      ['refused', 'outside what the test can give'],
      ['void', 'slipped'],
      ['refused', 'another value for the same trial stands before it'],
      ['refused', 'no side is given'],
      ['refused', 'no such athlete'],
      ['asked', '1.50 times the median it is compared with'],
    ]);
    expect(
      await query(`select state, count(*)::int from trial where testing_day_id = $1 group by 1 order by 1`, [id]),
    ).toEqual([
      { state: 'valid', count: 1 },
      { state: 'asked', count: 3 },
      { state: 'void', count: 1 },
    ]);
  });

  it('is for those who test: not the swing coach, not another academy', async () => {
    const { id } = await day('2026-02-10');
    await expect(recordTrials(await as('swing_coach'), { trials: [trial(id)] })).rejects.toThrow(
      'Your role does not do this',
    );
    const stranger = { ...director, academyId: randomUUID() };
    await expect(recordTrials(stranger, { trials: [trial(id)] })).rejects.toThrow('No such testing day');
    const coach = await as('strength_coach');
    const [recorded] = await recordTrials(coach, { trials: [trial(id, { attempt: 8, valueSi: 720 })] });
    expect(recorded?.state).toBe('valid');
  });
});

describe('growth', () => {
  const measure = (measuredOn: string, part: object = {}) => ({
    ...{ id: randomUUID(), athleteId: athletes[0]!.id, measuredOn, statureM: 1.5, sittingHeightM: 0.79, massKg: 40 },
    entered: { statureM: '150 cm' },
    ...part,
  });
  it('is taken once, asked where it does not follow, refused where no child is so', async () => {
    const verdicts = await recordGrowth(director, [measure('2026-01-10'), measure('2026-01-11', { massKg: 400 })]);
    expect(verdicts).toEqual([
      { state: 'valid', reason: null, fresh: true },
      { state: 'refused', reason: 'a mass of 400.00 kg is outside 12 to 180 kg', fresh: false },
    ]);
    const later = await recordGrowth(director, [
      measure('2026-01-10'),
      measure('2026-04-10', { statureM: 1.45 }),
      measure('2026-01-10', { massKg: 41 }),
    ]);
    expect(later.map(({ state, reason, fresh }) => [state, reason, fresh])).toEqual([
      ['valid', null, false],
      ['asked', 'the height fell by 5.0 cm', true],
      ['refused', 'another measure of that day', false],
    ]);
    await expect(recordGrowth(await as('swing_coach'), [measure('2026-05-01')])).rejects.toThrow('Your role');
  });
});

describe('driver sessions', () => {
  const shot = (shotNo: number, part: Partial<NewShot> = {}): NewShot => ({
    ...{ id: randomUUID(), athleteId: athletes[0]!.id, shotNo, club: 'driver', clubLabel: 'Driver', offlineM: 0 },
    ...{ clubSpeedMps: 36, ballSpeedMps: 52, launchDeg: 12, spinRpm: 2600, attackDeg: 1, dynamicLoftDeg: null },
    carryM: 148 + (shotNo % 4),
    ...part,
  });
  const session = (shots: NewShot[]) => ({
    ...{ heldOn: '2026-02-14', place: 'Range', surface: 'mat', ball: 'range ball', shots },
    ...{ temperatureC: 5, humidityPct: null, pressurePa: 101_325, altitudeM: null, windMps: 0 },
  });

  it('keeps every shot, proposes mishits for exclusion, and judges', async () => {
    const shots = [1, 2, 3, 4, 5, 6].map((number) => shot(number));
    const mishits = [
      shot(7, { carryM: 60 }),
      shot(8, { clubSpeedMps: 52 }),
      shot(9, { club: 'other', clubLabel: '7 iron', carryM: 100 }),
    ];
    const coach = await as('swing_coach');
    const { shots: verdicts } = await recordDriverSession(coach, session([...shots, ...mishits]));
    expect(verdicts.map(({ state }) => state)).toEqual([
      ...shots.map(() => 'counted'),
      'excluded',
      'excluded',
      'other club',
    ]);
    expect(verdicts[7]?.reason).toBe('ball speed over club speed is 1.00; a real shot lies in 1.1 to 1.52');
    // Cold air holds the ball back: at 20 °C it would have carried further.
    expect(
      await query(
        `select bool_and(carry_standard_m > carry_m) as further from shot where state = 'counted' and club = 'driver'`,
      ),
    ).toEqual([{ further: true }]);
    expect(await query(`select as_of::text from judgement order by made_at desc limit 1`)).toEqual([
      { as_of: '2026-02-14' },
    ]);

    const again = await recordDriverSession(
      coach,
      session([...shots, shot(1, { carryM: 99 }), shot(10, { athleteId: randomUUID() })]),
    );
    expect(again.shots.slice(0, 6).every(({ state, fresh }) => state === 'counted' && !fresh)).toBe(true);
    expect(again.shots.slice(6).map(({ reason }) => reason)).toEqual(['shot 1 a second time', 'no such athlete']);
    await expect(recordDriverSession(await as('strength_coach'), session(shots))).rejects.toThrow('Your role');
  });
});

describe('recordings', () => {
  const plate = (newtons: number) => Float64Array.from({ length: 800 }, (_, i) => newtons + (i % 7));
  const trace = (part: Partial<NewGroundTrace> = {}): NewGroundTrace => ({
    ...{ id: randomUUID(), athleteId: athletes[0]!.id, recordedOn: '2026-02-14', swingNo: 0, club: 'driver' },
    ...{ rig: 'Ground rig', measure: 'force', sampleRateHz: 500, left: plate(190), right: plate(196) },
    events: { takeaway: 0.2, top: 0.98, earlyDownswing: 1.06, leadArmParallel: 1.13, impact: 1.24, finish: 1.5 },
    ...part,
  });

  it('keeps a trace with figures for either leg, beside the session of its date', async () => {
    const one = trace();
    // 40 kg weigh 392.4 N: plates that read half of it are wrong.
    const verdicts = await recordGroundTraces(director, '2026-02-14', [
      one,
      { ...one, id: randomUUID() },
      trace({ left: plate(95), right: plate(98) }),
      trace({ left: plate(191), events: { ...one.events, impact: 9 } }),
    ]);
    expect(verdicts.map(({ state, reason }) => [state, reason])).toEqual([
      ['taken', null],
      ['refused', 'the same trace a second time'],
      ['refused', expect.stringContaining('both plates at rest read 199, the body weight is 392 N')],
      ['refused', expect.stringContaining('impact at 9 s lies outside the trace')],
    ]);
    const [kept] = await query<{ lead: number; trail: number; session: boolean; bytes: number }>(
      `select (figures #>> '{left,peakLead,force}')::float as lead, (figures #>> '{right,peakLead,force}')::float as trail,
         driver_session_id is not null as session, (select sum(length(samples))::int from ground_channel) as bytes from ground_trace`,
    );
    expect(kept).toEqual({ lead: 196, trail: 202, session: true, bytes: 2 * 800 * 4 });
    const [again] = await recordGroundTraces(director, '2026-02-14', [trace({ id: randomUUID() })]);
    expect(again).toEqual({ state: 'taken', reason: null, fresh: false });
  });

  it('refuses a curve that cannot be read rightly', async () => {
    const flat = Float64Array.from({ length: 2500 }, (_, i) => 400 + (i % 2));
    const [verdict] = await recordCurves(director, [
      {
        ...{ id: randomUUID(), athleteId: athletes[0]!.id, testingDayId: null, testKey: 'jump', side: 'left' },
        ...{ recordedOn: '2026-02-10', device: null, sampleRateHz: 1000, samples: flat },
      },
    ]);
    expect(verdict).toEqual({
      state: 'refused',
      reason: 'no take-off: the force never leaves body weight',
      fresh: false,
    });
    expect(await query(`select from curve`)).toHaveLength(0);
  });
});
