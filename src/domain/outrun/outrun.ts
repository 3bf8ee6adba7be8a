import { clearsWhen } from '#src/domain/outrun/clearsWhen.ts';
import type { Criterion } from '#src/domain/outrun/criterion.ts';
import { falseAlarms } from '#src/domain/outrun/falseAlarms.ts';
import { judgeCriteria } from '#src/domain/outrun/judgeCriteria.ts';
import type { OutrunLevel } from '#src/domain/outrun/level.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import type { OutrunPolicy } from '#src/domain/outrun/policy.ts';

/** One criterion of a judgement. */
export type OutrunCriterion = Criterion;

/** A judgement: level, points, the eight criteria in order, what would clear it, what to rule out. */
export interface OutrunResult {
  level: OutrunLevel | null;
  points: number;
  gate: boolean;
  criteria: OutrunCriterion[];
  clearsWhen: string[];
  falseAlarms: string[];
  policy: OutrunPolicy;
  /** why there is no level; null where there is one */
  reason: string | null;
}

/**
 * The outrun rule: does the driver strategy outrun the lead side's strength? Points of lead deficit, divergence,
 * demand and late return, a gate that asks for a deficit and a comparing criterion, and two levels.
 *
 * Source: our own rule on published sources, tuned on a simulated academy; no published cut-off exists.
 *
 * @param input summaries; a block left out makes its criterion "cannot say"
 * @throws {RangeError} if a figure of any block is out of range
 * @example outrun({ leadDeficit: { values: [] } }).level // → null
 */
export function outrun(input: OutrunInput): OutrunResult {
  const { level, points, gate, criteria, policy, reason } = judgeCriteria(input);
  return {
    level,
    points,
    gate,
    criteria,
    clearsWhen: clearsWhen(input),
    falseAlarms: falseAlarms(criteria, level),
    policy,
    reason,
  };
}
