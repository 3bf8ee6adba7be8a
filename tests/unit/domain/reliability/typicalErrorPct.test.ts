import { describe, expect, it } from 'vitest';
import { typicalErrorPct } from '#src/domain/reliability/typicalErrorPct.ts';

describe('typicalErrorPct', () => {
  // our own rule (no published source): √(CV²/n + 2.5²) at three trials
  it.each([
    ['isometric push', 4, 3.40343],
    ['single-leg jump', 5, 3.818813],
    ['hop', 4.5, 3.605551],
  ])('%s, CV %f %%', (_, cvPct, expected) => {
    expect(typicalErrorPct({ cvPct, n: 3 })).toBeCloseTo(expected, 6);
  });

  it('keeps the change between days however many the trials', () => {
    // by hand: 3² + 4² = 5², and CV 0 leaves the day alone
    expect(typicalErrorPct({ cvPct: 6, n: 4, dayPct: 4 })).toBe(5);
    expect(typicalErrorPct({ cvPct: 0, n: 1 })).toBe(2.5);
    expect(typicalErrorPct({ cvPct: 5, n: 1e9 })).toBeCloseTo(2.5, 6);
  });

  it('refuses what is negative, not whole or not finite', () => {
    expect(() => typicalErrorPct({ cvPct: -1, n: 3 })).toThrow(RangeError);
    expect(() => typicalErrorPct({ cvPct: 4, n: 0 })).toThrow('typicalErrorPct requires whole n ≥ 1, got 0');
    expect(() => typicalErrorPct({ cvPct: 4, n: 1.5 })).toThrow(RangeError);
    expect(() => typicalErrorPct({ cvPct: 4, n: 3, dayPct: NaN })).toThrow(RangeError);
  });
});
