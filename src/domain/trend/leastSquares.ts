import { mean } from '#src/domain/statistics/mean.ts';
import { tQuantile } from '#src/domain/statistics/tQuantile.ts';

/** Ordinary least squares; `slopeSe`, its interval and `residualSd` are null for two points, `r2` for a level y. */
export interface LeastSquares {
  slope: number | null;
  intercept: number | null;
  slopeSe: number | null;
  slopeCi90: [number, number] | null;
  r2: number | null;
  residualSd: number | null;
}

/**
 * Ordinary least squares of y on x, about the means, with residuals taken point by point.
 * The slope's 90 % interval is Student's with n − 2 degrees of freedom.
 *
 * @param x at least one value, any unit
 * @param y as many values, any unit
 * @returns all null where x does not vary
 */
export function leastSquares(x: readonly number[], y: readonly number[]): LeastSquares {
  const n = x.length;
  if (x.every((value) => value === x[0])) {
    return { slope: null, intercept: null, slopeSe: null, slopeCi90: null, r2: null, residualSd: null };
  }
  const xMean = mean(x);
  const yMean = mean(y);
  let xx = 0;
  let xy = 0;
  let yy = 0;
  for (let i = 0; i < n; i += 1) {
    xx += (x[i]! - xMean) ** 2;
    xy += (x[i]! - xMean) * (y[i]! - yMean);
    yy += (y[i]! - yMean) ** 2;
  }
  const level = y.every((value) => value === y[0]);
  const slope = level ? 0 : xy / xx;
  const intercept = level ? y[0]! : yMean - slope * xMean;
  let residuals = 0;
  for (let i = 0; i < n; i += 1) residuals += (level ? 0 : y[i]! - yMean - slope * (x[i]! - xMean)) ** 2;
  const r2 = level ? null : Math.max(0, 1 - residuals / yy);
  if (n < 3) return { slope, intercept, slopeSe: null, slopeCi90: null, r2, residualSd: null };
  const residualSd = Math.sqrt(residuals / (n - 2));
  const slopeSe = residualSd / Math.sqrt(xx);
  const halfWidth = tQuantile(0.95, n - 2) * slopeSe;
  return { slope, intercept, slopeSe, slopeCi90: [slope - halfWidth, slope + halfWidth], r2, residualSd };
}
