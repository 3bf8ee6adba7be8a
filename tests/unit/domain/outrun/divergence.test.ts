import { describe, expect, it } from 'vitest';
import { divergence, reduceByDemand } from '#src/domain/outrun/divergence.ts';
import { divergenceRaw } from '#src/domain/outrun/divergenceRaw.ts';
import type { CarryPair, Day } from '#src/domain/outrun/outrunInput.ts';
import { DEFAULT_POLICY as policy } from '#src/domain/outrun/policy.ts';
import { criterionOf, W3, W3_OTHERS, W4 } from '#tests/unit/domain/outrun/workedExamples.ts';

describe('worked examples', () => {
  it('W3: 11.848648, SE 3.651484, 5.842492…17.854804, strong (SCIENCE §9)', () => {
    const result = divergence(W3.divergence, policy);
    expect(result.value).toBeCloseTo(11.848648, 6);
    expect(result.standardError).toBeCloseTo(3.651484, 6);
    expect(result.interval90![0]).toBeCloseTo(5.842492, 6);
    expect(result.interval90![1]).toBeCloseTo(17.854804, 6);
    expect(result).toMatchObject({ kind: 'comparing', verdict: 'strong', points: 2, threshold: 3.5 });
  });

  it('W3 with nine others: 11.548648 (SCIENCE §9)', () => {
    expect(divergence({ ...W3.divergence, othersRaw: W3_OTHERS }, policy).value).toBeCloseTo(11.548648, 6);
  });

  it('fewer than eight others make no median; eight do, by hand: median of −4.1 … 2.6 is −0.15', () => {
    const seven = divergence({ ...W3.divergence, othersRaw: W3_OTHERS.slice(0, 7) }, policy);
    expect(seven.value).toBeCloseTo(11.848648, 6);
    const eight = divergence({ ...W3.divergence, othersRaw: W3_OTHERS.slice(0, 8) }, policy);
    expect(eight.value).toBeCloseTo(11.848648 + 0.15, 6);
    const asFew = divergence({ ...W3.divergence, othersRaw: [1] }, { ...policy, minOthersGain: 1 });
    expect(asFew.value).toBeCloseTo(10.848648, 6);
    expect(divergence(W3.divergence, { ...policy, minOthersGain: 0 }).value).toBeCloseTo(11.848648, 6);
  });

  it('W4, ordinary growth: −1.856900, SE 3.464102, not met (SCIENCE §9)', () => {
    const result = divergence(W4.divergence, policy);
    expect(result.value).toBeCloseTo(-1.8569, 6);
    expect(result.standardError).toBeCloseTo(3.464102, 6);
    expect(result).toMatchObject({ verdict: 'not met', points: 0 });
  });
});

/** One flat pair, then two whose carry is `gain` % further (log scale), so that G is the gain by hand. */
function flat(gain: number, days: readonly Day[] = [0, 200, 400]): CarryPair[] {
  return days.map((day, i) => {
    const carry = i < days.length - 2 ? 150 : 150 * Math.exp(gain / 100);
    return { day, carry, strength: 600, stature: 150, age: 13 };
  });
}

describe('edges (SCIENCE §9)', () => {
  it.each([
    { gain: 3.5 + 1e-9, verdict: 'met', points: 1 },
    { gain: 3.5 - 1e-6, verdict: 'not met', points: 0 },
    { gain: 8 + 1e-9, verdict: 'strong', points: 2 },
    { gain: 8 - 1e-6, verdict: 'met', points: 1 },
  ])('G $gain: $verdict', ({ gain, verdict, points }) => {
    expect(divergence({ pairs: flat(gain) }, policy)).toMatchObject({ verdict, points });
  });

  it('needs three pairs', () => {
    expect(divergence({ pairs: flat(9).slice(1) }, policy).reason).toContain('two');
    expect(divergence({ pairs: [] }, policy).reason).toContain('none');
    expect(divergence({ pairs: flat(9) }, policy).verdict).toBe('strong');
  });

  it('needs 180 days from the first pair to the last: 179 cannot say, 180 can', () => {
    expect(divergence({ pairs: flat(9, [0, 90, 179]) }, policy).verdict).toBe('cannot say');
    expect(divergence({ pairs: flat(9, [0, 90, 180]) }, policy).verdict).toBe('strong');
  });

  it('needs the newest two within 400 days before the judgement: 400 can, 401 cannot say', () => {
    const pairs = flat(9, ['2024-01-01', '2024-10-01', '2025-01-01']);
    // 2024-10-01 + 400 days = 2025-11-05, by hand: 92 days to the new year, 308 to 5 November
    expect(divergence({ pairs }, policy, '2025-11-05').verdict).toBe('strong');
    expect(divergence({ pairs }, policy, '2025-11-06').verdict).toBe('cannot say');
    expect(divergence({ pairs, asOf: '2025-11-06' }, policy).verdict).toBe('cannot say');
  });

  it('leaves out pairs after the judgement', () => {
    const pairs = flat(9, ['2024-01-01', '2024-10-01', '2025-01-01']);
    expect(divergence({ pairs }, policy, '2024-12-31').reason).toContain('two');
  });

  it('cannot compare a carry, a push or a height of 0, and refuses negative figures and broken days', () => {
    const zero = flat(9).map((pair) => ({ ...pair, strength: 0 }));
    expect(divergence({ pairs: zero }, policy).verdict).toBe('cannot say');
    expect(() => divergence({ pairs: flat(9).map((pair) => ({ ...pair, carry: -1 })) }, policy)).toThrow(RangeError);
    expect(() => divergence({ pairs: flat(9, [0.5, 200, 400]) }, policy)).toThrow(RangeError);
    expect(() => divergence({ pairs: flat(9, ['2025-02-30', 200, 400]) }, policy)).toThrow(RangeError);
    expect(divergence(undefined, policy).verdict).toBe('cannot say');
  });
});

it('frees the carry from strength, stature and age as the policy says, by hand: +10 % force alone → −50·ln 1.1', () => {
  const pairs = flat(0).map((pair, i) => (i === 0 ? pair : { ...pair, strength: 660 }));
  expect(divergenceRaw(pairs, policy).raw).toBeCloseTo(-50 * Math.log(1.1), 9);
  const older = flat(0).map((pair, i) => ({ ...pair, age: i === 0 ? 13 : 14, stature: i === 0 ? 150 : 153 }));
  expect(divergenceRaw(older, policy).raw).toBeCloseTo(-100 * Math.log(1.02) - 2, 9);
});

describe('reduceByDemand: one point less where the demand was measured and not met (SCIENCE §9)', () => {
  const demandOf = (verdict: 'not met' | 'met' | 'cannot say') => criterionOf('demand', 0, verdict);
  it('strong 2 → 1, met 1 → 0, none below 0; the word stays and the reason says so', () => {
    const strong = reduceByDemand(criterionOf('divergence', 2), demandOf('not met'));
    expect(strong).toMatchObject({ verdict: 'strong', points: 1 });
    expect(strong.reason).toContain('One point less');
    expect(reduceByDemand(criterionOf('divergence', 1), demandOf('not met'))).toMatchObject({
      verdict: 'met',
      points: 0,
    });
    const none = criterionOf('divergence', 0);
    expect(reduceByDemand(none, demandOf('not met'))).toBe(none);
  });
  it('nothing where the demand is met or was not measured', () => {
    expect(reduceByDemand(criterionOf('divergence', 2), demandOf('met')).points).toBe(2);
    expect(reduceByDemand(criterionOf('divergence', 2), demandOf('cannot say')).points).toBe(2);
  });
});
