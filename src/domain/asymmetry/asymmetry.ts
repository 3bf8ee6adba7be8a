import { differenceNoise, type NoiseSource } from '#src/domain/asymmetry/differenceNoise.ts';
import { differencePercent, type Better } from '#src/domain/asymmetry/differencePercent.ts';
import { indices, type AsymmetryIndices } from '#src/domain/asymmetry/indices.ts';
import { legSummary, type LegSummary } from '#src/domain/asymmetry/legSummary.ts';

/** Trials of both legs in one unit, each ≥ 0. */
export interface AsymmetryInput {
  lead: readonly number[];
  trail: readonly number[];
  /** default `higher` */
  better?: Better;
  /** default `trials` */
  noise?: NoiseSource;
}

/** Percentages are signed so that negative = lead weaker; null where a value cannot be given, with the reason. */
export interface Asymmetry {
  lead: LegSummary;
  trail: LegSummary;
  differencePct: number | null;
  differencePctOfBest: number | null;
  standardErrorPct: number | null;
  interval90Pct: [number, number] | null;
  largerCvPct: number | null;
  beyondNoise: boolean | null;
  weakerSide: 'lead' | 'trail' | null;
  indices: AsymmetryIndices;
  reason: string | null;
}

/**
 * Difference between the legs of one test with its noise: means, the signed difference in per cent of the larger
 * mean, its 90 % interval, whether that excludes 0, and the published indices of the two means.
 *
 * The decision uses an interval because a difference counts only outside the variability of the limbs
 * (Exell et al. 2012, J Biomech 45:1108–11). No fixed cut is used.
 *
 * @param input trials of both legs, which way the test improves, the source of the noise
 * @throws {RangeError} if a leg has no trial, or a value is negative or not finite
 * @example asymmetry({ lead: [500], trail: [560], noise: { typicalErrorPct: 3.403430 } }).differencePct // → −10.714286
 */
export function asymmetry({ lead, trail, better = 'higher', noise = 'trials' }: AsymmetryInput): Asymmetry {
  const leadLeg = legSummary(lead, better);
  const trailLeg = legSummary(trail, better);
  const differencePct = differencePercent(leadLeg.mean, trailLeg.mean, better);
  const bothKnown = leadLeg.cvPct !== null && trailLeg.cvPct !== null;
  const common = {
    lead: leadLeg,
    trail: trailLeg,
    differencePct,
    differencePctOfBest: differencePercent(leadLeg.best, trailLeg.best, better),
    largerCvPct: bothKnown ? Math.max(leadLeg.cvPct!, trailLeg.cvPct!) : null,
    weakerSide: weakerOf(leadLeg.mean, trailLeg.mean, better),
    indices: indices(leadLeg.mean, trailLeg.mean, better),
  };
  if (differencePct === null) {
    const reason = 'both legs are 0: a difference in per cent is undefined';
    return { ...common, standardErrorPct: null, interval90Pct: null, beyondNoise: null, reason };
  }
  const { standardErrorPct, halfWidthPct, reason } = differenceNoise(leadLeg, trailLeg, noise);
  if (halfWidthPct === null) return { ...common, standardErrorPct, interval90Pct: null, beyondNoise: null, reason };
  const interval90Pct: [number, number] = [differencePct - halfWidthPct, differencePct + halfWidthPct];
  const beyondNoise = interval90Pct[0] > 0 || interval90Pct[1] < 0;
  return { ...common, standardErrorPct, interval90Pct, beyondNoise, reason };
}

function weakerOf(lead: number, trail: number, better: Better): 'lead' | 'trail' | null {
  if (lead === trail) return null;
  return lead < trail === (better === 'higher') ? 'lead' : 'trail';
}
