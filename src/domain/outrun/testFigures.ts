import type { CapacityTest } from '#src/domain/outrun/athleteHistory.ts';
import { figure } from '#src/domain/outrun/figure.ts';

/** How a test's figures are written: N whole, jump and hop in cm. */
export const TEST_FIGURES: Readonly<
  Record<CapacityTest, { label: string; factor: number; unit: string; decimals: number }>
> = Object.freeze({
  push: { label: 'push', factor: 1, unit: ' N', decimals: 0 },
  jump: { label: 'jump', factor: 100, unit: ' cm', decimals: 1 },
  hop: { label: 'hop', factor: 100, unit: ' cm', decimals: 0 },
});

/** A value of a test (SI) as text. @example testFigure('jump', 0.118) // → '11.8 cm' */
export function testFigure(test: CapacityTest, value: number): string {
  const { factor, unit, decimals } = TEST_FIGURES[test];
  return `${figure(value * factor, decimals)}${unit}`;
}
