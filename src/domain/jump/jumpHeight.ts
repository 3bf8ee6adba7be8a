import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** Either the flight time (s) or the take-off velocity (m/s); `g` in m/s², `timeToTakeoff` in s. */
export type JumpHeightInput = ({ flightTime: number } | { takeoffVelocity: number }) & {
  /** default 9.81 */
  g?: number;
  /** from onset to take-off, for the modified reactive strength index */
  timeToTakeoff?: number;
};

/** Height in m, velocity in m/s, time in s; `rsiMod` in m/s, null where no time to take-off was given. */
export interface JumpHeight {
  height: number;
  takeoffVelocity: number;
  flightTime: number;
  rsiMod: number | null;
  reason: string | null;
}

/**
 * Jump height from flight time, `h = g·t²/8` (same posture at take-off and landing), or from take-off velocity,
 * `h = v²/2g`; and the modified reactive strength index, height over time to take-off.
 * Height by flight time exceeds height by impulse by 1 to 2 cm in a countermovement jump.
 *
 * Source: closed form; index as in McMahon et al. 2018, Strength Cond J 40(4):96–106.
 *
 * @param input exactly one of `flightTime` and `takeoffVelocity`, ≥ 0; `g` and `timeToTakeoff` above 0
 * @throws {RangeError} if both or neither is given, or a number is out of range
 * @example jumpHeight({ flightTime: 0.5 }).height // → 0.3065625
 */
export function jumpHeight(input: JumpHeightInput): JumpHeight {
  const { g = 9.81, timeToTakeoff } = input;
  requireFiniteNumber('jumpHeight', 'g', g, { above: 0 });
  if (timeToTakeoff !== undefined) requireFiniteNumber('jumpHeight', 'timeToTakeoff', timeToTakeoff, { above: 0 });
  const { takeoffVelocity, flightTime } = completed(input, g);
  const height = takeoffVelocity ** 2 / (2 * g);
  const rsiMod = timeToTakeoff === undefined ? null : height / timeToTakeoff;
  return { height, takeoffVelocity, flightTime, rsiMod, reason: null };
}

function completed(input: JumpHeightInput, g: number): { takeoffVelocity: number; flightTime: number } {
  const flightTime = 'flightTime' in input ? input.flightTime : undefined;
  const takeoffVelocity = 'takeoffVelocity' in input ? input.takeoffVelocity : undefined;
  if (flightTime !== undefined && takeoffVelocity === undefined) {
    requireFiniteNumber('jumpHeight', 'flightTime', flightTime, { min: 0 });
    return { flightTime, takeoffVelocity: (g * flightTime) / 2 };
  }
  if (takeoffVelocity !== undefined && flightTime === undefined) {
    requireFiniteNumber('jumpHeight', 'takeoffVelocity', takeoffVelocity, { min: 0 });
    return { takeoffVelocity, flightTime: (2 * takeoffVelocity) / g };
  }
  throw new RangeError('jumpHeight requires exactly one of flightTime and takeoffVelocity');
}
