import { median } from '#src/domain/statistics/median.ts';
import { Z90 } from '#src/domain/statistics/z90.ts';
import { tieSizes } from '#src/domain/trend/tieSizes.ts';

/** Theil–Sen line; the interval is null where there are too few slopes to reach 90 %. */
export interface TheilSen {
  slope: number | null;
  intercept: number | null;
  slopeCi90: [number, number] | null;
}

/**
 * Theil–Sen line: the median of the slopes of all pairs with different x; intercept = median y − slope · median x.
 * The slope's 90 % limits are Sen's, by the normal approximation of Kendall's variance less the ties of x and of y,
 * with ranks rounded half to even. Where a rank falls outside the slopes (three points or fewer), the data cannot
 * reach 90 % and there is no interval.
 *
 * Source: Sen 1968, J Am Stat Assoc 63:1379–89; ranks as in SciPy's `theilslopes`.
 *
 * @param x at least one value, any unit
 * @param y as many values, any unit
 * @returns all null where x does not vary
 * @example theilSen([1, 2, 3, 4, 10, 12, 18], [9, 15, 19, 20, 45, 55, 78]) // → slope 4, intercept 4
 */
export function theilSen(x: readonly number[], y: readonly number[]): TheilSen {
  const slopes = sortedPairSlopes(x, y);
  if (slopes.length === 0) return { slope: null, intercept: null, slopeCi90: null };
  const upper = slopes.length >> 1;
  const slope = slopes.length % 2 === 1 ? slopes[upper]! : (slopes[upper - 1]! + slopes[upper]!) / 2;
  const intercept = median(y) - slope * median(x);
  const deviation = Z90 * Math.sqrt(senVariance(x, y));
  const lowRank = roundHalfToEven((slopes.length - deviation) / 2) - 1;
  const highRank = roundHalfToEven((slopes.length + deviation) / 2);
  const low = slopes[lowRank];
  const high = slopes[highRank];
  return { slope, intercept, slopeCi90: low === undefined || high === undefined ? null : [low, high] };
}

function sortedPairSlopes(x: readonly number[], y: readonly number[]): Float64Array {
  const n = x.length;
  const slopes = new Float64Array((n * (n - 1)) / 2);
  let count = 0;
  for (let i = 0; i < n; i += 1) {
    for (let j = i + 1; j < n; j += 1) {
      if (x[j] === x[i]) continue;
      // `+ 0` keeps −0 out of the answer
      slopes[count] = (y[j]! - y[i]!) / (x[j]! - x[i]!) + 0;
      count += 1;
    }
  }
  return slopes.subarray(0, count).sort();
}

function senVariance(x: readonly number[], y: readonly number[]): number {
  const term = (size: number) => size * (size - 1) * (2 * size + 5);
  const ties = [...tieSizes(x), ...tieSizes(y)].reduce((sum, size) => sum + term(size), 0);
  return Math.max(0, term(x.length) - ties) / 18;
}

function roundHalfToEven(value: number): number {
  const floor = Math.floor(value);
  if (value - floor !== 0.5) return Math.round(value);
  return floor % 2 === 0 ? floor : floor + 1;
}
