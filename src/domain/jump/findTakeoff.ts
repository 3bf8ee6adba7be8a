import { findLowRuns, type LowRun } from '#src/domain/jump/findLowRuns.ts';
import { integrateMotion, type Motion } from '#src/domain/jump/integrateMotion.ts';

/** Longer in the air than any jump: the athlete left the plate and did not land on it. */
const LONGEST_FLIGHT_S = 1;
/** Upward speed without which a loss of force is stepping off or a deep dip. */
const LEAST_TAKEOFF_MPS = 0.2;

/** First take-off, the landing after it if it is on the plate, the motion up to take-off, and whether another follows. */
export interface Takeoff {
  takeoff: number;
  landing: number | null;
  motion: Motion;
  landsElsewhere: boolean;
  again: boolean;
}

/**
 * The first loss of force that follows an upward movement.
 *
 * @param force       N
 * @param sampleRate  samples per second
 * @param bodyWeightN N
 * @param massKg      kg
 * @param start       sample at rest from which to integrate
 * @param thresholdN  force below which the plate is empty
 * @returns null where there is none
 */
export function findTakeoff(
  force: ArrayLike<number>,
  sampleRate: number,
  bodyWeightN: number,
  massKg: number,
  start: number,
  thresholdN: number,
): Takeoff | null {
  const runs = findLowRuns(force, sampleRate, thresholdN, start + 1);
  const isFlight = ({ start: from, end }: LowRun) => end !== null && end - from <= LONGEST_FLIGHT_S * sampleRate;
  const whole = integrateMotion(force, sampleRate, bodyWeightN, massKg, start, runs.at(-1)?.start ?? start);
  for (const [order, run] of runs.entries()) {
    const motion = {
      start,
      velocity: whole.velocity.subarray(0, run.start - start),
      displacement: whole.displacement.subarray(0, run.start - start),
    };
    if (motion.velocity.at(-1)! < LEAST_TAKEOFF_MPS) continue;
    const onPlate = isFlight(run);
    return {
      takeoff: run.start,
      landing: onPlate ? run.end : null,
      motion,
      landsElsewhere: (run.end ?? force.length) - run.start > LONGEST_FLIGHT_S * sampleRate,
      again: onPlate && runs.slice(order + 1).some(isFlight),
    };
  }
  return null;
}
