import type { FlightCoefficients } from '#src/domain/driver/ballFlight.ts';

/**
 * Drag and lift of a golf ball off the driver: C_D = 0.24 + 0.18·S + 0.06·sin(π(Re − 9·10⁴)/2·10⁵), C_L = 0.54·S^0.4.
 * Fitted for Reynolds numbers of 7·10⁴ to 2.1·10⁵ and spin ratios of 0.08 to 0.2; used unclamped outside.
 *
 * Source: Smits & Smith 1994, Science and Golf II (read at second hand, SCIENCE §7). Real balls differ by ±10 %, so
 * the model compares conditions and predicts no child's carry.
 */
export const SMITS_SMITH: FlightCoefficients = Object.freeze({
  drag: (spinRatio: number, reynolds: number) =>
    0.24 + 0.18 * spinRatio + 0.06 * Math.sin((Math.PI * (reynolds - 9e4)) / 2e5),
  lift: (spinRatio: number) => 0.54 * spinRatio ** 0.4,
  spinDecays: true,
  viscosity: 1.52e-5,
});
