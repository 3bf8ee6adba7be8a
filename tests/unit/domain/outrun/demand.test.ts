import { describe, expect, it } from 'vitest';
import { demand } from '#src/domain/outrun/demand.ts';
import { DEFAULT_POLICY as policy } from '#src/domain/outrun/policy.ts';
import { W6, W7, W8 } from '#tests/unit/domain/outrun/workedExamples.ts';

describe('worked examples (SCIENCE §9)', () => {
  it('W6: .852941, SE .045601, .777934….927948, not met', () => {
    const result = demand(W6.demand, policy);
    expect(result.value).toBeCloseTo(0.852941, 6);
    expect(result.standardError).toBeCloseTo(0.045601, 6);
    expect(result.interval90![0]).toBeCloseTo(0.777934, 6);
    expect(result.interval90![1]).toBeCloseTo(0.927948, 6);
    expect(result).toMatchObject({ kind: 'comparing', verdict: 'not met', points: 0, threshold: 0.85 });
  });

  it('W7: 1.111111, SE .055147, 1.020403…1.201819, strong', () => {
    const result = demand(W7.demand, policy);
    expect(result.value).toBeCloseTo(1.111111, 6);
    expect(result.standardError).toBeCloseTo(0.055147, 6);
    expect(result.interval90![0]).toBeCloseTo(1.020403, 6);
    expect(result.interval90![1]).toBeCloseTo(1.201819, 6);
    expect(result).toMatchObject({ verdict: 'strong', points: 2 });
  });

  it('W8: .962963, SE .051483, met; with M .82 not met', () => {
    const result = demand(W8.demand, policy);
    expect(result.value).toBeCloseTo(0.962963, 6);
    expect(result.standardError).toBeCloseTo(0.051483, 6);
    expect(result).toMatchObject({ verdict: 'met', points: 1 });
    const higher = demand({ ...W8.demand, programmeMedian: 0.82 }, policy);
    expect(higher).toMatchObject({ verdict: 'not met', points: 0 });
    expect(higher.threshold).toBeCloseTo(0.902, 12);
  });
});

describe('edges (SCIENCE §9): the lower limit must be over the line', () => {
  const exact = { ...policy, daySwingPct: 0, dayForcePct: 0 };
  const of = (ratio: number, programmeMedian?: number) =>
    demand(
      { peakLead: { mean: ratio, cvPct: 0, n: 5 }, capacity: { mean: 1, cvPct: 0, n: 2 }, programmeMedian },
      exact,
    );

  it.each([
    { ratio: 0.85, verdict: 'not met' },
    { ratio: 0.8500001, verdict: 'met' },
    { ratio: 0.95, verdict: 'met' },
    { ratio: 0.9500001, verdict: 'strong' },
  ])('$ratio without error: $verdict', ({ ratio, verdict }) => expect(of(ratio).verdict).toBe(verdict));

  it('takes 1.10 and 1.25 times the programme’s median where that is higher: M 1 → 1.10 and 1.25', () => {
    expect(of(1.1, 1).verdict).toBe('not met');
    expect(of(1.11, 1).verdict).toBe('met');
    expect(of(1.25, 1).verdict).toBe('met');
    expect(of(1.26, 1).verdict).toBe('strong');
  });

  it('needs five swings and two push trials', () => {
    const swings = (n: number) => demand({ ...W7.demand, peakLead: { ...W7.demand.peakLead, n } }, policy).verdict;
    const trials = (n: number) => demand({ ...W7.demand, capacity: { ...W7.demand.capacity, n } }, policy).verdict;
    expect([swings(4), swings(5)]).toEqual(['cannot say', 'strong']);
    expect([trials(1), trials(2)]).toEqual(['cannot say', 'strong']);
  });

  it('cannot say without data or with a push of 0; refuses negative figures and broken counts', () => {
    expect(demand(undefined, policy)).toMatchObject({ verdict: 'cannot say', threshold: 0.85, value: null });
    const zero = { ...W7.demand, capacity: { ...W7.demand.capacity, mean: 0 } };
    expect(demand(zero, policy).verdict).toBe('cannot say');
    const tiny = { ...W7.demand, capacity: { ...W7.demand.capacity, mean: 1e-320 } };
    expect(demand(tiny, policy)).toMatchObject({ verdict: 'cannot say', value: null });
    expect(() => demand({ ...W7.demand, programmeMedian: -1 }, policy)).toThrow(RangeError);
    expect(() => demand({ ...W7.demand, peakLead: { mean: 1, cvPct: 4, n: 5.5 } }, policy)).toThrow(RangeError);
  });
});
