import { aheadOfStrength } from '#src/domain/outrun/aheadOfStrength.ts';
import { contextCriterion } from '#src/domain/outrun/contextCriterion.ts';
import type { Criterion } from '#src/domain/outrun/criterion.ts';
import { delivery } from '#src/domain/outrun/delivery.ts';
import { demand } from '#src/domain/outrun/demand.ts';
import { divergence, reduceByDemand } from '#src/domain/outrun/divergence.ts';
import { latePeak } from '#src/domain/outrun/latePeak.ts';
import { lateReturn } from '#src/domain/outrun/lateReturn.ts';
import { leadDeficit } from '#src/domain/outrun/leadDeficit.ts';
import { levelOf, type LevelResult } from '#src/domain/outrun/level.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import { fullPolicy, type OutrunPolicy } from '#src/domain/outrun/policy.ts';

/** The eight criteria in their fixed order with the level that follows. */
export interface Judged extends LevelResult {
  criteria: Criterion[];
  policy: OutrunPolicy;
}

/**
 * Judges the summaries: all eight criteria, then points, gate and level. `outrun` adds what would clear it.
 *
 * @throws {RangeError} if a figure of any block is out of range
 */
export function judgeCriteria(input: OutrunInput): Judged {
  const policy = fullPolicy(input.policy);
  const measuredDemand = demand(input.demand, policy);
  const criteria = [
    leadDeficit(input.leadDeficit, policy),
    reduceByDemand(divergence(input.divergence, policy, input.asOf), measuredDemand),
    measuredDemand,
    lateReturn(input.lateReturn, policy),
    aheadOfStrength(input.aheadOfStrength),
    latePeak(input.latePeak),
    delivery(input.delivery),
    contextCriterion(input.context),
  ];
  return { criteria, policy, ...levelOf(criteria, policy) };
}
