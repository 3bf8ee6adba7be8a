import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** Ball and club speed in one unit. */
export interface SpeedRatioInput {
  ballSpeed: number;
  clubSpeed: number;
}

/** Ball speed over club speed; null with a reason where the club does not move. */
export interface SpeedRatio {
  ratio: number | null;
  plausible: boolean | null;
  reason: string | null;
}

/** Lowest and highest ratio taken for a real driver shot, both included. Our own; no published source. */
export const PLAUSIBLE_SPEED_RATIO = { lowest: 1.1, highest: 1.52 };

/** A ratio of two decimal readings may miss a bound by the last binary digit. */
const ROUNDING = 1e-12;

/**
 * Ratio of ball speed to club speed. Outside 1.1 to 1.52 the reading is more likely wrong than the shot.
 *
 * Source: the ratio is common practice, no source; the range is our own.
 *
 * @param input speeds ≥ 0, one unit
 * @throws {RangeError} if a speed is negative or not finite
 * @example speedRatio({ ballSpeed: 176, clubSpeed: 120 }) // → ratio 1.466667, plausible
 */
export function speedRatio({ ballSpeed, clubSpeed }: SpeedRatioInput): SpeedRatio {
  requireFiniteNumber('speedRatio', 'ballSpeed', ballSpeed, { min: 0 });
  requireFiniteNumber('speedRatio', 'clubSpeed', clubSpeed, { min: 0 });
  if (clubSpeed === 0) return { ratio: null, plausible: null, reason: 'club speed is 0: no ratio' };
  const ratio = ballSpeed / clubSpeed;
  const { lowest, highest } = PLAUSIBLE_SPEED_RATIO;
  const plausible = ratio >= lowest - ROUNDING && ratio <= highest + ROUNDING;
  return { ratio, plausible, reason: plausible ? null : `outside ${lowest} to ${highest}: check both readings` };
}
