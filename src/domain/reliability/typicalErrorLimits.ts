import { chiSquareQuantile } from '#src/domain/statistics/chiSquareQuantile.ts';

/**
 * 90 % confidence limits of a typical error, `TE·√(df/χ²)`.
 *
 * Source: Hopkins 2000, Sports Medicine 30(1):1–15 (from memory).
 *
 * @param typicalError in the unit of the test, ≥ 0
 * @param df degrees of freedom, at least 1
 * @returns lower and upper limit, same unit
 * @throws {RangeError} if df is not above 0
 */
export function typicalErrorLimits(typicalError: number, df: number): [number, number] {
  return [
    typicalError * Math.sqrt(df / chiSquareQuantile(0.95, df)),
    typicalError * Math.sqrt(df / chiSquareQuantile(0.05, df)),
  ];
}
