import { afterEach, beforeEach, expect, vi } from 'vitest';

/** An unexpected console.error or console.warn is a failed test. */
const calls: string[] = [];

beforeEach(() => {
  calls.length = 0;
  for (const level of ['error', 'warn'] as const) {
    vi.spyOn(console, level).mockImplementation((...args: unknown[]) => {
      calls.push(`${level}: ${args.map(String).join(' ')}`);
    });
  }
});

afterEach(() => {
  vi.restoreAllMocks();
  expect(calls).toEqual([]);
});
