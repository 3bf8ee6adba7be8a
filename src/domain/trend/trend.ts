import { requireFiniteList } from '#src/domain/statistics/requireFiniteList.ts';
import { leastSquares, type LeastSquares } from '#src/domain/trend/leastSquares.ts';
import { mannKendall, type Alternative, type MannKendall } from '#src/domain/trend/mannKendall.ts';
import { theilSen, type TheilSen } from '#src/domain/trend/theilSen.ts';
import { TREND_MOST_POINTS } from '#src/domain/trend/trendMostPoints.ts';

/** One y for each x, any units, any order. */
export interface TrendInput {
  x: readonly number[];
  y: readonly number[];
  /** of the Mann–Kendall test, default two-sided */
  alternative?: Alternative;
}

/** Three views of one trend; nulls have their reason. */
export interface Trend {
  n: number;
  ols: LeastSquares;
  theilSen: TheilSen;
  mannKendall: MannKendall;
  reason: string | null;
}

/**
 * Trend of y over x: ordinary least squares, the Theil–Sen line, and the Mann–Kendall test.
 *
 * Source: see `leastSquares`, `theilSen`, `mannKendall`.
 *
 * @param input at least one point, at most 2000
 * @returns nulls with a reason where there are too few points or x or y does not vary
 * @throws {RangeError} if the lists are empty, too long or of unequal length, or a value is not finite
 * @example trend({ x: [1, 2, 3], y: [2, 4, 6] }).ols.slope // → 2
 */
export function trend({ x, y, alternative = 'two-sided' }: TrendInput): Trend {
  requireFiniteList('trend', x);
  requireFiniteList('trend', y);
  if (x.length !== y.length) throw new RangeError(`trend requires equal lengths, got ${x.length} and ${y.length}`);
  if (x.length > TREND_MOST_POINTS) {
    throw new RangeError(`trend requires at most ${TREND_MOST_POINTS} points, got ${x.length}`);
  }
  const ols = leastSquares(x, y);
  const line = theilSen(x, y);
  const test = mannKendall(x, y, alternative);
  return { n: x.length, ols, theilSen: line, mannKendall: test, reason: reasonFor(ols, line, test) };
}

function reasonFor(ols: LeastSquares, line: TheilSen, test: MannKendall): string | null {
  if (ols.slope === null) return 'all x are equal: no slope';
  const reasons = [
    ols.slopeSe === null && 'two points: no residual spread',
    line.slopeCi90 === null && 'too few slopes for a 90 % interval of the Theil–Sen slope',
    test.p === null && 'all y are equal: neither r² nor a test of trend',
  ].filter((reason) => reason !== false);
  return reasons.length === 0 ? null : reasons.join('; ');
}
