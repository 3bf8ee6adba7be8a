import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { GroundEventTimes } from '#src/domain/ground/groundEvents.ts';
import { groundTrace } from '#src/domain/ground/groundTrace.ts';
import { sampleAt } from '#src/domain/ground/sampleAt.ts';

const RATE = 500;
const EVENTS = {
  takeaway: 0.2,
  lateBackswing: 0.72,
  top: 0.98,
  earlyDownswing: 1.06,
  leadArmParallel: 1.13,
  midDownswing: 1.18,
  impact: 1.24,
  finish: 1.5,
};

/** A trace of 500 N whose lead share is the given one at each moment, linear between them, even before the first. */
function traceOf(shares: Record<keyof typeof EVENTS, number>, total: (time: number) => number = () => 500) {
  const knots = Object.entries(EVENTS).map(([name, time]): [number, number] => [
    time,
    shares[name as keyof typeof EVENTS],
  ]);
  const shareAt = (time: number) => {
    const after = knots.findIndex(([knot]) => knot >= time);
    if (after <= 0) return knots[after === 0 ? 0 : knots.length - 1]![1];
    const [[t0, s0], [t1, s1]] = [knots[after - 1]!, knots[after]!];
    return s0 + ((time - t0) / (t1 - t0)) * (s1 - s0);
  };
  const times = Array.from({ length: 851 }, (_, i) => i / RATE);
  return {
    sampleRate: RATE,
    lead: times.map((time) => (total(time) * shareAt(time)) / 100),
    trail: times.map((time) => (total(time) * (100 - shareAt(time))) / 100),
    events: EVENTS as GroundEventTimes,
  };
}

const G1 = {
  takeaway: 54,
  lateBackswing: 25,
  top: 28,
  earlyDownswing: 62,
  leadArmParallel: 67,
  midDownswing: 71,
  impact: 79,
  finish: 85,
};
const G2 = { ...G1, earlyDownswing: 63, leadArmParallel: 62, midDownswing: 60, impact: 51, finish: 50 };

describe('groundTrace', () => {
  it('G1: shares 54 25 28 62 71 79 are front-foot, +17 (SCIENCE §7, after Ball & Best 2007)', () => {
    const result = groundTrace(traceOf(G1));
    for (const name of Object.keys(G1) as (keyof typeof G1)[]) {
      expect(result.leadSharePctAt[name]).toBeCloseTo(G1[name], 9);
    }
    expect(result.style).toBe('front-foot');
    expect(result.styleChangePct).toBeCloseTo(17, 9);
    expect(result.quality).toEqual({ ok: true, problems: [] });
    expect(result.reason).toBeNull();
  });

  it('G2: early downswing 63, impact 51 is reverse, −12 (SCIENCE §7, after Ball & Best 2007)', () => {
    const { style, styleChangePct } = groundTrace(traceOf(G2));
    expect(style).toBe('reverse');
    expect(styleChangePct).toBeCloseTo(-12, 9);
  });

  it.each([
    [55, 60, 'undetermined'],
    [60, 55, 'undetermined'],
    [55, 60.1, 'front-foot'],
    [60.1, 55, 'reverse'],
  ] as const)(
    'names no style within ±5 points, the limits included: %s to %s is %s (our own limit)',
    (early, impact, style) => {
      expect(groundTrace(traceOf({ ...G1, earlyDownswing: early, impact })).style).toBe(style);
    },
  );

  it('interpolates between samples (by hand: halfway between 100 of 200 and 150 of 200 is 62.5 %)', () => {
    const { leadSharePctAt } = groundTrace({
      sampleRate: 1,
      lead: [100, 100, 150, 150, 150],
      trail: [100, 100, 50, 50, 50],
      events: { takeaway: 0.5, top: 1.5, leadArmParallel: 2.5, impact: 3.5 },
    });
    expect(leadSharePctAt).toEqual({ takeaway: 50, top: 62.5, leadArmParallel: 75, impact: 75 });
    expect(sampleAt([0, 10, 20], 10, 0.15)).toBeCloseTo(15, 12);
    expect(sampleAt([0, 10, 20], 10, 0.2000000001)).toBe(20);
    expect(sampleAt([0, 10, 20], 10, 0.21)).toBeNull();
  });

  describe('the lead peak', () => {
    /** 50 kg: .6 BW until 1.03 s, a ramp to 1.5 BW at 1.13 s, and a larger spike outside top to finish. */
    const bw = 50 * 9.81;
    const lead = Array.from({ length: 851 }, (_, i) => {
      const time = i / RATE;
      if (i === 300 || i === 800) return 3 * bw;
      return bw * (time <= 1.03 ? 0.6 : Math.min(1.5, 0.6 + (time - 1.03) * 9, 1.5 - (time - 1.13) * 2));
    });
    const trail = lead.map((force, i) => Math.max(20, (i < 100 ? bw : 1.2 * bw) - force));
    const trace = { sampleRate: RATE, lead, trail, mass: 50, events: EVENTS as GroundEventTimes };

    it('lies between top and finish; 1.5 × body weight of 50 kg is 735.75 N (I5, common practice, no source)', () => {
      const { peakLead } = groundTrace(trace);
      expect(peakLead.force).toBeCloseTo(735.75, 9);
      expect(peakLead.timesBodyWeight).toBeCloseTo(1.5, 9);
      expect(peakLead.time).toBeCloseTo(1.13, 9);
      expect(peakLead.beforeImpact).toBeCloseTo(0.11, 9);
      expect(peakLead.afterLeadArmParallel).toBeCloseTo(0, 9);
    });

    it('is reached at 9 × body weight a second, 4414.5 N/s (I5: from .6 BW in .1 s, common practice, no source)', () => {
      const { rampRate } = groundTrace(trace);
      expect(rampRate).toBeCloseTo(9, 9);
      expect(rampRate! * bw).toBeCloseTo(4414.5, 6);
    });

    it('runs to the end of the trace without a finish', () => {
      const { finish: _finish, ...events } = EVENTS;
      expect(groundTrace({ ...trace, events }).peakLead.force).toBeCloseTo(3 * bw, 9);
    });

    it('gives forces but no × body weight and no ramp without the mass', () => {
      const { mass: _mass, ...massless } = trace;
      const result = groundTrace(massless);
      expect(result.peakLead.force).toBeCloseTo(735.75, 9);
      expect(result.peakLead.timesBodyWeight).toBeNull();
      expect(result.rampRate).toBeNull();
    });

    it('has no ramp where the peak comes before it starts, and no peak where top lies outside', () => {
      const late = groundTrace({ ...trace, events: { ...trace.events, leadArmParallel: 1.235, finish: 1.132 } });
      expect(late.rampRate).toBeNull();
      const outside = groundTrace({ ...trace, events: { ...trace.events, top: 2 } });
      expect(Object.values(outside.peakLead)).toEqual([null, null, null, null, null]);
      expect(outside.reason).toMatch(/no sample between top and finish/);
      expect(outside.leadSharePctAt.top).toBeNull();
    });

    it('agrees with a search through every sample (brute-force twin)', () => {
      fc.assert(
        fc.property(fc.array(fc.integer({ min: 1, max: 50 }), { minLength: 20, maxLength: 60 }), (samples) => {
          const events = { takeaway: 0.1, top: 0.55, leadArmParallel: 0.8, impact: 1, finish: 1.55 };
          const { peakLead } = groundTrace({ sampleRate: 10, lead: samples, trail: samples, events });
          const within = samples.slice(6, 16);
          expect(peakLead.force).toBe(Math.max(...within));
          expect(peakLead.time).toBeCloseTo((6 + within.indexOf(Math.max(...within))) / 10, 12);
        }),
      );
    });
  });

  it('has no style without an early downswing, and says so', () => {
    const { earlyDownswing: _early, ...events } = EVENTS;
    const result = groundTrace({ ...traceOf(G1), events });
    expect(result).toMatchObject({ style: null, styleChangePct: null, reason: 'no early downswing given: no style' });
    expect(result.leadSharePctAt).not.toHaveProperty('earlyDownswing');
  });

  it('has no share where both plates read zero', () => {
    const trace = traceOf(G1, (time) => (Math.abs(time - 1.24) < 0.01 ? 0 : 500));
    const result = groundTrace(trace);
    expect(result.leadSharePctAt.impact).toBeNull();
    expect(result).toMatchObject({ style: null, styleChangePct: null });
    expect(result.reason).toMatch(/no share at early downswing or impact/);
  });

  describe('quality (our own limits)', () => {
    const problems = (change: object) => groundTrace({ ...traceOf(G1), ...change }).quality;

    it('says when both plates at rest are more than 10 % from body weight, and not within it', () => {
      expect(problems({ mass: 500 / 9.81 }).ok).toBe(true);
      expect(problems({ mass: 500 / 9.81 / 1.09 }).problems).toEqual([]);
      const heavy = problems({ mass: 500 / 9.81 / 0.89 });
      expect(heavy.ok).toBe(false);
      expect(heavy.problems).toEqual([expect.stringMatching(/at rest read 500, the body weight is 562 N/)]);
    });

    it('cannot check the mass without a sample before the takeaway', () => {
      const quality = problems({ mass: 51, events: { ...EVENTS, takeaway: 0 } });
      expect(quality.ok).toBe(true);
      expect(quality.problems).toEqual([expect.stringMatching(/no sample before the takeaway/)]);
    });

    it('says when moments are out of order or outside the trace', () => {
      expect(problems({ events: { ...EVENTS, impact: 0.9 } }).problems.join('; ')).toMatch(/impact is not after top/);
      expect(problems({ events: { ...EVENTS, finish: 1.71 } }).problems).toEqual([
        'finish at 1.71 s lies outside the trace',
      ]);
      expect(problems({ events: { ...EVENTS, takeaway: -0.1 } }).problems).toEqual([
        'takeaway at -0.1 s lies outside the trace',
      ]);
      expect(problems({ events: { ...EVENTS, finish: 1.7 } }).ok).toBe(true);
    });

    it('lets early downswing and lead arm parallel trade places', () => {
      expect(problems({ events: { ...EVENTS, earlyDownswing: 1.14 } })).toEqual({ ok: true, problems: [] });
    });

    it('says when a plate reads zero within the swing, or throughout', () => {
      const { lead, trail } = traceOf(G1);
      const dropped = trail.map((force, i) => (i >= 300 && i < 310 ? 0 : force));
      expect(problems({ trail: dropped }).problems).toEqual([
        'the trail plate reads zero in 10 samples between takeaway and impact',
      ]);
      expect(problems({ trail: trail.map((force, i) => (i > 800 ? 0 : force)) }).ok).toBe(true);
      expect(problems({ lead: lead.map(() => 0) })).toEqual({
        ok: false,
        problems: ['the lead plate reads zero throughout'],
      });
    });

    it('remarks on a rate under 200 Hz, which leaves the shares good', () => {
      const { lead, trail } = traceOf(G1);
      const every = (list: number[]) => list.filter((_, i) => i % 5 === 0);
      const slow = groundTrace({ sampleRate: 100, lead: every(lead), trail: every(trail), events: EVENTS });
      expect(slow.quality).toEqual({ ok: true, problems: ['sampled at 100 Hz, below 200: times are uncertain'] });
      expect(slow.styleChangePct).toBeCloseTo(17, 9);
    });
  });

  it('changes no share, style or time when all forces are scaled, nor × body weight with the mass', () => {
    const trace = { ...traceOf(G2), mass: 51 };
    const plain = groundTrace(trace);
    fc.assert(
      fc.property(fc.double({ min: 0.05, max: 20, noNaN: true }), (scale) => {
        const scaled = groundTrace({
          ...trace,
          lead: trace.lead.map((force) => force * scale),
          trail: trace.trail.map((force) => force * scale),
          mass: trace.mass * scale,
        });
        expect(scaled.style).toBe(plain.style);
        expect(scaled.styleChangePct).toBeCloseTo(plain.styleChangePct!, 9);
        expect(scaled.peakLead.time).toBe(plain.peakLead.time);
        expect(scaled.peakLead.timesBodyWeight).toBeCloseTo(plain.peakLead.timesBodyWeight!, 9);
        expect(scaled.rampRate).toBeCloseTo(plain.rampRate!, 9);
      }),
      { numRuns: 20 },
    );
  });

  it('mirrors: with the plates changed over, shares are what is left to 100 and the style turns', () => {
    fc.assert(
      fc.property(fc.integer({ min: 5, max: 95 }), fc.integer({ min: 5, max: 95 }), (early, impact) => {
        const trace = traceOf({ ...G1, earlyDownswing: early, impact });
        const [plain, mirrored] = [groundTrace(trace), groundTrace({ ...trace, lead: trace.trail, trail: trace.lead })];
        for (const name of Object.keys(EVENTS) as (keyof typeof EVENTS)[]) {
          expect(plain.leadSharePctAt[name]! + mirrored.leadSharePctAt[name]!).toBeCloseTo(100, 9);
        }
        const turned = { 'front-foot': 'reverse', reverse: 'front-foot', undetermined: 'undetermined' } as const;
        expect(mirrored.style).toBe(turned[plain.style!]);
      }),
      { numRuns: 30 },
    );
  });

  it('takes a million samples', () => {
    const samples = new Float64Array(1_000_000).fill(250);
    samples[999_000] = 400;
    const events = { takeaway: 100, top: 900, leadArmParallel: 950, impact: 998, finish: 999.9 };
    const { peakLead } = groundTrace({ sampleRate: 1000, lead: samples, trail: samples, events });
    expect(peakLead).toMatchObject({ force: 400, time: 999 });
  });

  it('refuses unequal lengths, an empty list, a negative or missing number', () => {
    const trace = traceOf(G1);
    expect(() => groundTrace({ ...trace, trail: trace.trail.slice(1) })).toThrow(RangeError);
    expect(() => groundTrace({ ...trace, lead: [], trail: [] })).toThrow(RangeError);
    expect(() => groundTrace({ ...trace, lead: trace.lead.map((f, i) => (i === 5 ? -1 : f)) })).toThrow(RangeError);
    expect(() => groundTrace({ ...trace, lead: trace.lead.map((f, i) => (i === 5 ? NaN : f)) })).toThrow(RangeError);
    expect(() => groundTrace({ ...trace, sampleRate: 0 })).toThrow(RangeError);
    expect(() => groundTrace({ ...trace, mass: 0 })).toThrow(RangeError);
    expect(() => groundTrace({ ...trace, events: { ...EVENTS, top: NaN } })).toThrow(RangeError);
  });
});
