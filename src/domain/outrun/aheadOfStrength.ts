import { cannotSay, found, type Criterion } from '#src/domain/outrun/criterion.ts';
import { figure } from '#src/domain/outrun/figure.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import { mean } from '#src/domain/statistics/mean.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';
import { tQuantile } from '#src/domain/statistics/tQuantile.ts';
import { leastSquares } from '#src/domain/trend/leastSquares.ts';

/** Fewest other athletes for a regression, fixed for this version of the rule. */
export const MIN_OTHERS_STRENGTH = 15;

/**
 * Ahead of strength (information): the athlete's club speed above the 90 % prediction interval of the least-squares
 * line of club speed on absolute lead push among the other athletes.
 * `half-width = t(.95, n − 2)·s·√(1 + 1/n + (x − x̄)²/Sxx)`.
 *
 * Source: ordinary prediction interval; strength goes with speed in juniors (Coughlan 2020, JSCR 34:212–7).
 *
 * @returns value = club speed − line, m/s; threshold = the half-width
 * @throws {RangeError} if a strength or a speed is negative or not finite
 */
export function aheadOfStrength(block: OutrunInput['aheadOfStrength']): Criterion {
  const cannot = (reason: string) => cannotSay('ahead-of-strength', null, reason);
  if (!block) return cannot('No club speed was given beside a lead push.');
  const { others, athlete } = block;
  for (const { strength, clubSpeed } of [...others, athlete]) {
    requireFiniteNumber('aheadOfStrength', 'strength', strength, { min: 0 });
    requireFiniteNumber('aheadOfStrength', 'clubSpeed', clubSpeed, { min: 0 });
  }
  const n = others.length;
  if (n < MIN_OTHERS_STRENGTH) {
    return cannot(
      `Fifteen other athletes with a lead push and a club speed are needed: there ${n === 1 ? 'is' : 'are'} ${n}.`,
    );
  }
  const strengths = others.map(({ strength }) => strength);
  const line = leastSquares(
    strengths,
    others.map(({ clubSpeed }) => clubSpeed),
  );
  if (line.slope === null || line.intercept === null || line.residualSd === null) {
    return cannot('All the other athletes have the same lead push: no line can be drawn.');
  }
  const centre = mean(strengths);
  const squares = strengths.reduce((sum, strength) => sum + (strength - centre) ** 2, 0);
  const expected = line.intercept + line.slope * athlete.strength;
  const standardError = line.residualSd * Math.sqrt(1 + 1 / n + (athlete.strength - centre) ** 2 / squares);
  const halfWidth = tQuantile(0.95, n - 2) * standardError;
  const value = athlete.clubSpeed - expected;
  const met = value > halfWidth;
  return found('ahead-of-strength', halfWidth, {
    verdict: met ? 'met' : 'not met',
    points: 0,
    value,
    standardError,
    interval90: [value - halfWidth, value + halfWidth],
    reason:
      `Club speed ${figure(athlete.clubSpeed)} m/s; ${n} others make ${figure(expected)} m/s likely for a lead push of ` +
      `${figure(athlete.strength, 0)} N, and ${figure(expected - halfWidth)} to ${figure(expected + halfWidth)} m/s usual: ` +
      `${met ? 'above it' : 'not above it'}.`,
  });
}
