import { describe, expect, it } from 'vitest';
import { aheadOfStrength } from '#src/domain/outrun/aheadOfStrength.ts';
import { contextCriterion, withoutPain } from '#src/domain/outrun/contextCriterion.ts';
import { delivery } from '#src/domain/outrun/delivery.ts';
import { latePeak } from '#src/domain/outrun/latePeak.ts';

describe('ahead-of-strength', () => {
  const x = [620, 700, 655, 810, 760, 905, 840, 980, 1020, 890, 1100, 1150, 1060, 1210, 990, 1280];
  const y = [33.1, 34.6, 33.0, 36.2, 36.0, 38.1, 36.4, 39.2, 40.5, 37.0, 41.4, 42.6, 40.2, 43.1, 39.6, 44.8];
  const others = x.map((strength, i) => ({ strength, clubSpeed: y[i]! }));
  const at = (clubSpeed: number, strength = 700) => aheadOfStrength({ others, athlete: { strength, clubSpeed } });

  it('I6: at 700 N the line is 34.299297 and the 90 % prediction 33.554526…35.044068 (SCIENCE §9)', () => {
    const result = at(34.299297);
    expect(result.value).toBeCloseTo(0, 6);
    expect(result.threshold).toBeCloseTo(35.044068 - 34.299297, 5);
    expect(at(35.044).verdict).toBe('not met');
    expect(at(35.0441)).toMatchObject({ verdict: 'met', points: 0, kind: 'information' });
    const [low, high] = at(36).interval90!;
    expect(high - low).toBeCloseTo(35.044068 - 33.554526, 5);
    expect((low + high) / 2).toBeCloseTo(36 - 34.299297, 6);
  });

  it('needs fifteen others who differ in strength', () => {
    const athlete = { strength: 700, clubSpeed: 34 };
    expect(aheadOfStrength({ others: others.slice(0, 14), athlete }).verdict).toBe('cannot say');
    expect(aheadOfStrength({ others: others.slice(0, 15), athlete }).verdict).toBe('not met');
    const alike = others.map((other) => ({ ...other, strength: 700 }));
    expect(aheadOfStrength({ others: alike, athlete })).toMatchObject({ verdict: 'cannot say', threshold: null });
    expect(aheadOfStrength(undefined).verdict).toBe('cannot say');
    expect(() => at(-1)).toThrow(RangeError);
  });
});

describe('late-peak: over 20 ms in at least 70 % of at least five swings (SCIENCE §9)', () => {
  const of = (late: number, onTime: number) =>
    latePeak({ afterLeadArmParallelMs: [...Array<number>(late).fill(21), ...Array<number>(onTime).fill(20)] });
  it.each([
    { late: 7, onTime: 3, verdict: 'met' },
    { late: 6, onTime: 4, verdict: 'not met' },
    { late: 4, onTime: 1, verdict: 'met' },
    { late: 3, onTime: 2, verdict: 'not met' },
    { late: 4, onTime: 0, verdict: 'cannot say' },
    { late: 0, onTime: 5, verdict: 'not met' },
  ])('$late late, $onTime not: $verdict', ({ late, onTime, verdict }) => {
    expect(of(late, onTime)).toMatchObject({ verdict, points: 0, threshold: 20, interval90: null });
  });
  it('gives the median in ms', () => {
    expect(latePeak({ afterLeadArmParallelMs: [-12, 4, 9, 30, 40] }).value).toBe(9);
    expect(latePeak(undefined).verdict).toBe('cannot say');
  });
});

describe('delivery (SCIENCE §9)', () => {
  const base = {
    carryChange: 8,
    carryMdc: 8,
    clubSpeedChange: 0.9,
    clubSpeedMdc: 1,
    attackChangeDeg: 2,
    loftChangeDeg: 0.5,
    strengthRisen: false,
  };
  it('is met with all four, at the edges that count', () => {
    expect(delivery(base)).toMatchObject({ verdict: 'met', points: 0, value: 2, threshold: 2, interval90: null });
    expect(delivery({ ...base, attackChangeDeg: null, loftChangeDeg: 3 })).toMatchObject({ verdict: 'met', value: 3 });
  });
  it.each([
    { but: 'carry up by less than one detectable change', change: { carryChange: 7.9 } },
    { but: 'club speed up by one', change: { clubSpeedChange: 1 } },
    { but: 'club speed down by one', change: { clubSpeedChange: -1 } },
    { but: 'angles up by less than 2°', change: { attackChangeDeg: 1.9 } },
    { but: 'the leg stronger', change: { strengthRisen: true } },
  ])('is not met with $but', ({ change }) => expect(delivery({ ...base, ...change }).verdict).toBe('not met'));
  it('cannot say without an angle', () => {
    expect(delivery({ ...base, attackChangeDeg: null, loftChangeDeg: undefined }).verdict).toBe('cannot say');
    expect(delivery(undefined).verdict).toBe('cannot say');
  });
});

describe('context (SCIENCE §9)', () => {
  const hip = (lead: number, trail: number) => ({
    hipRotation: [
      { lead, trail },
      { lead, trail },
    ],
  });
  it.each([
    { block: hip(25, 35), verdict: 'met' },
    { block: hip(25, 34.9), verdict: 'not met' },
    { block: hip(19.9, 20), verdict: 'met' },
    { block: hip(20, 20), verdict: 'not met' },
    { block: { hipRotation: [{ lead: 15, trail: 30 }] }, verdict: 'cannot say' },
    { block: { velocityInSpurtBand: true }, verdict: 'met' },
    { block: { velocityInSpurtBand: false }, verdict: 'not met' },
    { block: { driverBallsChangePct: 20 }, verdict: 'not met' },
    { block: { driverBallsChangePct: 20.1 }, verdict: 'met' },
    { block: { pain: 1 }, verdict: 'not met' },
    { block: { pain: 2 }, verdict: 'met' },
    { block: {}, verdict: 'cannot say' },
    { block: undefined, verdict: 'cannot say' },
  ])('$block: $verdict', ({ block, verdict }) => {
    expect(contextCriterion(block)).toMatchObject({ verdict, points: 0, value: null, threshold: null });
  });

  it('without pain neither the word nor the verdict gives it away', () => {
    const block = { pain: 6, velocityInSpurtBand: false };
    expect(contextCriterion(block).reason).toContain('Pain 6');
    expect(withoutPain(block)).toEqual(contextCriterion({ velocityInSpurtBand: false }));
    expect(JSON.stringify(withoutPain({ pain: 6 }))).toBe(JSON.stringify(contextCriterion({})));
  });
});
