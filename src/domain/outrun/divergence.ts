import { cannotSay, found, type Criterion } from '#src/domain/outrun/criterion.ts';
import { divergenceRaw } from '#src/domain/outrun/divergenceRaw.ts';
import { figure, intervalText } from '#src/domain/outrun/figure.ts';
import type { Day, OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import type { OutrunPolicy } from '#src/domain/outrun/policy.ts';
import { median } from '#src/domain/statistics/median.ts';
import { requireFiniteList } from '#src/domain/statistics/requireFiniteList.ts';
import { Z90 } from '#src/domain/statistics/z90.ts';

/**
 * Divergence (comparing): carry ahead of growth and strength. `G = raw − median raw of the others` (if there are
 * `minOthersGain`, else 0), `SE = pairNoisePct·√(1/2 + 1/n_earlier)`. Met: G ≥ `gainMet`. Strong: G ≥ `gainStrong`.
 *
 * Source: our own rule, no published cut-off. The points here are those before `reduceByDemand`.
 *
 * @param asOf date of the judgement; default the newest day of the pairs
 * @returns per cent of carry (log scale)
 * @throws {RangeError} if a figure is negative or not finite, or a day no day
 */
export function divergence(block: OutrunInput['divergence'], policy: OutrunPolicy, asOf?: Day): Criterion {
  const cannot = (reason: string) => cannotSay('divergence', policy.gainMet, reason);
  if (!block) return cannot('No driver session with a strength test close by was given.');
  const { othersRaw = [] } = block;
  requireFiniteList('divergence', othersRaw, 0);
  const { raw, earlier, pairs, reason } = divergenceRaw(block.pairs, policy, block.asOf ?? asOf);
  if (raw === null) return cannot(reason);

  const compared = othersRaw.length >= Math.max(1, policy.minOthersGain);
  const value = raw - (compared ? median(othersRaw) : 0);
  const standardError = policy.pairNoisePct * Math.sqrt(1 / 2 + 1 / earlier);
  const interval90: [number, number] = [value - Z90 * standardError, value + Z90 * standardError];
  const met = value >= policy.gainMet;
  const strong = met && value >= policy.gainStrong;
  const against = compared ? `, against the median of ${othersRaw.length} others` : '';
  const where = value < 0 ? 'behind' : 'ahead of';
  const line = strong ? policy.gainStrong : policy.gainMet;
  return found('divergence', policy.gainMet, {
    verdict: strong ? 'strong' : met ? 'met' : 'not met',
    points: strong ? 2 : met ? 1 : 0,
    value,
    standardError,
    interval90,
    reason:
      `The newest two carries are ${figure(Math.abs(value))} % ${where} what growth and strength explain ` +
      `(${intervalText(interval90, ' %')}; ${pairs.length} sessions${against}): ` +
      `${met ? `${figure(line)} % or more` : `less than ${figure(line)} %`}.`,
  });
}

/**
 * Divergence after a measured demand: where the swing was measured and does not ask more than the leg can give,
 * divergence counts one point less (not below 0). Its verdict keeps its word; the reason says so.
 */
export function reduceByDemand(criterion: Criterion, demand: Criterion): Criterion {
  if (demand.verdict !== 'not met' || criterion.points === 0) return criterion;
  const note = 'One point less, since the measured demand of the swing is not over the leg’s capacity.';
  return { ...criterion, points: criterion.points - 1, reason: `${criterion.reason} ${note}` };
}
