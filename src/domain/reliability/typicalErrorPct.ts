import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** A test's within-day CV (%), the trials behind the leg's mean, and the change between days (%), default 2.5. */
export interface TypicalErrorPctInput {
  cvPct: number;
  n: number;
  dayPct?: number;
}

/**
 * Typical error between days of one leg's mean, `√(CV²/n + day²)`, per cent. More trials shrink only the first term.
 * A within-day CV alone gives intervals that are too narrow across days.
 *
 * Source: our own rule for programmes without a two-day study of their own; no published value.
 *
 * @param input `cvPct` ≥ 0, `n` a whole number ≥ 1, `dayPct` ≥ 0
 * @returns per cent
 * @throws {RangeError} if a number is out of range
 * @example typicalErrorPct({ cvPct: 4, n: 3 }) // → 3.403430
 */
export function typicalErrorPct({ cvPct, n, dayPct = 2.5 }: TypicalErrorPctInput): number {
  requireFiniteNumber('typicalErrorPct', 'cvPct', cvPct, { min: 0 });
  requireFiniteNumber('typicalErrorPct', 'dayPct', dayPct, { min: 0 });
  if (!Number.isInteger(n) || n < 1) throw new RangeError(`typicalErrorPct requires whole n ≥ 1, got ${n}`);
  return Math.sqrt(cvPct ** 2 / n + dayPct ** 2);
}
