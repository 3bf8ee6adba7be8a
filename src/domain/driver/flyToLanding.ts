import { ballFlight } from '#src/domain/driver/ballFlight.ts';
import type { BallState, FlightAir, FlightCoefficients } from '#src/domain/driver/ballFlight.ts';

/** Ball speed in m/s, launch angle in degrees above the ground, back spin in revolutions a minute. */
export interface Launch {
  ballSpeed: number;
  launchDeg: number;
  spinRpm: number;
}

/** Where and how the ball comes down: m, s, m, and the state at that moment. */
export interface Landing {
  carry: number;
  time: number;
  apex: number;
  ball: BallState;
}

/** Options of `flyToLanding`; `onStep` sees the ball every step. */
export interface FlyOptions {
  stepS?: number;
  onStep?: (ball: BallState) => void;
}

const STEP_S = 0.002;
const LONGEST_S = 60;

/**
 * Flies a ball from the ground until it comes back to the ground's level, with landing by linear interpolation within
 * the last step and the apex by a parabola within the highest one.
 *
 * @param launch       speed ≥ 0, spin ≥ 0; not checked again here
 * @param coefficients the model of drag and lift
 * @param air          density in kg/m³ and wind in m/s
 * @returns the landing, or null where the ball never rises or has not landed after 60 s
 * @example flyToLanding({ ballSpeed: 78.68, launchDeg: 10, spinRpm: 2520 }, SMITS_SMITH, { density: 1.194, wind: 0 })
 * // → carry 240.35 m
 */
export function flyToLanding(
  { ballSpeed, launchDeg, spinRpm }: Launch,
  coefficients: FlightCoefficients,
  air: FlightAir,
  { stepS = STEP_S, onStep }: FlyOptions = {},
): Landing | null {
  const angle = (launchDeg * Math.PI) / 180;
  const ball: BallState = {
    x: 0,
    y: 0,
    vx: ballSpeed * Math.cos(angle),
    vy: ballSpeed * Math.sin(angle),
    spin: (spinRpm * 2 * Math.PI) / 60,
  };
  const step = ballFlight(coefficients, air);
  const steps = Math.ceil(LONGEST_S / stepS);
  let apex = 0;
  onStep?.(ball);
  for (let i = 0; i < steps; i += 1) {
    const { x, y, vx, vy, spin } = ball;
    step(ball, stepS);
    if (vy > 0 && ball.vy <= 0) apex = Math.max(apex, y + (vy * vy * stepS) / (2 * (vy - ball.vy)));
    if (ball.y <= 0) {
      if (y <= 0) return null;
      const part = y / (y - ball.y);
      const between = (from: number, to: number) => from + part * (to - from);
      const landed: BallState = {
        x: between(x, ball.x),
        y: 0,
        vx: between(vx, ball.vx),
        vy: between(vy, ball.vy),
        spin: between(spin, ball.spin),
      };
      return { carry: landed.x, time: (i + part) * stepS, apex, ball: landed };
    }
    if (ball.y > apex) apex = ball.y;
    onStep?.(ball);
  }
  return null;
}
