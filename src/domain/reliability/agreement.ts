/** The side found weaker in one test or session; `none` where there was no difference. */
export type Side = 'lead' | 'trail' | 'none';

/** Pairs of sides, one pair for each comparison of two tests or sessions. */
export interface AgreementInput {
  pairs: readonly (readonly [Side, Side])[];
}

/** The bands of Landis and Koch 1977. */
export type AgreementBand = 'poor' | 'slight' | 'fair' | 'moderate' | 'substantial' | 'almost perfect';

/** Shares 0 to 1; kappa and its band are null where chance alone gives full agreement. */
export interface Agreement {
  observed: number;
  expected: number;
  kappa: number | null;
  band: AgreementBand | null;
  reason: string | null;
}

const SIDES = ['lead', 'trail', 'none'] as const;

/**
 * Agreement on direction beyond chance: Cohen's kappa, `(observed − expected)/(1 − expected)`.
 * Counted in whole numbers until the last division, so that a value on the edge of a band stays in it.
 *
 * Source: Cohen 1960; bands Landis & Koch 1977 (from memory).
 *
 * @param input at least one pair
 * @throws {RangeError} if there is no pair or a side is unknown
 * @example 20 lead/lead, 5 lead/trail, 10 trail/lead, 15 trail/trail // → kappa 0.4
 */
export function agreement({ pairs }: AgreementInput): Agreement {
  const n = pairs.length;
  if (n === 0) throw new RangeError('agreement requires at least one pair, got 0');
  const first = { lead: 0, trail: 0, none: 0 };
  const second = { lead: 0, trail: 0, none: 0 };
  let same = 0;
  for (const [one, other] of pairs) {
    if (!SIDES.includes(one) || !SIDES.includes(other)) {
      throw new RangeError(`agreement requires lead, trail or none, got ${one} and ${other}`);
    }
    first[one] += 1;
    second[other] += 1;
    if (one === other) same += 1;
  }
  const byChance = SIDES.reduce((sum, side) => sum + first[side] * second[side], 0);
  const common = { observed: same / n, expected: byChance / (n * n) };
  if (byChance === n * n) {
    return { ...common, kappa: null, band: null, reason: 'every pair is in one cell: kappa is undefined' };
  }
  const kappa = (n * same - byChance) / (n * n - byChance);
  return { ...common, kappa, band: bandOf(kappa), reason: null };
}

function bandOf(kappa: number): AgreementBand {
  if (kappa < 0) return 'poor';
  if (kappa <= 0.2) return 'slight';
  if (kappa <= 0.4) return 'fair';
  if (kappa <= 0.6) return 'moderate';
  if (kappa <= 0.8) return 'substantial';
  return 'almost perfect';
}
