import type { Criterion, CriterionName } from '#src/domain/outrun/criterion.ts';
import type { OutrunPolicy } from '#src/domain/outrun/policy.ts';

/** The two levels of an outrun; Look asks for a talk, Act for a Route within a week. */
export type OutrunLevel = 'look' | 'act';

/** Level, points and gate of one judgement; `reason` says why there is no level. */
export interface LevelResult {
  level: OutrunLevel | null;
  points: number;
  gate: boolean;
  reason: string | null;
}

/** Points from which a strong deficit beside a comparing criterion worth two gives Act, fixed for this rule. */
const ACT_WITH_STRONG_DEFICIT = 4;
const MOST_POINTS_AT_CLEARING = 1;

/**
 * The level from the criteria, divergence already reduced. Gate: a lead deficit and a comparing criterion that still
 * has a point; a deficit alone, or with a style, raises nothing. Look: gate and `look` points. Act: gate and `act`
 * points, or 4 (and never fewer than `look`) with the deficit strong and a comparing criterion worth 2.
 *
 * Source: our own rule, no published cut-off.
 */
export function levelOf(criteria: readonly Criterion[], policy: OutrunPolicy): LevelResult {
  const pointsOf = (name: CriterionName) => criteria.find((criterion) => criterion.name === name)?.points ?? 0;
  const deficit = pointsOf('lead-deficit');
  const comparing = Math.max(pointsOf('divergence'), pointsOf('demand'));
  const points = deficit + pointsOf('divergence') + pointsOf('demand') + pointsOf('late-return');
  const gate = deficit >= 1 && comparing >= 1;
  const strong = criteria.some(({ name, verdict }) => name === 'lead-deficit' && verdict === 'strong');
  const soonerAct = strong && comparing >= 2 && points >= Math.max(ACT_WITH_STRONG_DEFICIT, policy.look);
  const act = gate && (points >= policy.act || soonerAct);
  const look = gate && points >= policy.look;
  const level = act ? 'act' : look ? 'look' : null;
  return { level, points, gate, reason: level ? null : reasonForNone(deficit, gate, points, policy) };
}

/**
 * Whether a judgement is one of the two that a clearing needs: no level and at most one point.
 */
export function isClear({ level, points }: { level: OutrunLevel | null; points: number }): boolean {
  return level === null && points <= MOST_POINTS_AT_CLEARING;
}

function reasonForNone(deficit: number, gate: boolean, points: number, policy: OutrunPolicy): string {
  if (gate) return `No level: ${points} ${points === 1 ? 'point' : 'points'}, ${policy.look} are needed for Look.`;
  if (deficit >= 1) return 'No level: a lead deficit alone, or with a style of swing, raises nothing.';
  return 'No level: without a lead deficit beyond noise nothing is raised.';
}
