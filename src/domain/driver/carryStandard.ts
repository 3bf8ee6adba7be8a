import { airDensity } from '#src/domain/driver/airDensity.ts';
import type { AirDensityInput } from '#src/domain/driver/airDensity.ts';
import { modelCarry } from '#src/domain/driver/modelCarry.ts';
import { median } from '#src/domain/statistics/median.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** A measured shot: m/s, degrees, rpm, m. Launch and spin may be unknown: null or left out. */
export interface CarryShot {
  ballSpeed: number;
  launchDeg?: number | null;
  spinRpm?: number | null;
  carry: number;
}

/** The air of the session as `airDensity` takes it, and the wind in m/s, above 0 following. */
export interface CarryConditions extends AirDensityInput {
  wind?: number;
}

/** Shots of one session and its conditions. */
export interface CarryStandardInput {
  shots: readonly CarryShot[];
  conditions: CarryConditions;
}

/** Carry at standard conditions in m and the factor that led there; null with a reason where it cannot be given. */
export interface StandardisedShot {
  carryStandard: number | null;
  adjustment: number | null;
  reason: string | null;
}

/** The shots in the order given, the median of all measured carries and of all standard ones, m. */
export interface CarryStandardResult {
  shots: StandardisedShot[];
  median: number;
  medianStandard: number | null;
  reason: string | null;
}

/** Standard conditions: 20 °C, 101 325 Pa, 50 % humidity, no wind. */
const STANDARD_TEMPERATURE_C = 20;

/**
 * Carries as they would have been at 20 °C, 101 325 Pa, 50 % humidity and no wind: measured carry × modelled carry at
 * standard ÷ modelled carry at the conditions. The model's own error largely cancels in the ratio.
 *
 * Source: our own use of the flight model of SCIENCE §7. Cold balls and clothes are not in it.
 *
 * @throws {RangeError} if there is no shot, or a number is not finite or out of range
 * @example carryStandard({ shots: [{ ballSpeed: 58, launchDeg: 12, spinRpm: 2800, carry: 180 }],
 *   conditions: { temperatureC: 5 } }).shots[0]?.adjustment // → above 1: cold air holds the ball back
 */
export function carryStandard({ shots, conditions }: CarryStandardInput): CarryStandardResult {
  return standardSession(shots, standardShots({ shots, conditions }));
}

/**
 * The shots alone, in the order given; for callers that take many shots in parts, with `standardSession` at the end.
 *
 * @throws {RangeError} as `carryStandard`
 */
export function standardShots({ shots, conditions }: CarryStandardInput): StandardisedShot[] {
  if (shots.length === 0) throw new RangeError('carryStandard requires at least one shot, got none');
  const { wind = 0, ...air } = conditions;
  requireFiniteNumber('carryStandard', 'wind', wind, { min: -100, max: 100 });
  const here = { density: airDensity(air).density, wind };
  const standard = { density: airDensity({ temperatureC: STANDARD_TEMPERATURE_C }).density, wind: 0 };
  return shots.map((shot) => standardise(shot, here, standard));
}

/** The session that shots and their standardised ones make: both medians, and how many shots were left. */
export function standardSession(
  shots: readonly CarryShot[],
  standardised: readonly StandardisedShot[],
): CarryStandardResult {
  const carries = standardised.flatMap(({ carryStandard: carry }) => (carry === null ? [] : [carry]));
  const left = shots.length - carries.length;
  return {
    shots: [...standardised],
    median: median(shots.map(({ carry }) => carry)),
    medianStandard: carries.length === 0 ? null : median(carries),
    reason: left === 0 ? null : `${left} of ${shots.length} shots without a carry at standard conditions`,
  };
}

type Air = Parameters<typeof modelCarry>[1];

function standardise({ ballSpeed, launchDeg, spinRpm, carry }: CarryShot, here: Air, standard: Air): StandardisedShot {
  requireFiniteNumber('carryStandard', 'carry', carry, { min: 0 });
  requireFiniteNumber('carryStandard', 'ballSpeed', ballSpeed, { min: 0 });
  if (launchDeg === undefined || launchDeg === null || spinRpm === undefined || spinRpm === null) {
    return { carryStandard: null, adjustment: null, reason: 'launch or spin is not known' };
  }
  const launch = { ballSpeed, launchDeg, spinRpm };
  const modelHere = modelCarry(launch, here);
  const modelStandard = modelHere === null ? null : modelCarry(launch, standard);
  if (modelHere === null || modelStandard === null) {
    return { carryStandard: null, adjustment: null, reason: 'the model gives this launch no carry' };
  }
  const adjustment = modelStandard / modelHere;
  return { carryStandard: carry * adjustment, adjustment, reason: null };
}
