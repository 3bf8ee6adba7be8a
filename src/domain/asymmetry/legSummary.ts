import type { Better } from '#src/domain/asymmetry/differencePercent.ts';
import { coefficientOfVariationPct } from '#src/domain/statistics/coefficientOfVariationPct.ts';
import { leastAndGreatest } from '#src/domain/statistics/leastAndGreatest.ts';
import { mean } from '#src/domain/statistics/mean.ts';
import { requireFiniteList } from '#src/domain/statistics/requireFiniteList.ts';
import { sampleStandardDeviation } from '#src/domain/statistics/sampleStandardDeviation.ts';

/** One leg's trials in brief, in the unit of the test; spread is null under two trials, cvPct also at a mean of 0. */
export interface LegSummary {
  n: number;
  mean: number;
  best: number;
  sd: number | null;
  cvPct: number | null;
}

/**
 * Count, mean, best, sample standard deviation and coefficient of variation of one leg's trials.
 *
 * @param trials any unit, each ≥ 0
 * @param better whether the best is the highest or the lowest
 * @throws {RangeError} if there is no trial, or one is negative or not finite
 */
export function legSummary(trials: readonly number[], better: Better): LegSummary {
  requireFiniteList('legSummary', trials);
  const { least, greatest } = leastAndGreatest(trials);
  if (least < 0) throw new RangeError(`legSummary requires values ≥ 0, got ${least}`);
  const repeated = trials.length > 1;
  return {
    n: trials.length,
    mean: mean(trials),
    best: better === 'higher' ? greatest : least,
    sd: repeated ? sampleStandardDeviation(trials) : null,
    cvPct: repeated ? coefficientOfVariationPct(trials) : null,
  };
}
