import { cannotSay, found, type Criterion } from '#src/domain/outrun/criterion.ts';
import { MIN_SWINGS } from '#src/domain/outrun/demand.ts';
import { figure } from '#src/domain/outrun/figure.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import { median } from '#src/domain/statistics/median.ts';
import { requireFiniteList } from '#src/domain/statistics/requireFiniteList.ts';

/** A peak counts as late from more than this many milliseconds after lead arm parallel. */
export const LATE_PEAK_MS = 20;

/**
 * Late peak (information): the lead force peaks more than 20 ms after lead arm parallel in at least 70 % of at least
 * five swings. The caller leaves out traces under 200 samples a second.
 *
 * Source: the peak at or before lead arm parallel is common practice; loading there is critical (Han et al. 2019,
 * Sports Biomech 18:115–34). The line is our own.
 *
 * @returns median, ms after lead arm parallel (negative = before it)
 * @throws {RangeError} if a time is not finite
 */
export function latePeak(block: OutrunInput['latePeak']): Criterion {
  const cannot = (reason: string) => cannotSay('late-peak', LATE_PEAK_MS, reason);
  if (!block) return cannot('No time of the lead peak in the driver swing was given.');
  const times = block.afterLeadArmParallelMs;
  requireFiniteList('latePeak', times, 0);
  if (times.length < MIN_SWINGS)
    return cannot(`Five driver swings of one session are needed: there are ${times.length}.`);

  const late = times.filter((time) => time > LATE_PEAK_MS).length;
  // whole numbers: 7 of 10 must not fail on 0.7 × 10 in binary
  const met = 10 * late >= 7 * times.length;
  const value = median(times);
  return found('late-peak', LATE_PEAK_MS, {
    verdict: met ? 'met' : 'not met',
    points: 0,
    value,
    standardError: null,
    interval90: null,
    reason:
      `The lead force peaks ${figure(Math.abs(value), 0)} ms ${value < 0 ? 'before' : 'after'} lead arm parallel (median); ` +
      `later than ${LATE_PEAK_MS} ms in ${late} of ${times.length} swings, ${met ? '' : 'less than '}70 % ${met ? 'or more' : 'of them'}.`,
  });
}
