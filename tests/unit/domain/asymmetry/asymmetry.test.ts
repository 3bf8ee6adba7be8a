import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { asymmetry } from '#src/domain/asymmetry/asymmetry.ts';

const trials = fc.array(fc.double({ min: 0.5, max: 2000, noNaN: true }), { minLength: 1, maxLength: 6 });
const noise = fc.oneof(
  fc.constant('trials' as const),
  fc.record({ cvPct: fc.double({ min: 0.1, max: 20, noNaN: true }) }),
  fc.record({ typicalErrorPct: fc.double({ min: 0.1, max: 20, noNaN: true }) }),
);
const better = fc.constantFrom('higher' as const, 'lower' as const);

describe('asymmetry', () => {
  it('B3: one CV for both legs (propagation, recomputed)', () => {
    const result = asymmetry({ lead: [500, 500, 500], trail: [560, 560, 560], noise: { cvPct: 4 } });
    expect(result.differencePct).toBeCloseTo(-10.714286, 6);
    expect(result.standardErrorPct).toBeCloseTo(2.916059, 6);
    expect(result.interval90Pct![0]).toBeCloseTo(-15.510776, 6);
    expect(result.interval90Pct![1]).toBeCloseTo(-5.917795, 6);
    expect(result).toMatchObject({ beyondNoise: true, weakerSide: 'lead', reason: null });
  });

  it('widens with fewer trials, and with the change between days', () => {
    const half = (lead: number[], trail: number[], by: { cvPct: number } | { typicalErrorPct: number }) => {
      const [low, high] = asymmetry({ lead, trail, noise: by }).interval90Pct!;
      return (high - low) / 2;
    };
    // by hand: 0.9 · 4 · √2 · 1.6448536 = 8.374228, by √3 less for three trials
    expect(half([504], [560], { cvPct: 4 })).toBeCloseTo(8.374228, 5);
    expect(half([504, 504, 504], [560, 560, 560], { cvPct: 4 })).toBeCloseTo(8.374228 / Math.sqrt(3), 5);
    // by hand: 0.9 · √2 · √(4² + 2.5²) · 1.6448536 = 9.875288
    expect(half([504], [560], { typicalErrorPct: Math.hypot(4, 2.5) })).toBeCloseTo(9.875288, 5);
  });

  it('B5: three trials a leg, noise from the trials (recomputed with SciPy)', () => {
    const result = asymmetry({ lead: [14.8, 15.2, 15], trail: [16.3, 16.9, 16.6] });
    expect(result.lead).toMatchObject({ n: 3, mean: 15, best: 15.2 });
    expect(result.lead.cvPct).toBeCloseTo(1.333333, 6);
    expect(result.trail.mean).toBeCloseTo(16.6, 12);
    expect(result.trail.cvPct).toBeCloseTo(1.807229, 6);
    expect(result.largerCvPct).toBeCloseTo(1.807229, 6);
    expect(result.differencePct).toBeCloseTo(-9.638554, 6);
    expect(result.differencePctOfBest).toBeCloseTo(-10.059172, 6);
    expect(result.standardErrorPct).toBeCloseTo(1.1716659332463446, 9);
    // t(.95, 3.679625) · SE = 2.561627
    expect(result.interval90Pct![0]).toBeCloseTo(-9.638554216867478 - 2.5616274626155384, 8);
    expect(result.interval90Pct![1]).toBeCloseTo(-9.638554216867478 + 2.5616274626155384, 8);
    expect(result.beyondNoise).toBe(true);
  });

  it('takes one typical error for each leg where their counts differ', () => {
    // by hand: SE = (500/560) · √(3² + 4²) = 4.464286
    const result = asymmetry({ lead: [500], trail: [560], noise: { typicalErrorPct: { lead: 3, trail: 4 } } });
    expect(result.standardErrorPct).toBeCloseTo(4.464286, 6);
    const even = asymmetry({ lead: [500], trail: [560], noise: { typicalErrorPct: 3 } });
    expect(even.standardErrorPct).toBeCloseTo((500 / 560) * Math.SQRT2 * 3, 12);
  });

  it('turns round where lower is better', () => {
    // by hand: 0.30 s against 0.25 s of contact: the lead leg is slower by a sixth of the larger
    const result = asymmetry({ lead: [0.3, 0.32], trail: [0.25, 0.24], better: 'lower', noise: { cvPct: 3 } });
    expect(result.lead.best).toBe(0.3);
    expect(result.trail.best).toBe(0.24);
    expect(result.differencePct).toBeCloseTo((100 * (0.245 - 0.31)) / 0.31, 9);
    expect(result.differencePctOfBest).toBeCloseTo(-20, 9);
    expect(result.weakerSide).toBe('lead');
    expect(result.indices.symmetryAngle).toBeLessThan(0);
  });

  it('cannot judge by trials with one trial in a leg', () => {
    const result = asymmetry({ lead: [500], trail: [560, 570] });
    expect(result.lead).toEqual({ n: 1, mean: 500, best: 500, sd: null, cvPct: null });
    expect(result).toMatchObject({ standardErrorPct: null, interval90Pct: null, beyondNoise: null, largerCvPct: null });
    expect(result.differencePct).toBeCloseTo(-11.504425, 6);
    expect(result.reason).toContain('fewer than two trials');
  });

  it('cannot judge by trials that are all alike', () => {
    const result = asymmetry({ lead: [15, 15], trail: [14, 14] });
    expect(result).toMatchObject({ interval90Pct: null, beyondNoise: null, weakerSide: 'trail' });
    expect(result.reason).toContain('all alike');
    // one leg alike is no hindrance: by hand df = n − 1 of the other leg
    expect(asymmetry({ lead: [15, 15], trail: [14, 14.2] }).beyondNoise).not.toBeNull();
  });

  it('A18: both legs at 0 give null and a reason', () => {
    const result = asymmetry({ lead: [0, 0], trail: [0], noise: { cvPct: 4 } });
    expect(result).toMatchObject({
      differencePct: null,
      differencePctOfBest: null,
      standardErrorPct: null,
      interval90Pct: null,
      beyondNoise: null,
      weakerSide: null,
    });
    expect(result.reason).toContain('both legs are 0');
  });

  it.each(['trials', { cvPct: 4 }, { typicalErrorPct: 3 }] as const)(
    'A17: one leg at 0 has no relative error: %j',
    (by) => {
      const result = asymmetry({ lead: [0, 0], trail: [5, 6], noise: by });
      expect(result).toMatchObject({ differencePct: -100, interval90Pct: null, beyondNoise: null, weakerSide: 'lead' });
      expect(result.reason).toContain('one leg is 0');
    },
  );

  it('A16: equal legs: 0, nobody weaker, inside the noise', () => {
    const result = asymmetry({ lead: [5], trail: [5], noise: { typicalErrorPct: 3 } });
    expect(result).toMatchObject({ differencePct: 0, weakerSide: null, beyondNoise: false });
  });

  it('mirrors, and its interval holds the estimate', () => {
    fc.assert(
      fc.property(trials, trials, noise, better, (lead, trail, by, way) => {
        const one = asymmetry({ lead, trail, noise: by, better: way });
        const other = asymmetry({ lead: trail, trail: lead, noise: by, better: way });
        expect(one.differencePct! + other.differencePct!).toBeCloseTo(0, 9);
        expect(other.beyondNoise).toBe(one.beyondNoise);
        expect([one.weakerSide, other.weakerSide].filter((side) => side === 'lead')).toHaveLength(
          one.weakerSide ? 1 : 0,
        );
        if (one.interval90Pct === null) {
          expect(one.reason).not.toBeNull();
        } else {
          const [low, high] = one.interval90Pct;
          expect(low).toBeLessThanOrEqual(one.differencePct!);
          expect(high).toBeGreaterThanOrEqual(one.differencePct!);
          expect(one.beyondNoise).toBe(low > 0 || high < 0);
          expect(low + other.interval90Pct![1]).toBeCloseTo(0, 8);
        }
        if (one.weakerSide !== null) expect(one.differencePct! < 0).toBe(one.weakerSide === 'lead');
      }),
    );
  });

  it('keeps every percentage with another unit or another order of the trials', () => {
    fc.assert(
      fc.property(trials, trials, noise, fc.double({ min: 0.01, max: 100, noNaN: true }), (lead, trail, by, unit) => {
        const one = asymmetry({ lead, trail, noise: by });
        const scaled = asymmetry({ lead: lead.map((v) => v * unit), trail: trail.map((v) => v * unit), noise: by });
        const turned = asymmetry({ lead: lead.toReversed(), trail: trail.toReversed(), noise: by });
        for (const twin of [scaled, turned]) {
          expect(twin.differencePct! - one.differencePct!).toBeCloseTo(0, 8);
          if (one.standardErrorPct !== null) expect(twin.standardErrorPct! - one.standardErrorPct).toBeCloseTo(0, 8);
        }
      }),
    );
  });

  it('gives null, never NaN or Infinity', () => {
    const anything = fc.array(fc.constantFrom(0, 1, 1.5, 1e-9, 1e9), { minLength: 1, maxLength: 4 });
    fc.assert(
      fc.property(anything, anything, noise, better, (lead, trail, by, way) => {
        const text = JSON.stringify(asymmetry({ lead, trail, noise: by, better: way }), (_, value: unknown) =>
          typeof value === 'number' && !Number.isFinite(value) ? 'not finite' : value,
        );
        expect(text).not.toContain('not finite');
      }),
    );
  });

  it('refuses empty legs, negative and infinite values', () => {
    expect(() => asymmetry({ lead: [], trail: [1] })).toThrow(RangeError);
    expect(() => asymmetry({ lead: [1], trail: [-1] })).toThrow('requires values ≥ 0, got -1');
    expect(() => asymmetry({ lead: [1], trail: [NaN] })).toThrow(RangeError);
    expect(() => asymmetry({ lead: [1], trail: [1], noise: { cvPct: -1 } })).toThrow(RangeError);
    expect(() => asymmetry({ lead: [1], trail: [1], noise: { typicalErrorPct: { lead: 1, trail: NaN } } })).toThrow(
      RangeError,
    );
  });
});
