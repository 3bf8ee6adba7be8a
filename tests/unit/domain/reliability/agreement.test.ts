import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { agreement, type Side } from '#src/domain/reliability/agreement.ts';

const times = (count: number, one: Side, other: Side) =>
  Array.from({ length: count }, (): [Side, Side] => [one, other]);

describe('agreement', () => {
  it('B6: [20 5; 10 15] (recomputed)', () => {
    const pairs = [
      ...times(20, 'lead', 'lead'),
      ...times(5, 'lead', 'trail'),
      ...times(10, 'trail', 'lead'),
      ...times(15, 'trail', 'trail'),
    ];
    expect(agreement({ pairs })).toEqual({ observed: 0.7, expected: 0.5, kappa: 0.4, band: 'fair', reason: null });
  });

  it('B6: all in one cell is undefined', () => {
    const result = agreement({ pairs: times(5, 'lead', 'lead') });
    expect(result).toMatchObject({ observed: 1, expected: 1, kappa: null, band: null });
    expect(result.reason).toContain('undefined');
  });

  // bands of Landis & Koch 1977 (from memory); kappas by hand from 2 × 2 tables with even margins: 1 − 2·share off
  it.each([
    [40, 'poor', -0.6],
    [25, 'slight', 0],
    [20, 'slight', 0.2],
    [15, 'fair', 0.4],
    [10, 'moderate', 0.6],
    [5, 'substantial', 0.8],
    [4, 'almost perfect', 0.84],
    [0, 'almost perfect', 1],
  ])('%i of 50 differ: %s', (off, band, kappa) => {
    const half = (50 - off) / 2;
    const pairs = [
      ...times(Math.floor(half), 'lead', 'lead'),
      ...times(Math.ceil(half), 'trail', 'trail'),
      ...times(Math.ceil(off / 2), 'lead', 'trail'),
      ...times(Math.floor(off / 2), 'trail', 'lead'),
    ];
    const result = agreement({ pairs });
    expect(result.band).toBe(band);
    expect(result.kappa).toBeCloseTo(kappa, 2);
  });

  it('takes none as a third answer', () => {
    // by hand: n 4, same 2, margins lead 2·2, trail 1·1, none 1·1 → 6/16; kappa (8 − 6)/(16 − 6)
    const pairs: [Side, Side][] = [['lead', 'lead'], ['lead', 'none'], ['trail', 'trail'], ['none', 'lead']]; // prettier-ignore
    expect(agreement({ pairs })).toMatchObject({ observed: 0.5, expected: 0.375, kappa: 0.2, band: 'slight' });
  });

  it('is symmetric, and at most 1', () => {
    const side = fc.constantFrom<Side>('lead', 'trail', 'none');
    fc.assert(
      fc.property(fc.array(fc.tuple(side, side), { minLength: 1, maxLength: 30 }), (pairs) => {
        const one = agreement({ pairs });
        const swapped = agreement({ pairs: pairs.map(([a, b]): [Side, Side] => [b, a]) });
        const mirrored = agreement({ pairs: pairs.toReversed() });
        expect(swapped).toEqual(one);
        expect(mirrored).toEqual(one);
        if (one.kappa === null) expect(one.reason).not.toBeNull();
        else expect(one.kappa).toBeLessThanOrEqual(1);
      }),
    );
  });

  it('refuses an empty list and unknown sides', () => {
    expect(() => agreement({ pairs: [] })).toThrow(RangeError);
    expect(() => agreement({ pairs: [['lead', 'left' as Side]] })).toThrow(
      'agreement requires lead, trail or none, got lead and left',
    );
  });
});
