import { describe, expect, it } from 'vitest';
import { leadDeficit } from '#src/domain/outrun/leadDeficit.ts';
import { DEFAULT_POLICY as policy } from '#src/domain/outrun/policy.ts';
import { W1, W2 } from '#tests/unit/domain/outrun/workedExamples.ts';

const oneEach = (lead: number, te = 1) => ({ lead, trail: 100, teLeadPct: te, teTrailPct: te });
const two = (lead: number, te = 1) => ({ values: [oneEach(lead, te), oneEach(lead, te)] });

describe('worked examples', () => {
  it('W1: −8.022082, SE 2.076918, −11.438309…−4.605855, strong (SCIENCE §9)', () => {
    const result = leadDeficit(W1.leadDeficit, policy);
    expect(result.value).toBeCloseTo(-8.022082, 6);
    expect(result.standardError).toBeCloseTo(2.076918, 6);
    expect(result.interval90![0]).toBeCloseTo(-11.438309, 6);
    expect(result.interval90![1]).toBeCloseTo(-4.605855, 6);
    expect(result).toMatchObject({ kind: 'capacity', verdict: 'strong', points: 2, threshold: -4 });
    expect(result.reason).toContain('8.0 % weaker');
  });

  it('W2: −4.890677, met (SCIENCE §9)', () => {
    const result = leadDeficit(W2.leadDeficit, policy);
    expect(result.value).toBeCloseTo(-4.890677, 6);
    expect(result).toMatchObject({ verdict: 'met', points: 1 });
  });
});

describe('edges of the lines: at −4 and at −8 % inclusive (SCIENCE §9), lead = 100·(1 − d) by hand', () => {
  it.each([
    { lead: 96, verdict: 'met', points: 1 },
    { lead: 96.01, verdict: 'not met', points: 0 },
    { lead: 92, verdict: 'strong', points: 2 },
    { lead: 92.01, verdict: 'met', points: 1 },
    { lead: 100, verdict: 'not met', points: 0 },
    { lead: 120, verdict: 'not met', points: 0 },
  ])('lead $lead, trail 100: $verdict', ({ lead, verdict, points }) => {
    expect(leadDeficit(two(lead), policy)).toMatchObject({ verdict, points });
  });

  it('needs the upper limit below 0: by hand SE = TE for two values of equal TE, so −5 + 1.644854·3.1 > 0', () => {
    expect(leadDeficit(two(95, 3.1), policy)).toMatchObject({ verdict: 'not met', points: 0 });
    expect(leadDeficit(two(95, 3.1), policy).reason).toContain('inside noise');
    expect(leadDeficit(two(95, 3.0), policy).verdict).toBe('met');
  });

  it('a large deficit inside noise is not met, however large', () => {
    expect(leadDeficit(two(80, 20), policy).verdict).toBe('not met');
  });
});

describe('cannot say', () => {
  it('without data, with one value, with values of both legs 0', () => {
    expect(leadDeficit(undefined, policy)).toMatchObject({
      verdict: 'cannot say',
      value: null,
      points: 0,
      threshold: -4,
    });
    expect(leadDeficit({ values: [oneEach(90)] }, policy).reason).toContain('there is one');
    const nothing = { lead: 0, trail: 0, teLeadPct: 3, teTrailPct: 3 };
    expect(leadDeficit({ values: [nothing, nothing, nothing] }, policy).verdict).toBe('cannot say');
    expect(leadDeficit({ values: [oneEach(90), oneEach(90), nothing] }, policy).value).toBeCloseTo(-10, 12);
  });

  it('with a typical error of 0: the weight would be infinite', () => {
    expect(leadDeficit(two(90, 0), policy).verdict).toBe('cannot say');
    expect(leadDeficit(two(90, 1e-170), policy).verdict).toBe('cannot say');
  });

  it('refuses negative and non-finite figures', () => {
    expect(() => leadDeficit(two(-1), policy)).toThrow(RangeError);
    expect(() => leadDeficit(two(Number.NaN), policy)).toThrow(RangeError);
    expect(() => leadDeficit(two(90, -1), policy)).toThrow(RangeError);
  });
});

it('weighs by the inverse of the two variances, by hand: d −10 with TE 1/1 (w ½), −4 with 3/3 (w 1/18) → −9.4', () => {
  const result = leadDeficit({ values: [oneEach(90, 1), oneEach(96, 3)] }, policy);
  expect(result.value).toBeCloseTo(-9.4, 12);
  expect(result.standardError).toBeCloseTo(1 / Math.sqrt(1 / 2 + 1 / 18), 12);
});
