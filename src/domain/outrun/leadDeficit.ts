import { differencePercent } from '#src/domain/asymmetry/differencePercent.ts';
import { cannotSay, found, type Criterion } from '#src/domain/outrun/criterion.ts';
import { figure, intervalText } from '#src/domain/outrun/figure.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import type { OutrunPolicy } from '#src/domain/outrun/policy.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';
import { Z90 } from '#src/domain/statistics/z90.ts';

/** Fewest results, over all tests, that settle a side: agreement between tests on the weaker leg is poor. */
export const MIN_LEAD_DEFICIT_VALUES = 2;

/**
 * Lead deficit (capacity): `D = Σwd/Σw` over the newest two counted sessions of each test, `d = 100(lead −
 * trail)/max`, `w = 1/(TE_lead² + TE_trail²)`, `SE = 1/√Σw`. Met: D at or under `deficitMet` and the upper 90 % limit
 * under 0. Strong: also D at or under `deficitStrong`. A lead leg that is the stronger never counts.
 *
 * Source: our own rule, no published cut-off; the weights are inverse variances.
 *
 * @returns per cent, negative = lead weaker
 * @throws {RangeError} if a mean or a typical error is negative or not finite
 * @example leadDeficit({ values: [{ lead: 500, trail: 560, teLeadPct: 3.4, teTrailPct: 3.4 }, …] }, policy)
 */
export function leadDeficit(block: OutrunInput['leadDeficit'], policy: OutrunPolicy): Criterion {
  const cannot = (reason: string) => cannotSay('lead-deficit', policy.deficitMet, reason);
  if (!block) return cannot('No result of both legs in a push, a jump or a hop was given.');

  let weights = 0;
  let weighted = 0;
  let count = 0;
  for (const { lead, trail, teLeadPct, teTrailPct } of block.values) {
    requireFiniteNumber('leadDeficit', 'teLeadPct', teLeadPct, { min: 0 });
    requireFiniteNumber('leadDeficit', 'teTrailPct', teTrailPct, { min: 0 });
    const difference = differencePercent(lead, trail);
    const weight = 1 / (teLeadPct ** 2 + teTrailPct ** 2);
    if (!Number.isFinite(weight))
      return cannot('A typical error of 0 % cannot weigh a result: no test is without error.');
    if (difference === null) continue;
    weights += weight;
    weighted += weight * difference;
    count += 1;
  }
  if (count < MIN_LEAD_DEFICIT_VALUES) {
    const given = count === 1 ? 'there is one' : 'there is none';
    return cannot(`Two results of both legs are needed to settle a side: ${given}.`);
  }

  const value = weighted / weights;
  const standardError = 1 / Math.sqrt(weights);
  const interval90: [number, number] = [value - Z90 * standardError, value + Z90 * standardError];
  const met = value <= policy.deficitMet && interval90[1] < 0;
  const strong = met && value <= policy.deficitStrong;
  const side = value < 0 ? 'weaker' : 'stronger';
  const size = `The lead leg is ${figure(Math.abs(value))} % ${side} over ${count} results`;
  const because = strong
    ? `beyond noise, and ${figure(-policy.deficitStrong)} % or more`
    : met
      ? `beyond noise, and ${figure(-policy.deficitMet)} % or more`
      : value >= 0
        ? 'no deficit'
        : value > policy.deficitMet
          ? `less than ${figure(-policy.deficitMet)} %`
          : 'inside noise';
  return found('lead-deficit', policy.deficitMet, {
    verdict: strong ? 'strong' : met ? 'met' : 'not met',
    points: strong ? 2 : met ? 1 : 0,
    value,
    standardError,
    interval90,
    reason: `${size} (${intervalText(interval90, ' %')}): ${because}.`,
  });
}
