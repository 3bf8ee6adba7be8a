import { expect, it } from 'vitest';
import { DEFAULT_POLICY, fullPolicy } from '#src/domain/outrun/policy.ts';

it('has the keys and defaults of the contract (SCIENCE §9, our own policy values)', () => {
  expect(fullPolicy()).toEqual({
    deficitMet: -4,
    deficitStrong: -8,
    gainMet: 3.5,
    gainStrong: 8,
    strengthExponent: 0.5,
    statureExponent: 1,
    learningPctPerYear: 2,
    pairNoisePct: 4,
    demandMet: 0.85,
    demandStrong: 0.95,
    overMedianMet: 1.1,
    overMedianStrong: 1.25,
    dayForcePct: 2.5,
    daySwingPct: 3,
    lateReturn: 5,
    look: 3,
    act: 5,
    minOthersGain: 8,
    minOthersDemand: 10,
  });
});

it('merges a partial policy and leaves the defaults as they are', () => {
  expect(fullPolicy({ deficitMet: -6, look: undefined })).toEqual({ ...DEFAULT_POLICY, deficitMet: -6 });
  expect(DEFAULT_POLICY.deficitMet).toBe(-4);
});

it('refuses an unknown key and a threshold that is not finite', () => {
  expect(() => fullPolicy({ lookk: 3 } as never)).toThrow(RangeError);
  expect(() => fullPolicy({ look: Number.NaN })).toThrow(RangeError);
  expect(() => fullPolicy({ toString: 3 } as never)).toThrow(RangeError);
});
