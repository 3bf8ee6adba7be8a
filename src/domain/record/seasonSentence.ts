import { Z90 } from '#src/domain/statistics/z90.ts';

/** A value with half of its 90 % interval. */
interface Measured {
  value: number;
  half: number;
}

export interface SeasonFacts {
  /** Standard carry of the first and the newest session, m. */
  carry: { first: Measured; last: Measured; since: string } | null;
  /** Lead push per kilogram at the first and the newest test, N/kg. */
  leadPush: { first: Measured; last: Measured } | null;
  /** Lead minus trail of each capacity test at the newest test, % with half of its 90 % interval. */
  differences: readonly Measured[];
  /** Whether some test shows the same weaker lead side at its two newest counted sessions. */
  sameSideTwice: boolean;
}

/**
 * The season in two sentences for coaches. Nothing is called a change or a difference inside its noise: a change
 * counts when its 90 % interval, `√(half₁² + half₂²)` wide to each side, leaves out 0.
 *
 * @returns plain text, never empty
 */
export function seasonSentence({ carry, leadPush, differences, sameSideTwice }: SeasonFacts): string {
  return [aboutCarry(carry, leadPush), aboutLegs(differences, sameSideTwice)].filter(Boolean).join(' ');
}

function change({ first, last }: { first: Measured; last: Measured }): Measured & { real: boolean } {
  const value = last.value - first.value;
  const half = Math.hypot(first.half, last.half);
  return { value, half, real: Math.abs(value) > half };
}

function aboutCarry(carry: SeasonFacts['carry'], leadPush: SeasonFacts['leadPush']): string {
  const push = leadPush ? aboutPush(leadPush) : '';
  if (!carry)
    return push
      ? `There is no driver session to set beside the tests yet; ${push}.`
      : 'There is no driver session yet.';
  const moved = change(carry);
  const metres = `${Math.abs(moved.value).toFixed(0)} ± ${moved.half.toFixed(0)} m`;
  const what = moved.real
    ? `Carry has ${moved.value > 0 ? 'grown' : 'fallen'} ${metres} since ${carry.since}`
    : `Carry has not changed beyond its noise since ${carry.since}`;
  return push ? `${what}; ${push}.` : `${what}.`;
}

function aboutPush(leadPush: NonNullable<SeasonFacts['leadPush']>): string {
  const moved = change(leadPush);
  if (!moved.real) return 'the lead leg’s push per kilogram has stayed level within its noise';
  const share = (100 * Math.abs(moved.value)) / leadPush.first.value;
  return `the lead leg’s push per kilogram has ${moved.value > 0 ? 'risen' : 'fallen'} ${share.toFixed(0)} %`;
}

function aboutLegs(differences: readonly Measured[], sameSideTwice: boolean): string {
  if (differences.length === 0) return 'The legs have not been compared yet.';
  // Inverse-variance weights: the test with less noise says more.
  const weights = differences.map(({ half }) => (Z90 / half) ** 2);
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  const pooled = differences.reduce((sum, { value }, i) => sum + value * weights[i]!, 0) / total;
  const half = Z90 / Math.sqrt(total);
  if (Math.abs(pooled) <= half) return 'At the newest test no difference between the legs stands beyond its noise.';
  const side = pooled < 0 ? 'weaker' : 'stronger';
  const twice = sameSideTwice && pooled < 0 ? ', the same side twice' : '';
  return `Over the newest tests the lead leg is ${Math.abs(pooled).toFixed(0)} ± ${half.toFixed(0)} % ${side} than the trail${twice}.`;
}
