import { modelCarry } from '#src/domain/driver/modelCarry.ts';
import { PLAUSIBLE_SPEED_RATIO, speedRatio } from '#src/domain/driver/speedRatio.ts';
import { median } from '#src/domain/statistics/median.ts';
import { medianAbsoluteDeviation } from '#src/domain/statistics/medianAbsoluteDeviation.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** A measured shot: speeds in m/s, launch in degrees, spin in rpm, carry in m; null where not measured. */
export interface JudgedShot {
  ballSpeed: number;
  clubSpeed: number | null;
  launchDeg: number | null;
  spinRpm: number | null;
  carry: number;
}

/** One athlete's shots of one session, the air's density in kg/m³ and the wind in m/s, above 0 following. */
export interface ShotExclusionInput {
  shots: readonly JudgedShot[];
  density: number;
  wind?: number;
}

/** Why a shot is proposed for exclusion; a person decides. */
export interface ShotExclusion {
  rule: 'speed ratio' | 'short of the model' | 'far from the median';
  reason: string;
}

/** The shots in the order given, null for each that stays; `reason` says where the last rule could not judge. */
export interface ShotExclusionResult {
  shots: (ShotExclusion | null)[];
  reason: string | null;
}

/** Least carry taken for a struck shot, as a share of the modelled carry. Our own; no published source. */
export const LEAST_SHARE_OF_MODEL = 0.7;

/** Distance from the median, in scaled median absolute deviations, beyond which a carry is an outlier. */
export const FARTHEST_SCALED_MAD = 3.5;

/**
 * Proposes shots for exclusion, in this order: a speed ratio outside 1.1 to 1.52; a carry under 70 % of the modelled
 * carry in the session's air; and, among the shots left, a carry more than 3.5 scaled median absolute deviations
 * (× 1.4826) from their median. A rule that lacks its reading does not judge the shot.
 *
 * Source: the first two are our own; the third is common practice (3.5 after Iglewicz & Hoaglin 1993, from memory).
 *
 * @throws {RangeError} if there is no shot, or a number is not finite or out of range
 * @example shotExclusion({ shots, density: 1.2 }).shots // → [null, { rule: 'speed ratio', reason: '…' }, …]
 */
export function shotExclusion({ shots, density, wind = 0 }: ShotExclusionInput): ShotExclusionResult {
  if (shots.length === 0) throw new RangeError('shotExclusion requires at least one shot, got none');
  requireFiniteNumber('shotExclusion', 'density', density, { min: 0, max: 10 });
  requireFiniteNumber('shotExclusion', 'wind', wind, { min: -100, max: 100 });
  const judged = shots.map((shot) => bySpeedRatio(shot) ?? byModel(shot, { density, wind }));
  const carries = shots.flatMap(({ carry }, i) => (judged[i] === null ? [carry] : []));
  if (carries.length === 0) return { shots: judged, reason: 'no shot is left to compare with a median' };
  const centre = median(carries);
  const spread = medianAbsoluteDeviation(carries, { scaled: true });
  if (spread === 0) {
    const reason =
      carries.length === 1
        ? 'one shot is left: its distance from a median cannot be judged'
        : 'half of the carries or more are the same: their median absolute deviation is 0, so none is judged by it';
    return { shots: judged, reason };
  }
  return {
    shots: judged.map((exclusion, i) => exclusion ?? byMedian(shots[i]!.carry, centre, spread)),
    reason: null,
  };
}

function bySpeedRatio({ ballSpeed, clubSpeed }: JudgedShot): ShotExclusion | null {
  requireFiniteNumber('shotExclusion', 'ballSpeed', ballSpeed, { min: 0 });
  if (clubSpeed === null) return null;
  const { ratio, plausible } = speedRatio({ ballSpeed, clubSpeed });
  if (plausible === true) return null;
  const { lowest, highest } = PLAUSIBLE_SPEED_RATIO;
  const is = ratio === null ? 'cannot be worked out from a club speed of 0' : `is ${ratio.toFixed(2)}`;
  return {
    rule: 'speed ratio',
    reason: `ball speed over club speed ${is}; a real shot lies in ${lowest} to ${highest}`,
  };
}

function byModel(shot: JudgedShot, air: { density: number; wind: number }): ShotExclusion | null {
  const { ballSpeed, launchDeg, spinRpm, carry } = shot;
  requireFiniteNumber('shotExclusion', 'carry', carry, { min: 0 });
  if (launchDeg === null || spinRpm === null) return null;
  const modelled = modelCarry({ ballSpeed, launchDeg, spinRpm }, air);
  if (modelled === null || carry >= LEAST_SHARE_OF_MODEL * modelled) return null;
  const share = Math.floor((100 * carry) / modelled);
  const reason = `carry ${carry.toFixed(1)} m is ${share} % of the ${modelled.toFixed(1)} m that its launch would give`;
  return { rule: 'short of the model', reason };
}

function byMedian(carry: number, centre: number, spread: number): ShotExclusion | null {
  const distance = Math.abs(carry - centre) / spread;
  if (distance <= FARTHEST_SCALED_MAD) return null;
  const side = carry > centre ? 'above' : 'below';
  const reason = `carry ${carry.toFixed(1)} m is ${distance.toFixed(1)} scaled median deviations ${side} the session's median of ${centre.toFixed(1)} m`;
  return { rule: 'far from the median', reason };
}
