import { describe, expect, it } from 'vitest';
import { lateReturn } from '#src/domain/outrun/lateReturn.ts';
import { DEFAULT_POLICY as policy } from '#src/domain/outrun/policy.ts';
import { W9 } from '#tests/unit/domain/outrun/workedExamples.ts';

const moved = (change: number, n = 5, typicalErrorPct?: number) =>
  lateReturn({ earlyDownswing: Array(n).fill(60), impact: Array(n).fill(60 + change), typicalErrorPct }, policy);

it('W9: −10.6, −13.659776…−7.540224, met, one point (SCIENCE §9)', () => {
  const result = lateReturn(W9.lateReturn, policy);
  expect(result.value).toBeCloseTo(-10.6, 9);
  expect(result.interval90![0]).toBeCloseTo(-13.659776, 6);
  expect(result.interval90![1]).toBeCloseTo(-7.540224, 6);
  expect(result).toMatchObject({ kind: 'strategy', verdict: 'met', points: 1, threshold: -5 });
  expect(result.reason).toContain('check capacity');
  expect(result.reason).not.toMatch(/fault|weight/i);
});

describe('edges (SCIENCE §9)', () => {
  it('must be under −5, not at it; never more than one point', () => {
    expect(moved(-5).verdict).toBe('not met');
    expect(moved(-5.01)).toMatchObject({ verdict: 'met', points: 1 });
    expect(moved(-40)).toMatchObject({ verdict: 'met', points: 1 });
    expect(moved(20).verdict).toBe('not met');
  });
  it('a typical error above 5 points takes the place of 5, one below does not', () => {
    expect(moved(-7, 5, 7)).toMatchObject({ verdict: 'not met', threshold: -7 });
    expect(moved(-7.01, 5, 7).verdict).toBe('met');
    expect(moved(-5.01, 5, 2)).toMatchObject({ verdict: 'met', threshold: -5 });
  });
  it('needs five swings', () => {
    expect(moved(-10, 4)).toMatchObject({ verdict: 'cannot say', points: 0 });
    expect(moved(-10, 5).verdict).toBe('met');
    expect(lateReturn(undefined, policy).verdict).toBe('cannot say');
  });
  it('refuses lists of different length and shares outside 0 to 100', () => {
    expect(() => lateReturn({ earlyDownswing: [60], impact: [50, 50] }, policy)).toThrow(RangeError);
    expect(() => moved(50)).toThrow(RangeError);
  });
});
