import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { pushCurve } from '#src/domain/push/pushCurve.ts';
import { expectRelative } from '#tests/unit/domain/expectRelative.ts';
import { seededNormal } from '#tests/unit/domain/seededNormal.ts';

/** Check C8 as a plate would record it: a quiet second at 490.5 N, then 490.5 + 1009.5(1 − e^−10t). */
function madePush({
  sampleRate = 1000,
  quietS = 1,
  pushS = 3,
  noiseSdN = 0,
  seed = 1,
  extra = (timeS: number) => 0 * timeS,
} = {}) {
  const normal = seededNormal(seed);
  const force = Array.from({ length: Math.round((quietS + pushS) * sampleRate) }, (_, i) => {
    const timeS = Math.max(0, Math.round((i / sampleRate - quietS) * 1e9) / 1e9);
    return 490.5 + 1009.5 * (1 - Math.exp(-10 * timeS)) + noiseSdN * normal() + extra(i / sampleRate);
  });
  return { sampleRate, force };
}

describe('pushCurve', () => {
  it('C8: forces, rates and impulse from onset (closed form)', () => {
    const result = pushCurve(madePush());
    expect(result.quality).toEqual({ ok: true, problems: [] });
    expect(result.reason).toBeNull();
    expect(result.onsetIndex).toBe(1000);
    expectRelative(result.preload, 490.5, 1e-12);
    expectRelative(result.forceAt['100'], 1128.625704);
    expectRelative(result.forceAt['200'], 1363.379032);
    // by hand: 490.5 + 1009.5(1 − e^−0.5), e^−1.5, e^−2.5
    expectRelative(result.forceAt['50'], 490.5 + 1009.5 * (1 - Math.exp(-0.5)));
    expectRelative(result.forceAt['150'], 490.5 + 1009.5 * (1 - Math.exp(-1.5)));
    expectRelative(result.forceAt['250'], 490.5 + 1009.5 * (1 - Math.exp(-2.5)));
    expectRelative(result.rfd['0-100'], 6381.257);
    expectRelative(result.rfd['0-200'], 4364.395);
    expectRelative(result.rfd['0-150'], (1009.5 * (1 - Math.exp(-1.5))) / 0.15);
    expectRelative(result.impulse['0-200'], 114.612097, 1e-5); // trapezoid
    expectRelative(result.peakForce, 1500, 1e-6);
    expectRelative(result.netPeakForce, 1009.5, 1e-6);
    expect(result).toMatchObject({ perKg: null, timesBodyWeight: null });
  });

  it('C9: 1500 N at 50 kg (closed form)', () => {
    const force = [
      ...Array.from({ length: 1000 }, () => 490.5),
      ...Array.from({ length: 2000 }, (_, i) => Math.min(1500, 490.5 + 5 * i)),
    ];
    const result = pushCurve({ sampleRate: 1000, force, bodyWeight: 490.5 });
    expectRelative(result.perKg, 30, 1e-9);
    expect(result.timesBodyWeight).toBeCloseTo(3.058104, 6);
    expectRelative(result.netPeakForce! / 50, 20.19, 1e-9);
    expect(result.peakForce! / 50 ** 0.67).toBeCloseTo(109.089099, 6);
  });

  it.each([200, 240, 480, 1000, 1200, 2000])('reads the made push at %i Hz', (sampleRate) => {
    const result = pushCurve(madePush({ sampleRate, quietS: 1.25 }));
    expect(result.quality.ok).toBe(true);
    expect(result.quality.problems).toHaveLength(sampleRate < 500 ? 1 : 0);
    expectRelative(result.peakForce, 1500, 1e-6);
    expectRelative(result.forceAt['100'], 1128.625704, 1e-3);
    expectRelative(result.impulse['0-200'], 114.612097, 1e-3);
    expect(result.reason).toBeNull();
  });

  it('gives the peak but no rate below 200 Hz', () => {
    const result = pushCurve(madePush({ sampleRate: 100 }));
    expect(result.quality.ok).toBe(false);
    expectRelative(result.peakForce, 1500, 1e-6);
    expect(Object.values(result.forceAt)).toEqual([null, null, null, null, null]);
    expect(Object.values(result.rfd)).toEqual([null, null, null]);
    expect(result.reason).toContain('too low');
  });

  it.each([1, 2, 3, 4, 5])('reads the made push through noise, seed %i', (seed) => {
    const result = pushCurve(madePush({ noiseSdN: 3, seed, quietS: 1.5 }));
    expect(result.quality).toEqual({ ok: true, problems: [] });
    expectRelative(result.peakForce, 1500, 0.01);
    expect(Math.abs(result.onsetIndex! - 1500)).toBeLessThan(5);
    expectRelative(result.rfd['0-200'], 4364.395, 0.02);
  });

  it.each([
    ['a file under a second', madePush().force.slice(0, 999), 'no quiet second: the file has only 1.00 s'],
    ['an unsteady preload', madePush({ noiseSdN: 15 }).force, 'no quiet second: the preload varies'],
    ['a drifting plate', madePush({ extra: (t) => 25 * t }).force, 'the preload moves by'],
    ['a plate below 0', madePush({ extra: () => -520 }).force, 'the zero of the plate has moved'],
    ['no push', Array.from({ length: 3000 }, () => 490.5), 'no push'],
    ['a nudge', Array.from({ length: 3000 }, (_, i) => (i > 1500 && i < 1600 ? 520 : 490.5)), 'no push'],
  ])('refuses %s', (_, force, problem) => {
    const result = pushCurve({ sampleRate: 1000, force, bodyWeight: 490.5 });
    expect(result.quality.ok).toBe(false);
    expect(result.reason).toContain(problem);
    expect(result).toMatchObject({
      peakForce: null,
      netPeakForce: null,
      onsetIndex: null,
      perKg: null,
      timesBodyWeight: null,
    });
    expect(
      [...Object.values(result.forceAt), ...Object.values(result.rfd), result.impulse['0-200']].every(
        (v) => v === null,
      ),
    ).toBe(true);
  });

  it.each([
    [
      'a push inside the preload second',
      madePush({ quietS: 0.99 }).force,
      'begins inside the preload second|the preload',
    ],
    [
      'a dip into the push',
      madePush({ quietS: 2, extra: (t) => (t > 1.7 && t < 1.9 ? -60 : 0) }).force,
      'a dip below the preload',
    ],
    ['a false start', madePush({ quietS: 2, extra: (t) => (t > 1.3 && t < 1.5 ? 200 : 0) }).force, 'a false start'],
  ])('gives no early force after %s', (_, force, problem) => {
    const result = pushCurve({ sampleRate: 1000, force });
    expect(result.quality.ok).toBe(false);
    expect(result.reason).toMatch(new RegExp(problem));
    expect(result).toMatchObject({ onsetIndex: null, impulse: { '0-200': null } });
  });

  it('gives early force but no peak where the file ends on the rise', () => {
    const result = pushCurve({ ...madePush(), force: madePush().force.slice(0, 1120), bodyWeight: 490.5 });
    expect(result.quality.ok).toBe(false);
    expectRelative(result.forceAt['100'], 1128.625704);
    expect(result).toMatchObject({
      peakForce: null,
      perKg: null,
      forceAt: { '150': null },
      impulse: { '0-200': null },
    });
    expect(result.reason).toContain('the force still rises');
    expect(result.quality.problems.join()).toContain('later windows are missing');
  });

  it.each([1500, 2500])('refuses a sample lost or false at %i', (at) => {
    for (const value of [0, 6000]) {
      const { force } = madePush();
      force.fill(value, at, at + 3);
      const result = pushCurve({ sampleRate: 1000, force });
      expect(result.reason).toContain('leaps');
      expect(result.peakForce).toBeNull();
    }
  });

  it('scales with force and with nothing else', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.5, max: 3, noNaN: true }), fc.integer({ min: 0, max: 10 }), (factor, tenths) => {
        const made = madePush({ quietS: 1 + tenths / 10 });
        const one = pushCurve({ ...made, bodyWeight: 490.5 });
        const scaled = pushCurve({
          ...made,
          force: made.force.map((value) => factor * value),
          bodyWeight: factor * 490.5,
        });
        expectRelative(scaled.peakForce, factor * one.peakForce!, 1e-9);
        expectRelative(scaled.rfd['0-100'], factor * one.rfd['0-100']!, 1e-9);
        expectRelative(scaled.timesBodyWeight, one.timesBodyWeight!, 1e-9);
        expect(scaled.onsetIndex).toBe(1000 + 100 * tenths);
      }),
      { numRuns: 20 },
    );
  });

  it('takes a million samples', () => {
    const { sampleRate, force } = madePush({ pushS: 999 });
    expectRelative(pushCurve({ sampleRate, force }).forceAt['100'], 1128.625704);
  });

  it('refuses empty curves and what is not finite', () => {
    expect(() => pushCurve({ sampleRate: 1000, force: [] })).toThrow(RangeError);
    expect(() => pushCurve({ sampleRate: -1, force: [1] })).toThrow(RangeError);
    expect(() => pushCurve({ sampleRate: 1000, force: [1], bodyWeight: 0 })).toThrow(RangeError);
    expect(() => pushCurve({ sampleRate: 1000, force: [Infinity] })).toThrow(RangeError);
  });
});
