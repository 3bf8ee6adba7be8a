import type { FlightCoefficients } from '#src/domain/driver/ballFlight.ts';
import { flyToLanding } from '#src/domain/driver/flyToLanding.ts';
import { requireLaunch } from '#src/domain/driver/requireLaunch.ts';
import { SMITS_SMITH } from '#src/domain/driver/smitsSmith.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** Which drag and lift the flight uses: the fitted ones, or two constants given with the request. */
export type FlightModelName = 'smits-smith' | 'constant';

/**
 * Ball speed in m/s, launch in degrees, spin in rpm, air density in kg/m³, wind in m/s (above 0 following). `cd` and
 * `cl` belong to the model `constant`, which needs both.
 */
export interface FlightInput {
  ballSpeed: number;
  launchDeg: number;
  spinRpm: number;
  density?: number;
  wind?: number;
  model?: FlightModelName;
  cd?: number;
  cl?: number;
}

/** Carry and apex in m, time in s, angle of descent in degrees below the level, speed in m/s, path as [x, y] in m. */
export interface FlightResult {
  carry: number | null;
  time: number | null;
  apex: number | null;
  landingDeg: number | null;
  landingSpeed: number | null;
  path: [number, number][];
  reason: string | null;
}

/** Density of the air where none is given, kg/m³: 70 °F, 50 % humidity, sea level. */
const DEFAULT_DENSITY = 1.194;
const STEPS_A_PATH_POINT = 10;

/**
 * The flight of a golf ball over level ground. A model for comparing conditions and club set-ups, not for predicting a
 * junior's carry: balls and models differ by ±10 %.
 *
 * Source: SCIENCE §7 (Penner 2001 with the coefficients of Smits & Smith 1994).
 *
 * @returns the landing and the path, a point every 0.02 s; null with a reason where the ball never rises
 * @throws {RangeError} if a number is not finite or out of range, or `constant` lacks `cd` or `cl`
 * @example flight({ ballSpeed: 78.67904, launchDeg: 10, spinRpm: 2520 }).carry // → 240.35
 */
export function flight(input: FlightInput): FlightResult {
  const { density = DEFAULT_DENSITY, wind = 0 } = input;
  requireLaunch('flight', input);
  requireFiniteNumber('flight', 'density', density, { min: 0, max: 10 });
  requireFiniteNumber('flight', 'wind', wind, { min: -100, max: 100 });
  const path: [number, number][] = [];
  let step = 0;
  const landing = flyToLanding(
    input,
    coefficientsOf(input),
    { density, wind },
    {
      onStep: ({ x, y }) => {
        if (step % STEPS_A_PATH_POINT === 0) path.push([x, y]);
        step += 1;
      },
    },
  );
  if (landing === null) {
    const reason = 'the ball does not rise from the ground, or has not come down after a minute: no carry';
    return { carry: null, time: null, apex: null, landingDeg: null, landingSpeed: null, path: [], reason };
  }
  const { carry, time, apex, ball } = landing;
  path.push([carry, 0]);
  const landingDeg = (Math.atan2(-ball.vy, ball.vx) * 180) / Math.PI;
  return { carry, time, apex, landingDeg, landingSpeed: Math.hypot(ball.vx, ball.vy), path, reason: null };
}

function coefficientsOf({ model = 'smits-smith', cd, cl }: FlightInput): FlightCoefficients {
  if (model === 'smits-smith') return SMITS_SMITH;
  if (cd === undefined || cl === undefined) throw new RangeError('flight requires cd and cl with the constant model');
  requireFiniteNumber('flight', 'cd', cd, { min: 0, max: 10 });
  requireFiniteNumber('flight', 'cl', cl, { min: -10, max: 10 });
  return { drag: () => cd, lift: () => cl, spinDecays: false, viscosity: SMITS_SMITH.viscosity };
}
