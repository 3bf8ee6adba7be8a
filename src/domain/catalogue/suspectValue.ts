/** A value to be looked at, the test's physical range and what the value is compared with, all in one unit. */
export interface SuspectInput {
  value: number;
  lowest: number;
  highest: number;
  /** Median of the athlete's earlier valid trials, else of the age band; null where there is neither. */
  reference: number | null;
}

/** `taken` counts; `asked` is kept and counts for nothing until a person says yes; `refused` is not kept. */
export interface SuspectVerdict {
  verdict: 'taken' | 'asked' | 'refused';
  /** Finishes the sentence "asked because …" or "refused because …"; null for a taken value. */
  reason: string | null;
}

export const LEAST_SHARE_OF_REFERENCE = 2 / 3;
export const GREATEST_SHARE_OF_REFERENCE = 3 / 2;
/** A shifted value may miss its reference by this factor and still be a slip of the decimal mark. */
const SLIP_FACTOR = 2;

/**
 * Whether a test value is taken, asked or refused. Ten times off (a slipped decimal mark, within the range once it is
 * moved) is asked, never refused; otherwise outside the physical range is refused, and inside it, outside ⅔ to 1½ of
 * the reference, is asked.
 *
 * Source: our own rule; no published source.
 *
 * @throws {RangeError} if the value is not finite
 * @example suspectValue({ value: 13540.7, lowest: 50, highest: 4000, reference: 1190 }).verdict // → 'asked'
 */
export function suspectValue({ value, lowest, highest, reference }: SuspectInput): SuspectVerdict {
  if (!Number.isFinite(value)) throw new RangeError(`suspectValue requires a finite value, got ${value}`);
  const inRange = (candidate: number) => candidate >= lowest && candidate <= highest;
  const slip = slipOf(value, reference, inRange);
  if (slip !== null) return { verdict: 'asked', reason: slip };
  if (!inRange(value)) return { verdict: 'refused', reason: 'outside what the test can give' };
  if (reference === null || reference <= 0) return { verdict: 'taken', reason: null };
  const share = value / reference;
  if (share >= LEAST_SHARE_OF_REFERENCE && share <= GREATEST_SHARE_OF_REFERENCE) {
    return { verdict: 'taken', reason: null };
  }
  return { verdict: 'asked', reason: `${share.toFixed(2)} times the median it is compared with` };
}

function slipOf(value: number, reference: number | null, inRange: (value: number) => boolean): string | null {
  for (const [shifted, words] of [
    [value / 10, 'ten times too high'],
    [value * 10, 'ten times too low'],
  ] as const) {
    if (!inRange(shifted)) continue;
    const share = reference !== null && reference > 0 ? shifted / reference : null;
    const fits = share !== null && share >= 1 / SLIP_FACTOR && share <= SLIP_FACTOR;
    if (fits) return `looks ${words}`;
    if (share === null && !inRange(value)) return `looks ${words}`;
  }
  return null;
}
