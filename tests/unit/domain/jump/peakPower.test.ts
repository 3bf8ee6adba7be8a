import { describe, expect, it } from 'vitest';
import { peakPower } from '#src/domain/jump/peakPower.ts';

describe('peakPower', () => {
  // C7: Sayers squat jump and Canavan & Vescovi read, the others from memory; all values recomputed
  it.each([
    ['sayers-squat-jump', 30, 50, undefined, 2031],
    ['sayers-squat-jump', 15, 50, undefined, 1120.5],
    ['sayers-squat-jump', 55, 80, undefined, 4907.5],
    ['harman', 30, 50, undefined, 1835],
    ['canavan-vescovi-women', 30, 50, undefined, 1829.9],
    ['johnson-bahamonde', 30, 50, 150, 1770],
    // by hand: 51.9 · 30 + 48.9 · 50 − 2007
    ['sayers-countermovement', 30, 50, undefined, 1995],
  ] as const)('C7: %s, %i cm, %i kg', (equation, heightCm, massKg, statureCm, expected) => {
    const result = peakPower({ equation, heightCm, massKg, ...(statureCm === undefined ? {} : { statureCm }) });
    expect(result.peakPowerW).toBeCloseTo(expected, 6);
  });

  it('T4: Harman’s constant is −1822; +1822 is widely copied', () => {
    // means of Canavan & Vescovi 2004: 65.9 kg, 32.793 cm; published 2585.0 W, with the wrong sign 6224
    const { peakPowerW } = peakPower({ equation: 'harman', heightCm: 32.793, massKg: 65.9 });
    expect(Math.round(peakPowerW!)).toBe(2580);
    expect(Math.abs(peakPowerW! - 2585)).toBeLessThan(10);
  });

  it('has no power where the stature is missing or the line falls below 0', () => {
    expect(peakPower({ equation: 'johnson-bahamonde', heightCm: 30, massKg: 50 })).toEqual({
      peakPowerW: null,
      reason: 'this equation needs the stature',
    });
    expect(peakPower({ equation: 'harman', heightCm: 5, massKg: 25 }).peakPowerW).toBeNull();
  });

  it('refuses what is negative or not finite', () => {
    expect(() => peakPower({ equation: 'harman', heightCm: -1, massKg: 50 })).toThrow(RangeError);
    expect(() => peakPower({ equation: 'harman', heightCm: 30, massKg: 0 })).toThrow(RangeError);
    expect(() => peakPower({ equation: 'harman', heightCm: NaN, massKg: 50 })).toThrow(RangeError);
  });
});
