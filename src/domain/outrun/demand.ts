import { cannotSay, found, type Criterion } from '#src/domain/outrun/criterion.ts';
import { figure, intervalText } from '#src/domain/outrun/figure.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import type { OutrunPolicy } from '#src/domain/outrun/policy.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';
import { Z90 } from '#src/domain/statistics/z90.ts';

/** Fewest swings of one session, and fewest valid trials of the leg, fixed for this version of the rule. */
export const MIN_SWINGS = 5;
export const MIN_TRIALS = 2;

/**
 * Demand over capacity (comparing): `DR` = mean peak lead vertical force in the driver swing ÷ mean lead push peak,
 * both in times body weight. `SE = DR·√(CVd²/nd + daySwing² + CVi²/ni + dayForce²)/100`, `L = DR − z·SE`, M = median
 * ratio of the programme on the same rig (0 where none). Met: L > max(`demandMet`, `overMedianMet`·M); strong likewise.
 *
 * Source: our own rule, no published cut-off; the mechanism is Han et al. 2019, Sports Biomech 18:115–34.
 *
 * @returns a ratio without unit
 * @throws {RangeError} if a figure is negative or not finite, or a count not whole
 */
export function demand(block: OutrunInput['demand'], policy: OutrunPolicy): Criterion {
  const programmeMedian = block?.programmeMedian ?? 0;
  requireFiniteNumber('demand', 'programmeMedian', programmeMedian, { min: 0 });
  const threshold = Math.max(policy.demandMet, policy.overMedianMet * programmeMedian);
  const strongThreshold = Math.max(policy.demandStrong, policy.overMedianStrong * programmeMedian);
  const cannot = (reason: string) => cannotSay('demand', threshold, reason);
  if (!block) return cannot('No force under the lead foot in the driver swing was given beside a push test.');

  const { peakLead, capacity } = block;
  for (const [field, { mean, cvPct, n }] of Object.entries({ peakLead, capacity })) {
    requireFiniteNumber('demand', `${field}.mean`, mean, { min: 0 });
    requireFiniteNumber('demand', `${field}.cvPct`, cvPct, { min: 0 });
    if (!Number.isInteger(n) || n < 0) throw new RangeError(`demand requires whole ${field}.n ≥ 0, got ${n}`);
  }
  if (peakLead.n < MIN_SWINGS) return cannot(`Five driver swings of one session are needed: there are ${peakLead.n}.`);
  if (capacity.n < MIN_TRIALS)
    return cannot(`Two valid push trials of the lead leg are needed: there are ${capacity.n}.`);
  if (capacity.mean === 0) return cannot('The lead push is 0: nothing to compare the swing with.');

  const value = peakLead.mean / capacity.mean;
  const variance =
    peakLead.cvPct ** 2 / peakLead.n +
    policy.daySwingPct ** 2 +
    capacity.cvPct ** 2 / capacity.n +
    policy.dayForcePct ** 2;
  const standardError = (value * Math.sqrt(variance)) / 100;
  const interval90: [number, number] = [value - Z90 * standardError, value + Z90 * standardError];
  const met = interval90[0] > threshold;
  const strong = met && interval90[0] > strongThreshold;
  const beside = programmeMedian > 0 ? `; the programme’s median is ${figure(programmeMedian, 2)}` : '';
  const line = strong ? strongThreshold : threshold;
  return found('demand', threshold, {
    verdict: strong ? 'strong' : met ? 'met' : 'not met',
    points: strong ? 2 : met ? 1 : 0,
    value,
    standardError,
    interval90,
    reason:
      `The driver swing asks ${figure(peakLead.mean, 2)} × body weight of the lead leg, its push gives ` +
      `${figure(capacity.mean, 2)}: a ratio of ${figure(value, 2)} (${intervalText(interval90, '', 2)}${beside}). ` +
      `The low end is ${met ? 'over' : 'not over'} ${figure(line, 2)}.`,
  });
}
