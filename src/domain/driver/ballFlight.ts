/** A golf ball by the rules' limits: kg, m, m² (SCIENCE §7). */
export const BALL = Object.freeze({ massKg: 0.04593, diameterM: 0.04267, areaM2: 0.0014299971 });

/** Gravity of the flight model, m/s². */
export const FLIGHT_GRAVITY = 9.81;

/** Drag and lift coefficients by spin ratio S = ωr/V and Reynolds number VD/ν, and whether spin decays. */
export interface FlightCoefficients {
  drag(spinRatio: number, reynolds: number): number;
  lift(spinRatio: number, reynolds: number): number;
  spinDecays: boolean;
  /** kinematic viscosity of the Reynolds number, m²/s */
  viscosity: number;
}

/** Position in m (x along the target line, y up), velocity in m/s over the ground, spin in rad/s. */
export interface BallState {
  x: number;
  y: number;
  vx: number;
  vy: number;
  spin: number;
}

/** The air that the ball flies in: kg/m³, and wind along the target line in m/s, above 0 following. */
export interface FlightAir {
  density: number;
  wind: number;
}

/** Steps a ball through the air, in place; one stepper serves one flight. */
export type FlightStepper = (ball: BallState, stepS: number) => void;

const RADIUS_M = BALL.diameterM / 2;
const SPIN_DECAY = 2e-5;

/**
 * Makes the classical fourth-order Runge–Kutta stepper of the two-dimensional equations of a spinning ball:
 * a_x = −kV(C_D·u_x + C_L·u_y), a_y = −kV(C_D·u_y − C_L·u_x) − g, with u the velocity through the air, V its size and
 * k = ρA/2m; spin decays by dω/dt = −2·10⁻⁵·ωV/r.
 *
 * Source: Penner 2001, American Journal of Physics 69:563, eq. 16 for the decay, after Smits & Smith 1994 (SCIENCE §7).
 *
 * @returns a function that moves a `BallState` on by a step in seconds
 * @example const step = ballFlight(SMITS_SMITH, { density: 1.194, wind: 0 }); step(ball, 0.002);
 */
export function ballFlight(coefficients: FlightCoefficients, { density, wind }: FlightAir): FlightStepper {
  const k = (density * BALL.areaM2) / (2 * BALL.massKg);
  const perSpeed = BALL.diameterM / coefficients.viscosity;
  const decay = coefficients.spinDecays ? SPIN_DECAY / RADIUS_M : 0;
  // @NOTE The slope goes through these three variables: an object for each of 15 000 calls costs more than the physics.
  let ax = 0;
  let ay = 0;
  let dSpin = 0;
  const slope = (vx: number, vy: number, spin: number): void => {
    const ux = vx - wind;
    const speed = Math.sqrt(ux * ux + vy * vy);
    ax = 0;
    ay = -FLIGHT_GRAVITY;
    dSpin = -decay * spin * speed;
    if (speed === 0 || k === 0) return;
    const spinRatio = (spin * RADIUS_M) / speed;
    const reynolds = speed * perSpeed;
    const drag = k * speed * coefficients.drag(spinRatio, reynolds);
    const lift = k * speed * coefficients.lift(spinRatio, reynolds);
    ax = -(drag * ux + lift * vy);
    ay -= drag * vy - lift * ux;
  };
  return (ball, stepS) => {
    const half = stepS / 2;
    const { vx, vy, spin } = ball;
    slope(vx, vy, spin);
    const [ax1, ay1, s1] = [ax, ay, dSpin];
    const vx2 = vx + half * ax1;
    const vy2 = vy + half * ay1;
    slope(vx2, vy2, spin + half * s1);
    const [ax2, ay2, s2] = [ax, ay, dSpin];
    const vx3 = vx + half * ax2;
    const vy3 = vy + half * ay2;
    slope(vx3, vy3, spin + half * s2);
    const [ax3, ay3, s3] = [ax, ay, dSpin];
    const vx4 = vx + stepS * ax3;
    const vy4 = vy + stepS * ay3;
    slope(vx4, vy4, spin + stepS * s3);
    const sixth = stepS / 6;
    ball.x += sixth * (vx + 2 * vx2 + 2 * vx3 + vx4);
    ball.y += sixth * (vy + 2 * vy2 + 2 * vy3 + vy4);
    ball.vx += sixth * (ax1 + 2 * ax2 + 2 * ax3 + ax);
    ball.vy += sixth * (ay1 + 2 * ay2 + 2 * ay3 + ay);
    ball.spin += sixth * (s1 + 2 * s2 + 2 * s3 + dSpin);
  };
}
