import type { LegSummary } from '#src/domain/asymmetry/legSummary.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';
import { tQuantile } from '#src/domain/statistics/tQuantile.ts';
import { Z90 } from '#src/domain/statistics/z90.ts';

/** Where the noise of a leg's mean comes from: a typical error between days, one CV for both legs, or the trials. */
export type NoiseSource = { typicalErrorPct: number | { lead: number; trail: number } } | { cvPct: number } | 'trials';

/** Standard error of the difference and the half-width of its 90 % interval, in per cent points. */
export interface DifferenceNoise {
  standardErrorPct: number | null;
  halfWidthPct: number | null;
  reason: string | null;
}

/**
 * Noise of the signed difference in per cent, by propagation of each leg's relative error:
 * `SE = (min/max)·√(e_lead² + e_trail²)`, where e is the relative error of a leg's mean in per cent.
 * - `{typicalErrorPct}`: e = the typical error between days; normal interval.
 * - `{cvPct}`: e = CV/√n; normal interval.
 * - `'trials'`: e = own CV/√n; t interval with Welch–Satterthwaite degrees of freedom of the two squares.
 *
 * @param lead  the lead leg's trials in brief
 * @param trail the trail leg's trials in brief
 * @param noise the source of the noise; percentages ≥ 0
 * @throws {RangeError} if a percentage is negative or not finite
 */
export function differenceNoise(lead: LegSummary, trail: LegSummary, noise: NoiseSource): DifferenceNoise {
  const none = (reason: string): DifferenceNoise => ({ standardErrorPct: null, halfWidthPct: null, reason });
  const ratio = Math.min(lead.mean, trail.mean) / Math.max(lead.mean, trail.mean);

  if (noise === 'trials') {
    if (lead.n < 2 || trail.n < 2) return none('fewer than two trials in a leg: its spread is unknown');
    if (lead.cvPct === null || trail.cvPct === null) return none('one leg is 0: a relative error is undefined there');
    const leadSquare = lead.cvPct ** 2 / lead.n;
    const trailSquare = trail.cvPct ** 2 / trail.n;
    const sum = leadSquare + trailSquare;
    if (sum === 0)
      return { ...none('the trials of each leg are all alike: no spread to judge by'), standardErrorPct: 0 };
    const standardErrorPct = ratio * Math.sqrt(sum);
    // shares instead of raw squares: a tiny spread would underflow in the fourth power
    const leadShare = leadSquare / sum;
    const trailShare = trailSquare / sum;
    const df = 1 / (leadShare ** 2 / (lead.n - 1) + trailShare ** 2 / (trail.n - 1));
    return { standardErrorPct, halfWidthPct: tQuantile(0.95, df) * standardErrorPct, reason: null };
  }

  let errors: { lead: number; trail: number };
  if ('cvPct' in noise) {
    requireFiniteNumber('differenceNoise', 'cvPct', noise.cvPct, { min: 0 });
    errors = { lead: noise.cvPct / Math.sqrt(lead.n), trail: noise.cvPct / Math.sqrt(trail.n) };
  } else {
    const given = noise.typicalErrorPct;
    errors = typeof given === 'number' ? { lead: given, trail: given } : given;
    requireFiniteNumber('differenceNoise', 'typicalErrorPct', errors.lead, { min: 0 });
    requireFiniteNumber('differenceNoise', 'typicalErrorPct', errors.trail, { min: 0 });
  }
  if (ratio === 0) return none('one leg is 0: a relative error is undefined there');
  const standardErrorPct = ratio * Math.hypot(errors.lead, errors.trail);
  return { standardErrorPct, halfWidthPct: Z90 * standardErrorPct, reason: null };
}
