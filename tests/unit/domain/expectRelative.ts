import { expect } from 'vitest';

/** Fails unless `actual` is a number within `tolerance` of `expected`, relative to it (absolute where that is 0). */
export function expectRelative(actual: number | null | undefined, expected: number, tolerance = 1e-6): void {
  expect(actual, `expected about ${expected}`).toBeTypeOf('number');
  const allowed = tolerance * (expected === 0 ? 1 : Math.abs(expected));
  expect(Math.abs(actual! - expected), `${actual} against ${expected}`).toBeLessThanOrEqual(allowed);
}
