import { cannotSay, found, type Criterion } from '#src/domain/outrun/criterion.ts';
import { MIN_SWINGS } from '#src/domain/outrun/demand.ts';
import { figure, intervalText } from '#src/domain/outrun/figure.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import type { OutrunPolicy } from '#src/domain/outrun/policy.ts';
import { mean } from '#src/domain/statistics/mean.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';
import { sampleStandardDeviation } from '#src/domain/statistics/sampleStandardDeviation.ts';
import { tQuantile } from '#src/domain/statistics/tQuantile.ts';

/**
 * Late return (strategy): the mean over at least five swings of lead share at impact − at early downswing is under
 * −max(typical error, `lateReturn`) points. One point, never two: a return is a legitimate fast style, so it asks to
 * check the leg's capacity and never speaks of a fault. Interval: mean ± t(.95, n − 1)·SD/√n.
 *
 * Source: the style after Ball & Best 2007, J Sports Sci 25:757–70; the line is our own, no published cut-off.
 *
 * @returns points of lead share, negative = the pressure moved back
 * @throws {RangeError} if the lists differ in length or a share is outside 0 to 100
 */
export function lateReturn(block: OutrunInput['lateReturn'], policy: OutrunPolicy): Criterion {
  const typicalError = block?.typicalErrorPct ?? 0;
  requireFiniteNumber('lateReturn', 'typicalErrorPct', typicalError, { min: 0 });
  const threshold = -Math.max(typicalError, policy.lateReturn);
  const cannot = (reason: string) => cannotSay('late-return', threshold, reason);
  if (!block) return cannot('No lead share through the driver swing was given.');

  const { earlyDownswing, impact } = block;
  if (earlyDownswing.length !== impact.length) {
    throw new RangeError(
      `lateReturn requires as many shares at impact as at early downswing, got ${impact.length} and ${earlyDownswing.length}`,
    );
  }
  for (const share of [...earlyDownswing, ...impact]) {
    requireFiniteNumber('lateReturn', 'share', share, { min: 0, max: 100 });
  }
  const n = impact.length;
  if (n < MIN_SWINGS) return cannot(`Five driver swings of one session are needed: there are ${n}.`);

  const changes = impact.map((share, i) => share - earlyDownswing[i]!);
  const value = mean(changes);
  const standardError = sampleStandardDeviation(changes) / Math.sqrt(n);
  const halfWidth = tQuantile(0.95, n - 1) * standardError;
  const interval90: [number, number] = [value - halfWidth, value + halfWidth];
  const met = value < threshold;
  const moved = value < 0 ? 'back' : 'forward';
  const tail = met
    ? `more than ${figure(-threshold)} points back: check capacity`
    : `not more than ${figure(-threshold)} points back`;
  return found('late-return', threshold, {
    verdict: met ? 'met' : 'not met',
    points: met ? 1 : 0,
    value,
    standardError,
    interval90,
    reason:
      `From early downswing to impact the pressure moved ${moved} by ${figure(Math.abs(value))} points of lead share ` +
      `over ${n} swings (${intervalText(interval90, ' points')}): ${tail}.`,
  });
}
