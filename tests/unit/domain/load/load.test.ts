import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { oneRepMax } from '#src/domain/load/oneRepMax.ts';
import { sessionLoad } from '#src/domain/load/sessionLoad.ts';
import { weekChange } from '#src/domain/load/weekChange.ts';

describe('sessionLoad', () => {
  it('F1: a week by Foster’s formulas (recomputed, sample SD)', () => {
    const loads = [360, 180, 0, 350, 270, 200, 0];
    const days = loads.map((load) => (load === 0 ? [] : [{ rpe: 5, minutes: load / 5 }]));
    const result = sessionLoad({ days });
    expect(result).toMatchObject({ daily: loads, week: 1360, reason: null });
    expect(result.mean).toBeCloseTo(194.285714, 6);
    expect(result.sd).toBeCloseTo(148.980663, 6); // the population SD would be 137.929293
    expect(result.monotony).toBeCloseTo(1.3041, 6);
    expect(result.strain).toBeCloseTo(1773.576, 3);
  });

  it.each([
    ['F2: seven equal days', 300],
    ['F3: seven days of rest', 0],
  ])('%s have no monotony', (_, load) => {
    const result = sessionLoad({ days: Array.from({ length: 7 }, () => [{ rpe: 3, minutes: load / 3 }]) });
    expect(result).toMatchObject({ week: 7 * load, sd: 0, monotony: null, strain: null });
    expect(result.reason).toContain('alike');
  });

  it('sums the sessions of a day', () => {
    // by hand: 6 · 60 + 4 · 30 = 480
    const days = [[{ rpe: 6, minutes: 60 }, { rpe: 4, minutes: 30 }], [], [], [], [], [], []]; // prettier-ignore
    expect(sessionLoad({ days }).daily[0]).toBe(480);
  });

  it('has the same monotony in any order of days, and in hours', () => {
    const day = fc.array(
      fc.record({ rpe: fc.integer({ min: 0, max: 10 }), minutes: fc.integer({ min: 0, max: 240 }) }),
      { maxLength: 3 },
    );
    fc.assert(
      fc.property(fc.array(day, { minLength: 7, maxLength: 7 }), (days) => {
        const one = sessionLoad({ days });
        const turned = sessionLoad({ days: days.toReversed() });
        expect(turned.week).toBe(one.week);
        if (one.monotony === null) {
          expect(one.reason).not.toBeNull();
          return;
        }
        expect(turned.monotony! - one.monotony).toBeCloseTo(0, 9);
        const hours = sessionLoad({
          days: days.map((list) => list.map(({ rpe, minutes }) => ({ rpe, minutes: minutes / 60 }))),
        });
        expect(hours.monotony! - one.monotony).toBeCloseTo(0, 9);
      }),
    );
  });

  it('refuses six days, effort above 10 and negative minutes', () => {
    const rest = [[], [], [], [], [], []];
    expect(() => sessionLoad({ days: rest })).toThrow('sessionLoad requires seven days, got 6');
    expect(() => sessionLoad({ days: [...rest, [{ rpe: 11, minutes: 5 }]] })).toThrow(RangeError);
    expect(() => sessionLoad({ days: [...rest, [{ rpe: 5, minutes: -5 }]] })).toThrow(RangeError);
    expect(() => sessionLoad({ days: [...rest, [{ rpe: NaN, minutes: 5 }]] })).toThrow(RangeError);
  });
});

describe('weekChange', () => {
  it('F6: 1200 to 1360 (recomputed)', () => {
    expect(weekChange({ weeks: [900, 1200, 1360] }).changePct).toBeCloseTo(13.333333, 6);
  });

  it.each([
    { weeks: [0, 500], reason: 'the week before is 0' },
    { weeks: [0, 0], reason: 'the week before is 0' },
    { weeks: [500], reason: 'one week only' },
  ])('is undefined for $weeks', ({ weeks, reason }) => {
    const result = weekChange({ weeks });
    expect(result.changePct).toBeNull();
    expect(result.reason).toContain(reason);
  });

  it('is −100 for a week of rest and 0 for the same again', () => {
    expect(weekChange({ weeks: [500, 0] }).changePct).toBe(-100);
    expect(weekChange({ weeks: [500, 500] }).changePct).toBe(0);
  });

  it('refuses empty lists and negative loads', () => {
    expect(() => weekChange({ weeks: [] })).toThrow(RangeError);
    expect(() => weekChange({ weeks: [-1, 5] })).toThrow('weekChange requires loads ≥ 0, got -1');
    expect(() => weekChange({ weeks: [1, Infinity] })).toThrow(RangeError);
  });
});

describe('oneRepMax', () => {
  // F7, load 100; Epley and Brzycki are common practice (from memory), values recomputed. One repetition is the load
  // itself: Epley's formula read literally would give 103.3333.
  it.each([
    [1, 100, 100],
    [2, 106.6667, 102.8571],
    [5, 116.6667, 112.5],
    [10, 133.3333, 133.3333],
  ])('F7: %i repetitions', (reps, epley, brzycki) => {
    const result = oneRepMax({ load: 100, reps });
    expect(result.epley).toBeCloseTo(epley, 4);
    expect(result.brzycki).toBeCloseTo(brzycki, 4);
    expect(result.reason).toBeNull();
  });

  it.each([11, 36, 37, 40])('refuses an estimate from %i repetitions', (reps) => {
    expect(oneRepMax({ load: 100, reps })).toMatchObject({ epley: null, brzycki: null });
    expect(oneRepMax({ load: 100, reps }).reason).toContain('more than 10');
  });

  it('grows with repetitions and in step with the load', () => {
    fc.assert(
      fc.property(fc.double({ min: 1, max: 400, noNaN: true }), fc.integer({ min: 1, max: 9 }), (load, reps) => {
        const [fewer, more, double] = [
          oneRepMax({ load, reps }),
          oneRepMax({ load, reps: reps + 1 }),
          oneRepMax({ load: 2 * load, reps }),
        ];
        expect(more.epley!).toBeGreaterThan(fewer.epley!);
        expect(more.brzycki!).toBeGreaterThan(fewer.brzycki!);
        expect(double.epley! / fewer.epley!).toBeCloseTo(2, 12);
        expect(fewer.brzycki!).toBeGreaterThanOrEqual(load * (1 - 1e-12));
      }),
    );
  });

  it('refuses what is negative or not whole', () => {
    expect(() => oneRepMax({ load: -1, reps: 5 })).toThrow(RangeError);
    expect(() => oneRepMax({ load: 50, reps: 0 })).toThrow('oneRepMax requires whole reps ≥ 1, got 0');
    expect(() => oneRepMax({ load: 50, reps: 2.5 })).toThrow(RangeError);
  });
});
