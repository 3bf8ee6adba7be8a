import { describe, expect, it } from 'vitest';
import type { AthleteHistory } from '#src/domain/outrun/athleteHistory.ts';
import type { CriterionName } from '#src/domain/outrun/criterion.ts';
import { pairSessions } from '#src/domain/outrun/divergenceFrom.ts';
import { judgeAthlete } from '#src/domain/outrun/judgeAthlete.ts';
import { historyOf, session, swing } from '#tests/unit/domain/outrun/historyOf.ts';

/** Windows and minima in this file: our own rule (SCIENCE §9), no published cut-off. */

const criterionIn = (history: AthleteHistory, name: CriterionName) =>
  judgeAthlete(history).result.criteria.find((criterion) => criterion.name === name)!;
const withGround = (changes: Partial<AthleteHistory['ground'][number]>) =>
  historyOf({ ground: [{ ...historyOf().ground[0]!, ...changes }] });

describe('a whole history', () => {
  const judged = judgeAthlete(historyOf());

  it('builds the summaries: newest two counted sessions of each test, by hand', () => {
    expect(judged.input.leadDeficit!.values).toHaveLength(6);
    expect(judged.input.leadDeficit!.values[0]!.lead).toBeCloseTo(622, 9);
    // TE of a push of three trials: √(16/3 + 6.25) = 3.403430 (SCIENCE §9)
    expect(judged.input.leadDeficit!.values[0]!.teLeadPct).toBeCloseTo(3.40343, 6);
    expect(judged.input.divergence!.pairs.map(({ day }) => day)).toEqual([
      '2025-01-22',
      '2025-05-15',
      '2025-09-17',
      '2026-01-21',
    ]);
    const newest = judged.input.divergence!.pairs.at(-1)!;
    expect(newest).toMatchObject({ carry: 186, stature: 159 });
    expect(newest.strength).toBeCloseTo(618, 9);
    // 2012-01-01 to 2026-01-21 is 5134 days
    expect(newest.age).toBeCloseTo(5134 / 365.25, 12);
  });

  it('judges it, by hand: deficits of 8, 7.7 and 7.7 % are met (not strong), the other three as strong as they go: 6, Act', () => {
    const verdicts = judged.result.criteria.slice(0, 4).map(({ verdict }) => verdict);
    expect(verdicts).toEqual(['met', 'strong', 'strong', 'met']);
    expect(judged.result).toMatchObject({ level: 'act', points: 6 });
    expect(judged.result.clearsWhen.some((text) => text.includes('push about'))).toBe(true);
  });

  it('gives raw gain and demand ratio for the others’ medians', () => {
    expect(judged.raw).toBeCloseTo(judged.result.criteria[1]!.value!, 12);
    expect(judged.demandRatio!.rig).toBe('Plates A');
    // 1.5 ÷ (618 / (49.5 · 9.81))
    expect(judged.demandRatio!.value).toBeCloseTo(1.5 / (618 / (49.5 * 9.81)), 12);
  });

  it('lists the data used, with dates and figures', () => {
    expect(judged.dataUsed['lead-deficit'][0]).toEqual({
      what: 'push, lead and trail (means of 3 and 3)',
      on: '2025-09-13',
      value: '622 N and 676 N',
    });
    expect(judged.dataUsed.divergence).toHaveLength(4);
    expect(judged.dataUsed.demand.map(({ on }) => on)).toEqual(['2026-01-21', '2026-01-17']);
  });

  it('an empty history says nothing, with a reason for each criterion', () => {
    const empty = judgeAthlete(historyOf({ strength: [], growth: [], driver: [], ground: [] }));
    expect(empty.result.level).toBeNull();
    expect(empty.raw).toBeNull();
    expect(empty.demandRatio).toBeNull();
    expect(empty.impossibleBefore).toBeNull();
    expect(empty.result.criteria.map(({ verdict }) => verdict)).toEqual(Array(8).fill('cannot say'));
  });

  it('takes the medians of the programme only from enough others', () => {
    const programme = { othersRaw: Array<number>(8).fill(1), othersDemand: Array<number>(10).fill(1), others: [] };
    const { result, raw, input } = judgeAthlete(historyOf({ programme }));
    expect(result.criteria[1]!.value).toBeCloseTo(raw! - 1, 12);
    expect(result.criteria[2]!.threshold).toBeCloseTo(1.1, 12);
    expect(input.demand!.programmeMedian).toBe(1);
    const nine = judgeAthlete(historyOf({ programme: { ...programme, othersDemand: Array<number>(9).fill(1) } }));
    expect(nine.result.criteria[2]!.threshold).toBe(0.85);
  });
});

describe('sessions that count for lead-deficit', () => {
  const push = (on: string, lead = 92) => session(on, 'push', lead, 100);
  const only = (strength: AthleteHistory['strength'], asOf = '2026-01-21') =>
    judgeAthlete(historyOf({ strength, asOf })).input.leadDeficit?.values.length ?? 0;

  it('the first session of each test counts for nothing', () => {
    expect(only([push('2025-09-13')])).toBe(0);
    expect(only([push('2025-09-13'), push('2026-01-17')])).toBe(1);
    expect(only([push('2025-09-13'), push('2026-01-17'), session('2026-01-17', 'jump', 0.12, 0.13)])).toBe(1);
  });

  it('a session of void trials alone is none, and not the first', () => {
    const voided = { on: '2025-05-10', test: 'push' as const, leadTrials: [], trailTrials: [] };
    expect(only([voided, push('2025-09-13'), push('2026-01-17')])).toBe(1);
  });

  it('needs two valid trials a leg, each leg with its own n', () => {
    const uneven = { ...push('2026-01-17'), leadTrials: [92, 92], trailTrials: [100, 100, 100, 100] };
    const { input } = judgeAthlete(historyOf({ strength: [push('2025-05-10'), push('2025-09-13'), uneven] }));
    const last = input.leadDeficit!.values[1]!;
    // √(16/2 + 6.25) and √(16/4 + 6.25), by hand
    expect(last.teLeadPct).toBeCloseTo(Math.sqrt(14.25), 12);
    expect(last.teTrailPct).toBeCloseTo(Math.sqrt(10.25), 12);
    expect(only([push('2025-05-10'), push('2025-09-13'), { ...uneven, leadTrials: [92] }])).toBe(1);
  });

  it('reaches back 400 days, not 401: 2024-12-17 is 400 days before 2026-01-21', () => {
    expect(only([push('2024-09-14'), push('2024-12-17'), push('2026-01-17')])).toBe(2);
    expect(only([push('2024-09-14'), push('2024-12-16'), push('2026-01-17')])).toBe(1);
  });

  it('takes the newest two of a test and none after the judgement', () => {
    const four = [push('2024-09-14'), push('2025-05-10', 80), push('2025-09-13', 92), push('2026-01-17', 92)];
    const { input } = judgeAthlete(historyOf({ strength: [...four, push('2026-01-22', 50)] }));
    expect(input.leadDeficit!.values.map(({ lead }) => Math.round(lead))).toEqual([92, 92]);
  });

  it('takes the programme’s own typical error where there is one', () => {
    const own = { ...push('2026-01-17'), teLeadPct: 2, teTrailPct: 2.2 };
    const { input } = judgeAthlete(historyOf({ strength: [push('2025-05-10'), push('2025-09-13'), own] }));
    expect(input.leadDeficit!.values[1]).toMatchObject({ teLeadPct: 2, teTrailPct: 2.2 });
  });
});

describe('pairs of carry and strength', () => {
  const days = (on: string[]) => on.map((one) => ({ on: one }));
  const pairs = (strength: string[], driver: string[]) =>
    pairSessions(days(strength), days(driver)).map((pair) => `${pair.strength.on}/${pair.driver.on}`);

  it('21 days apart pair, 22 do not, on either side', () => {
    expect(pairs(['2026-01-10'], ['2026-01-31'])).toEqual(['2026-01-10/2026-01-31']);
    expect(pairs(['2026-01-10'], ['2026-02-01'])).toEqual([]);
    expect(pairs(['2026-01-31'], ['2026-01-10'])).toEqual(['2026-01-31/2026-01-10']);
    expect(pairs(['2026-02-01'], ['2026-01-10'])).toEqual([]);
  });

  it('the nearest, the earlier on a tie, each once', () => {
    expect(pairs(['2026-01-10'], ['2026-01-14', '2026-01-07'])).toEqual(['2026-01-10/2026-01-07']);
    expect(pairs(['2026-01-10'], ['2026-01-13', '2026-01-07'])).toEqual(['2026-01-10/2026-01-07']);
    expect(pairs(['2026-01-10', '2026-01-12'], ['2026-01-12'])).toEqual(['2026-01-12/2026-01-12']);
    expect(pairs(['2026-01-12', '2026-01-10'], ['2026-01-20', '2026-01-12'])).toEqual([
      '2026-01-12/2026-01-12',
      '2026-01-10/2026-01-20',
    ]);
  });

  it('leaves out driver sessions with too strong a wind or without a carry', () => {
    const driver = historyOf().driver.map((drive, i) => (i === 2 ? { ...drive, windTooStrong: true } : drive));
    expect(judgeAthlete(historyOf({ driver })).input.divergence!.pairs).toHaveLength(3);
    const blank = historyOf().driver.map((drive, i) => (i === 2 ? { ...drive, carryStandardM: null } : drive));
    expect(judgeAthlete(historyOf({ driver: blank })).input.divergence!.pairs).toHaveLength(3);
  });

  it('takes the stature nearest within 150 days of the driver session, not 151', () => {
    // 2025-08-24 is 150 days before 2026-01-21, 2025-08-23 is 151
    const near = historyOf({ growth: [{ on: '2025-08-24', statureCm: 158, massKg: null }] });
    expect(judgeAthlete(near).input.divergence!.pairs.map(({ day }) => day)).toContain('2026-01-21');
    const far = historyOf({ growth: [{ on: '2025-08-23', statureCm: 158, massKg: null }] });
    expect(judgeAthlete(far).input.divergence!.pairs.map(({ day }) => day)).not.toContain('2026-01-21');
    expect(criterionIn(historyOf({ growth: [] }), 'divergence').reason).toContain('No height within 150 days');
  });

  it('takes mass × lead jump height where no push counts', () => {
    const history = historyOf();
    const strength = history.strength.filter(({ test }) => test !== 'push');
    const { input } = judgeAthlete({ ...history, strength });
    expect(input.divergence!.pairs.at(-1)!.strength).toBeCloseTo(49.5 * 0.12, 12);
    expect(input.divergence!.pairs).toHaveLength(4);
    const noMass = history.growth.map((row) => ({ ...row, massKg: null }));
    expect(judgeAthlete({ ...history, strength, growth: noMass }).input.divergence).toBeUndefined();
  });
});

describe('demand', () => {
  const asOfAfter = (on: string) => historyOf({ asOf: on });

  it('swings and push of 42 days ago count, of 43 not', () => {
    // push 2026-01-17 + 42 = 2026-02-28; ground 2026-01-21 + 42 = 2026-03-04
    expect(judgeAthlete(asOfAfter('2026-02-28')).input.demand).toBeDefined();
    expect(criterionIn(asOfAfter('2026-03-01'), 'demand').reason).toBe('No push that counts within 42 days.');
    const oldSwings = { ...historyOf({ asOf: '2026-03-04' }) };
    expect(judgeAthlete(oldSwings).input.lateReturn).toBeDefined();
    expect(judgeAthlete({ ...oldSwings, asOf: '2026-03-05' }).input.lateReturn).toBeUndefined();
  });

  it('needs five swings of one session', () => {
    const four = withGround({ swings: Array.from({ length: 4 }, () => swing()) });
    expect(criterionIn(four, 'demand')).toMatchObject({ verdict: 'cannot say' });
    expect(criterionIn(four, 'demand').reason).toContain('has 4 of 4');
    const split = historyOf({
      ground: ['2026-01-20', '2026-01-21'].map((on) => ({
        on,
        rig: 'Plates A',
        club: 'driver',
        swings: Array.from({ length: 3 }, () => swing()),
      })),
    });
    expect(criterionIn(split, 'demand').verdict).toBe('cannot say');
  });

  it('takes driver swings only', () => {
    expect(criterionIn(withGround({ club: '7-iron' }), 'demand').verdict).toBe('cannot say');
  });

  it('a missing plate makes demand, late-return and late-peak “cannot say”', () => {
    const onePlate = withGround({ swings: Array.from({ length: 5 }, () => swing({ bothPlates: false })) });
    for (const name of ['demand', 'late-return', 'late-peak'] as const) {
      expect(criterionIn(onePlate, name)).toMatchObject({ verdict: 'cannot say', value: null, points: 0 });
      expect(criterionIn(onePlate, name).reason).toContain('plate is missing');
    }
  });

  it('pressure gives a late return but no demand and no late peak', () => {
    const mat = withGround({ swings: Array.from({ length: 5 }, () => swing({ measure: 'pressure' })) });
    expect(criterionIn(mat, 'demand').verdict).toBe('cannot say');
    expect(criterionIn(mat, 'late-peak').verdict).toBe('cannot say');
    expect(criterionIn(mat, 'late-return').verdict).toBe('met');
  });

  it('late-peak needs 200 samples a second', () => {
    const at = (sampleRateHz: number) =>
      withGround({ swings: Array.from({ length: 5 }, () => swing({ sampleRateHz })) });
    expect(criterionIn(at(199), 'late-peak').verdict).toBe('cannot say');
    expect(criterionIn(at(200), 'late-peak').verdict).toBe('not met');
  });

  it('a mass of 14 days ago serves, of 15 not', () => {
    const massOn = (on: string) => historyOf({ growth: [{ on, statureCm: null, massKg: 49.5 }] });
    // 14 days before the push of 2026-01-17
    expect(judgeAthlete(massOn('2026-01-03')).input.demand).toBeDefined();
    expect(criterionIn(massOn('2026-01-02'), 'demand').reason).toContain('No body mass within 14 days of the push');
  });

  it('turns newtons into body weights with the mass near the swings', () => {
    const newtons = withGround({
      swings: [700, 720, 730, 740, 760].map((peakLeadForceN) => swing({ peakLeadForceN, peakLeadTimesBodyWeight: 9 })),
    });
    expect(judgeAthlete(newtons).input.demand!.peakLead.mean).toBeCloseTo(730 / (49.5 * 9.81), 12);
    const noMass = criterionIn({ ...newtons, growth: [] }, 'demand');
    expect(noMass.reason).toContain('No body mass within 14 days of the driver swings of 2026-01-21');
  });

  it('a demand that is measured and not met takes a point of divergence; one that cannot be measured does not', () => {
    const easy = withGround({ swings: Array.from({ length: 5 }, () => swing({ peakLeadTimesBodyWeight: 0.7 })) });
    const reduced = criterionIn(easy, 'divergence');
    expect(reduced).toMatchObject({ verdict: 'strong', points: 1 });
    expect(reduced.reason).toContain('One point less');
    expect(criterionIn(historyOf({ ground: [] }), 'divergence')).toMatchObject({ verdict: 'strong', points: 2 });
  });
});

describe('what is shown and never counted', () => {
  it('compares club speed with fifteen others', () => {
    const others = Array.from({ length: 15 }, (_, i) => ({
      strength: 500 + 20 * i,
      clubSpeed: 30 + 0.2 * i + (i % 2),
    }));
    const programme = { othersRaw: [], othersDemand: [], others };
    expect(criterionIn(historyOf({ programme }), 'ahead-of-strength').verdict).toBe('met');
    expect(criterionIn(historyOf({ programme, asOf: '2026-03-05' }), 'ahead-of-strength').verdict).toBe('cannot say');
  });

  it('finds distance from delivery between the newest two driver sessions', () => {
    const driver = historyOf().driver.map((drive, i) => (i === 4 ? { ...drive, attackDeg: 3 } : drive));
    expect(criterionIn(historyOf({ driver }), 'delivery')).toMatchObject({ verdict: 'met', value: 2, points: 0 });
    const unknown = driver.map((drive) => ({ ...drive, carryMdcM: null }));
    expect(criterionIn(historyOf({ driver: unknown }), 'delivery').verdict).toBe('cannot say');
  });

  it('a lead push up beyond its detectable change is strength risen: by hand 1.644854·√2·3.403430 = 7.917 %', () => {
    const risen = (lead: number) => {
      const strength = [...historyOf().strength.filter(({ test }) => test !== 'push')];
      for (const [on, force] of [
        ['2025-05-10', 600],
        ['2025-09-13', 600],
        ['2026-01-17', lead],
      ] as const) {
        strength.push(session(on, 'push', force, 700));
      }
      return judgeAthlete(historyOf({ strength })).input.delivery!.strengthRisen;
    };
    expect(risen(600 * Math.exp(0.0791))).toBe(false);
    expect(risen(600 * Math.exp(0.0792))).toBe(true);
  });

  it('gathers the context: hip twice, growth, driver balls, pain; pain leaves no line of evidence', () => {
    const hipRotation = [
      { on: '2025-09-13', lead: 22, trail: 34 },
      { on: '2026-01-17', lead: 21, trail: 35 },
    ];
    const driver = historyOf().driver.map((drive, i) => (i === 4 ? { ...drive, ballsWeekChangePct: 35 } : drive));
    const { result, dataUsed } = judgeAthlete(historyOf({ hipRotation, driver, pain: 4 }));
    const { reason, verdict } = result.criteria[7]!;
    expect(verdict).toBe('met');
    expect(reason).toMatch(/lead hip.*driver balls up 35 %.*pain 4 out of 10/);
    expect(JSON.stringify(dataUsed)).not.toMatch(/pain/i);
  });

  it('growth in the spurt band over at least 150 days: boys from 8, girls from 7 cm a year (our own proposal)', () => {
    const growing = (sex: 'male' | 'female', cm: number, before = '2025-05-10') =>
      judgeAthlete(
        historyOf({
          sex,
          growth: [
            { on: before, statureCm: 150, massKg: null },
            { on: '2026-01-17', statureCm: 150 + cm, massKg: 49.5 },
          ],
        }),
      ).input.context!.velocityInSpurtBand;
    // 252 days: 5.2 cm is 7.54 cm a year, 5.6 cm is 8.12
    expect([growing('male', 5.2), growing('female', 5.2), growing('male', 5.6)]).toEqual([false, true, true]);
    expect(growing('male', 5, '2025-08-21')).toBeNull();
  });
});

describe('the date before which data already taken make it impossible', () => {
  it('is that of the planned testing day, and is said', () => {
    const plannedTestingDays = ['2026-05-09', '2026-09-12'];
    const { impossibleBefore, result } = judgeAthlete(historyOf({ plannedTestingDays }));
    expect(plannedTestingDays).toContain(impossibleBefore);
    expect(result.clearsWhen.join(' ')).toMatch(/not before (9 May|12 September) 2026/);
  });
});
