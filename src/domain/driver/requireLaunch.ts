import type { Launch } from '#src/domain/driver/flyToLanding.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/**
 * Guards a launch: ball speed 0 to 150 m/s, launch −90 to 90 degrees, spin 0 to 20 000 rpm. Beyond these the model has
 * no meaning and its steps no accuracy.
 *
 * @param caller name of the guarded function, for the message
 * @throws {RangeError} if a number is not finite or out of its range
 * @example requireLaunch('flight', { ballSpeed: 60, launchDeg: 12, spinRpm: 2800 })
 */
export function requireLaunch(caller: string, { ballSpeed, launchDeg, spinRpm }: Launch): void {
  requireFiniteNumber(caller, 'ballSpeed', ballSpeed, { min: 0, max: 150 });
  requireFiniteNumber(caller, 'launchDeg', launchDeg, { min: -90, max: 90 });
  requireFiniteNumber(caller, 'spinRpm', spinRpm, { min: 0, max: 20_000 });
}
