import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Viewer } from '#src/access/viewer.ts';
import { asJob, asViewer } from '#src/db/client.ts';
import type { OutrunResult } from '#src/domain/outrun/outrun.ts';
import { judgeAthletesWithin } from '#src/services/judging/judgeAthletes.ts';
import { listJudgedBefore, rejudgeChanged } from '#src/services/judging/rejudgeOthers.ts';
import { requireOutrun } from '#src/services/outruns/requireOutrun.ts';
import { correctHandedness } from '#src/services/settling/changeAthlete.ts';
import { settleTrial } from '#src/services/settling/settleValue.ts';
import { useTestDatabase } from '#tests/config/testDatabase.ts';
import { TestAcademy } from '#tests/integration/judging/academy.ts';

const database = useTestDatabase();
let academy: TestAcademy;
let strength: Viewer;
let swing: Viewer;
let otherStrength: Viewer;

beforeAll(async () => {
  academy = await TestAcademy.make(database().superuserUrl);
  strength = await academy.staff('strength_coach', 'first');
  swing = await academy.staff('swing_coach', 'first');
  otherStrength = await academy.staff('strength_coach', 'second');
});
afterAll(() => academy.end());

// A lead side of 88 % of the trail in each test: difference −12 %.
const WEAK = { push: { left: 616, right: 700 }, jump: { left: 0.1232, right: 0.14 }, hop: { left: 1.232, right: 1.4 } };
const EVEN = { push: { left: 700, right: 700 }, jump: { left: 0.14, right: 0.14 }, hop: { left: 1.4, right: 1.4 } };
const DAYS = ['2024-09-14', '2025-01-18', '2025-05-10', '2025-09-13', '2026-01-17', '2026-05-09'] as const;

/** Six terms of an athlete whose lead side is weak and whose carry grows by `stepPct` a term. */
async function history(stepPct: number, legs = WEAK): Promise<string> {
  const athleteId = await academy.athlete();
  for (const [term, on] of DAYS.entries()) {
    await academy.day(athleteId, on, legs);
    await academy.growth(athleteId, on, 155 + term, 45);
    await academy.drives(athleteId, on, 150 * (1 + stepPct / 100) ** term);
  }
  return athleteId;
}

const judge = (athleteIds: string[], asOf: string, viewer = strength) =>
  asViewer(viewer, (trx) => judgeAthletesWithin(trx, viewer, { athleteIds, asOf, cause: 'testing day closed' }));
const outrunsOf = (athleteId: string) =>
  academy.rows<{ id: string; state: string; level: string; may_be_cleared: boolean }>(
    'select id, state, level, may_be_cleared from outrun where athlete_id = $1',
    [athleteId],
  );
const eventsOf = async (athleteId: string) =>
  (
    await academy.rows<{ kind: string }>('select kind from outrun_event where athlete_id = $1 order by made_at', [
      athleteId,
    ])
  ).map(({ kind }) => kind);
const newest = async (athleteId: string) =>
  (
    await academy.rows<{ result: OutrunResult; testing_day_id: string; cause: string; as_of: string }>(
      'select result, testing_day_id, cause, as_of::text from judgement where athlete_id = $1 order by made_at desc limit 1',
      [athleteId],
    )
  )[0]!;
const criterion = (result: OutrunResult, name: string) => result.criteria.find((one) => one.name === name)!;

describe('judging', () => {
  it('raises an outrun from dated data, and keeps what made it', async () => {
    const athleteId = await history(6);
    const [judged] = await judge([athleteId], DAYS[5]);
    // by hand: deficit −12 % in every test (strong, 2); carry 6 % a term against flat strength (strong, 2): Act at 4
    expect(judged).toMatchObject({ athleteId, level: 'act', points: 4 });
    const { result, testing_day_id: dayId } = await newest(athleteId);
    expect(criterion(result, 'lead-deficit').value).toBeCloseTo(-12, 9);
    expect(criterion(result, 'demand').verdict).toBe('cannot say');
    expect(dayId).toBe((await academy.day(athleteId, DAYS[5], {})).dayId);
    expect(await outrunsOf(athleteId)).toMatchObject([{ state: 'raised', level: 'act' }]);
    const page = await requireOutrun(swing, (await outrunsOf(athleteId))[0]!.id);
    expect(page.evidence.map(({ name }) => name)).toHaveLength(8);
    expect(page.evidence[0]!.dataUsed.length).toBeGreaterThan(0);
    expect(page.outrun.policyVersion).toBe(1);
  });

  it('judges as of a date: what came later is left out', async () => {
    const athleteId = await history(6);
    await judge([athleteId], DAYS[1]);
    const { result } = await newest(athleteId);
    // The first session of each test counts for nothing, so the second term has one counted session.
    expect(result.criteria[0]!.reason).toContain('12.0 %');
    expect(criterion(result, 'divergence').verdict).toBe('cannot say');
  });

  it('never opens a second outrun, and asks for Discussed again when the level rises', async () => {
    const athleteId = await history(3.2);
    await judge([athleteId], DAYS[5]);
    const [raised] = await outrunsOf(athleteId);
    expect(raised!.level).toBe('look');
    await academy.rows(`update outrun set state = 'discussed' where id = $1`, [raised!.id]);
    await judge([athleteId], DAYS[5]);
    expect(await outrunsOf(athleteId)).toMatchObject([{ id: raised!.id, state: 'discussed' }]);
    await academy.day(athleteId, '2026-09-12', WEAK);
    await academy.growth(athleteId, '2026-09-12', 161, 46);
    await academy.drives(athleteId, '2026-09-14', 212);
    await judge([athleteId], '2026-09-14');
    expect(await outrunsOf(athleteId)).toMatchObject([{ id: raised!.id, state: 'raised', level: 'act' }]);
    expect(await eventsOf(athleteId)).toEqual(['raised', 'level up']);
  });

  it('holds the last level without one, and may be cleared after two testing days, not two looks at one', async () => {
    const athleteId = await history(6);
    await judge([athleteId], DAYS[5]);
    for (const [on, expected] of [
      ['2026-09-12', false],
      ['2026-09-12', false],
      ['2027-01-16', true],
    ] as const) {
      await academy.rows(
        'delete from trial where athlete_id = $1 and testing_day_id in (select id from testing_day where held_on = $2)',
        [athleteId, on],
      );
      await academy.day(athleteId, on, EVEN);
      await academy.rows(`update shot set state = 'void' where athlete_id = $1`, [athleteId]);
      await judge([athleteId], on);
      expect((await outrunsOf(athleteId))[0], on).toMatchObject({
        level: 'act',
        state: 'raised',
        may_be_cleared: expected,
      });
    }
    expect((await eventsOf(athleteId)).at(-1)).toBe('may be cleared');
  });

  it('judges nothing of an open day', async () => {
    const athleteId = await history(6, EVEN);
    await academy.rows(`update testing_day set state = 'open' where held_on = '2026-05-09'`);
    await judge([athleteId], DAYS[5]);
    const { result } = await newest(athleteId);
    expect(JSON.stringify((result as unknown as { dataUsed: unknown }).dataUsed)).not.toContain(
      '"on":"2026-05-09","what":"push',
    );
    await academy.rows(`update testing_day set state = 'closed' where held_on = '2026-05-09'`);
  });

  it('compares with the others of the programme, across squads, without their names', async () => {
    const others: string[] = [];
    for (let i = 0; i < 8; i += 1) others.push(await history(5.8, EVEN));
    const athleteId = await history(6);
    const [judged] = await judge([athleteId, ...others], DAYS[5]);
    const { result } = await newest(athleteId);
    // All of them gained alike: against their median nothing is left, and the deficit alone raises nothing.
    expect(Math.abs(criterion(result, 'divergence').value!)).toBeLessThan(2);
    expect(judged!.level).toBeNull();
    expect(await outrunsOf(athleteId)).toEqual([]);
    // Judged alone, it is compared with the newest judgement of the same others.
    await judge([athleteId], DAYS[5]);
    expect(criterion((await newest(athleteId)).result, 'divergence').value).toBeCloseTo(
      criterion(result, 'divergence').value!,
      9,
    );
  });

  it('reaches no athlete of a squad that the coach does not have', async () => {
    const athleteId = await history(6);
    expect(await judge([athleteId], DAYS[5], otherStrength)).toEqual([]);
    expect(await outrunsOf(athleteId)).toEqual([]);
  });

  it('asks a job to judge the others again, once for an academy, and the job does it', async () => {
    const waiting = await academy.rows(`select key from graphile_worker.jobs where task_identifier = 'rejudgeOthers'`);
    expect(waiting).toEqual([{ key: `rejudgeOthers:${academy.id}` }]);
    const athleteId = await history(6);
    await judge([athleteId], DAYS[5]);
    const before = await academy.rows('select from judgement where athlete_id = $1', [athleteId]);
    const others = await asJob(academy.id, (trx) => listJudgedBefore(trx, []));
    expect(others).toContain(athleteId);
    await asJob(academy.id, (trx) => rejudgeChanged(trx, [athleteId]));
    expect(await academy.rows('select from judgement where athlete_id = $1', [athleteId])).toHaveLength(
      before.length + 1,
    );
    expect(await newest(athleteId)).toMatchObject({ cause: 'the programme’s figures changed', as_of: DAYS[5] });
  });
});

describe('settling a value', () => {
  async function withAskedTrial() {
    const athleteId = await history(6);
    const { trials } = await academy.day(athleteId, '2026-09-12', WEAK);
    const asked = trials.find(({ test, side }) => test === 'push' && side === 'left')!.id;
    await academy.rows(`update trial set state = 'asked', asked_reason = 'ten times', value_si = 6160 where id = $1`, [
      asked,
    ]);
    await judge([athleteId], '2026-09-12');
    return { athleteId, asked };
  }

  it('judges again in the same transaction when an asked value is confirmed', async () => {
    const { athleteId, asked } = await withAskedTrial();
    expect(criterion((await newest(athleteId)).result, 'lead-deficit').value).toBeCloseTo(-12, 9);
    await settleTrial(strength, asked, { verdict: 'confirm', version: 1 });
    const { result, cause } = await newest(athleteId);
    expect(cause).toBe('a value confirmed');
    expect(criterion(result, 'lead-deficit').value).toBeGreaterThan(-10);
    const audit = await academy.rows(`select change from audit where subject_id = $1`, [asked]);
    expect(audit).toEqual([{ change: { from: 'asked', to: 'valid' } }]);
  });

  it('changes nothing when it is made void, but says so; a second answer is refused with who was first', async () => {
    const { athleteId, asked } = await withAskedTrial();
    await settleTrial(strength, asked, { verdict: 'void', reason: 'typing slip', version: 1 });
    expect(await newest(athleteId)).toMatchObject({ cause: 'a value made void' });
    expect(criterion((await newest(athleteId)).result, 'lead-deficit').value).toBeCloseTo(-12, 9);
    await expect(settleTrial(strength, asked, { verdict: 'confirm', version: 1 })).rejects.toMatchObject({
      code: 'conflict',
      message: expect.stringContaining('Some strength_coach'),
    });
  });

  it('is for the strength coach of that squad and the director', async () => {
    const { asked } = await withAskedTrial();
    const confirm = { verdict: 'confirm', version: 1 } as const;
    expect(() => settleTrial(swing, asked, confirm)).toThrow(expect.objectContaining({ code: 'forbidden' }));
    await expect(settleTrial(otherStrength, asked, confirm)).rejects.toMatchObject({ code: 'not-found' });
    await settleTrial(await academy.staff('director'), asked, confirm);
  });
});

describe('handedness', () => {
  it('turns every lead and trail figure when it is corrected, and judges again', async () => {
    await academy.end();
    academy = await TestAcademy.make(database().superuserUrl);
    const director = await academy.staff('director');
    const athleteId = await history(6);
    await judge([athleteId], DAYS[5], director);
    await correctHandedness(director, athleteId, { plays: 'left', reason: 'wrong box ticked' });
    const { result, cause } = await newest(athleteId);
    expect(cause).toBe('handedness corrected');
    expect(criterion(result, 'lead-deficit').value).toBeCloseTo(12, 9);
    expect(result.level).toBeNull();
    // People close what was raised wrongly: the flag stays until they do.
    expect(await outrunsOf(athleteId)).toMatchObject([{ state: 'raised', level: 'act' }]);
  });
});
