import { describe, expect, it } from 'vitest';
import { robustCarry } from '#src/domain/driver/robustCarry.ts';

describe('robustCarry', () => {
  it('is the median with its error (by hand: MAD 2, SE = √(π/2)·1.4826·2/√5 = 1.661977; common practice)', () => {
    const { n, median, standardError, interval90, reason } = robustCarry([150, 152, 154, 156, 158]);
    expect({ n, median, reason }).toEqual({ n: 5, median: 154, reason: null });
    expect(standardError).toBeCloseTo((1.2533141373155 * 1.4826 * 2) / Math.sqrt(5), 12);
    expect(interval90![0]).toBeCloseTo(154 - 1.6448536269514722 * standardError!, 12);
    expect(interval90![1]).toBeCloseTo(154 + 1.6448536269514722 * standardError!, 12);
  });

  it('is not moved by one mishit as a mean would be', () => {
    expect(robustCarry([150, 152, 154, 156, 20]).median).toBe(152);
  });

  it('scales with the unit', () => {
    const carries = [150, 151, 154, 156, 158, 161];
    const [metres, yards] = [robustCarry(carries), robustCarry(carries.map((carry) => carry / 0.9144))];
    expect(yards.standardError).toBeCloseTo(metres.standardError! / 0.9144, 9);
  });

  it('has no error for fewer than three shots or where half are alike', () => {
    expect(robustCarry([150, 160])).toMatchObject({ median: 155, standardError: null, interval90: null });
    expect(robustCarry([150, 160]).reason).toMatch(/fewer than three/);
    expect(robustCarry([150, 150, 150, 160]).reason).toMatch(/the same/);
  });

  it('refuses an empty list and a negative carry', () => {
    expect(() => robustCarry([])).toThrow(RangeError);
    expect(() => robustCarry([150, -1, 150])).toThrow(RangeError);
  });
});
