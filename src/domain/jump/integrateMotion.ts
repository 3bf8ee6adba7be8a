/** Velocity (m/s) and displacement (m) of the centre of mass at each sample from `start`, both 0 there. */
export interface Motion {
  start: number;
  velocity: Float64Array;
  displacement: Float64Array;
}

/**
 * Motion of the centre of mass by forward dynamics: trapezoid of (F − body weight)/m, and of the velocity.
 *
 * @param force       N
 * @param sampleRate  samples per second
 * @param bodyWeightN N
 * @param massKg      kg
 * @param start       first sample, at rest
 * @param end         first sample not to be included
 */
export function integrateMotion(
  force: ArrayLike<number>,
  sampleRate: number,
  bodyWeightN: number,
  massKg: number,
  start: number,
  end: number,
): Motion {
  const velocity = new Float64Array(Math.max(0, end - start));
  const displacement = new Float64Array(velocity.length);
  const step = 1 / (2 * sampleRate);
  for (let i = 1; i < velocity.length; i += 1) {
    const net = force[start + i]! + force[start + i - 1]! - 2 * bodyWeightN;
    velocity[i] = velocity[i - 1]! + (net * step) / massKg;
    displacement[i] = displacement[i - 1]! + (velocity[i]! + velocity[i - 1]!) * step;
  }
  return { start, velocity, displacement };
}
