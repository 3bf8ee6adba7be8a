import type { FlightAir } from '#src/domain/driver/ballFlight.ts';
import { flyToLanding } from '#src/domain/driver/flyToLanding.ts';
import type { Launch } from '#src/domain/driver/flyToLanding.ts';
import { requireLaunch } from '#src/domain/driver/requireLaunch.ts';
import { SMITS_SMITH } from '#src/domain/driver/smitsSmith.ts';

/**
 * Carry of the flight model alone, without a path.
 *
 * Source: SCIENCE §7, as `flight`.
 *
 * @param launch ball speed in m/s, launch in degrees, spin in rpm
 * @param air    density in kg/m³, wind in m/s, above 0 following
 * @returns m, or null where the ball never rises or is blown back behind the tee
 * @throws {RangeError} if the launch is out of range
 * @example modelCarry({ ballSpeed: 78.67904, launchDeg: 10, spinRpm: 2520 }, { density: 1.194, wind: 0 }) // → 240.35
 */
export function modelCarry(launch: Launch, air: FlightAir): number | null {
  requireLaunch('modelCarry', launch);
  const carry = flyToLanding(launch, SMITS_SMITH, air)?.carry ?? null;
  return carry !== null && carry > 0 ? carry : null;
}
