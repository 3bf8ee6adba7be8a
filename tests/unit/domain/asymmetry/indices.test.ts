import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bilateralDeficit } from '#src/domain/asymmetry/bilateralDeficit.ts';
import { differencePercent } from '#src/domain/asymmetry/differencePercent.ts';
import { indices } from '#src/domain/asymmetry/indices.ts';
import { symmetryAngle } from '#src/domain/asymmetry/symmetryAngle.ts';
import { expectRelative } from '#tests/unit/domain/expectRelative.ts';

const values = fc.double({ min: 0.01, max: 1e4, noNaN: true });

describe('indices', () => {
  // Bishop et al. 2016, Strength Cond J 38(6):27–32 (nine equations; 25 against 20 from memory, values recomputed)
  it.each([
    ['A1', 'lsi1', 80],
    ['A2', 'lsi2', 20],
    ['A3', 'lsi3', 200 / 9],
    ['A4', 'bsa', 20],
    ['A5', 'bai1', 100 / 9],
    ['A6', 'bai2', 200 / 9],
    ['A7', 'ai', 200 / 9],
    ['A8', 'si', 100 / 9],
    ['A9 Robinson 1987', 'gaitSi', 200 / 9],
    ['A10 Zifchock et al. 2008', 'symmetryAngle', 7.044657],
    ['A11', 'standardPctDifference', 20],
  ] as const)('%s: %s of 25 against 20', (_, name, expected) => {
    expect(indices(25, 20)[name]).toBeCloseTo(expected, 6);
  });

  it('T5: the asymmetry index divides by the mean, not by D + N/2', () => {
    expect(indices(25, 20).ai).toBeCloseTo(22.2222, 4);
    expect(indices(25, 20).ai).not.toBeCloseTo((100 * 5) / 35, 1); // 14.2857, the misprint
  });

  it('A10 swapped: −7.044657, the other way round with a lower better value', () => {
    expect(symmetryAngle(20, 25)).toBeCloseTo(-7.044657, 6);
    expect(indices(25, 20, 'lower').symmetryAngle).toBeCloseTo(-7.044657, 6);
    expect(indices(25, 20, 'lower').gaitSi).toBeCloseTo(-200 / 9, 9);
    expect(indices(25, 20, 'lower').lsi3).toBeCloseTo(-200 / 9, 9);
    expect(indices(25, 20, 'lower').bsa).toBe(20);
  });

  it('A12: bilateral deficit', () => {
    // collected in Bishop et al. 2016; recomputed
    expect(bilateralDeficit(40, 22, 20)).toBeCloseTo(-4.761905, 6);
    expect(bilateralDeficit(1800, 1000, 950)).toBeCloseTo(-7.692308, 6);
    expect(bilateralDeficit(10, 0, 0)).toBeNull();
    expect(() => bilateralDeficit(-1, 1, 1)).toThrow(RangeError);
  });

  it('A13, A14: 500 against 560 by each denominator (recomputed)', () => {
    expect(differencePercent(500, 560)).toBeCloseTo(-10.714286, 6);
    expect(differencePercent(560, 500)).toBeCloseTo(10.714286, 6);
    const { gaitSi, bai1, lsi1 } = indices(500, 560);
    expect(gaitSi).toBeCloseTo(-11.320755, 6);
    expect(bai1).toBeCloseTo(5.660377, 6);
    expect(lsi1).toBeCloseTo(89.285714, 6);
    expect(symmetryAngle(100, 90)).toBeCloseTo(3.347542, 6);
  });

  it('A16: equal legs give 0, without a sign', () => {
    expect(differencePercent(7, 7)).toBe(0);
    expect(differencePercent(7, 7, 'lower')).toBe(0);
    expect(indices(7, 7)).toMatchObject({ lsi1: 100, lsi2: 0, lsi3: 0, bai1: 0, ai: 0, gaitSi: 0, symmetryAngle: 0 });
  });

  it('A17: one leg at 0', () => {
    expect(differencePercent(0, 5)).toBe(-100);
    expect(differencePercent(5, 0)).toBe(100);
    expect(indices(5, 0)).toMatchObject({ bai1: 100, ai: 200, gaitSi: 200, symmetryAngle: 50, lsi1: 0 });
    expect(indices(0, 5)).toMatchObject({ bai1: 100, ai: 200, gaitSi: -200, symmetryAngle: -50, lsi1: 0 });
    expect(symmetryAngle(-0, 5)).toBe(-50);
  });

  it('A18: both legs at 0 are undefined, not 0', () => {
    expect(differencePercent(0, 0)).toBeNull();
    for (const value of Object.values(indices(0, 0))) expect(value).toBeNull();
  });

  it('A19: opposite signs', () => {
    const opposite = indices(1, -1);
    for (const name of ['lsi3', 'bai1', 'bai2', 'ai', 'si', 'gaitSi'] as const) expect(opposite[name]).toBeNull();
    expect(symmetryAngle(1, -1)).toBeCloseTo(100, 9);
    expect(symmetryAngle(0.5, -1)).toBeCloseTo(-79.516724, 6);
    expect(symmetryAngle(1, -0.5)).toBeCloseTo(79.516724, 6);
  });

  it('turns the sign with the legs and keeps the size with the unit', () => {
    fc.assert(
      fc.property(values, values, fc.double({ min: 0.01, max: 100, noNaN: true }), (lead, trail, unit) => {
        const [one, mirrored, scaled] = [
          indices(lead, trail),
          indices(trail, lead),
          indices(unit * lead, unit * trail),
        ];
        for (const name of ['lsi3', 'gaitSi', 'symmetryAngle'] as const) {
          expect(mirrored[name]! + one[name]!).toBeCloseTo(0, 9);
          expect(Math.sign(one[name]!)).toBe(Math.sign(lead - trail) + 0);
        }
        for (const name of ['lsi1', 'lsi2', 'bsa', 'bai1', 'ai', 'si', 'standardPctDifference'] as const) {
          expect(mirrored[name]).toBe(one[name]);
          expect(scaled[name]! - one[name]!).toBeCloseTo(0, 8);
        }
        expectRelative(differencePercent(trail, lead)! + 200, 200 - differencePercent(lead, trail)!, 1e-12);
        expect(differencePercent(lead, trail, 'lower')! + differencePercent(lead, trail)!).toBe(0);
        expect(Math.abs(differencePercent(lead, trail)!)).toBeLessThanOrEqual(100);
      }),
    );
  });

  it('refuses what is negative or not finite', () => {
    expect(() => differencePercent(-1, 1)).toThrow('differencePercent requires lead ≥ 0, got -1');
    expect(() => differencePercent(1, NaN)).toThrow(RangeError);
    expect(() => indices(Infinity, 1)).toThrow(RangeError);
    expect(() => symmetryAngle(NaN, 1)).toThrow(RangeError);
  });
});
