import type { Motion } from '#src/domain/jump/integrateMotion.ts';

/** Length (s) and net impulse (N·s) of a phase; both null where the jump has no such phase. */
export interface JumpPhase {
  duration: number | null;
  impulse: number | null;
}

/** Phases of a countermovement jump and what is read at their edges. */
export interface JumpPhases {
  unweighting: JumpPhase;
  braking: JumpPhase;
  propulsion: JumpPhase;
  minVelocity: number | null;
  forceAtZeroVelocity: number | null;
  lowestDisplacement: number | null;
  /** the athlete moved up before going down, or went down twice */
  restless: boolean;
}

/** Slower than this downwards is no countermovement. */
const DIP_MPS = 0.05;
/** Faster than this upwards before the dip is another movement. */
const RISE_MPS = 0.1;

/**
 * Splits the movement before take-off: unweighting (onset to the greatest downward velocity), braking (to velocity 0,
 * found between samples), propulsion (to take-off). Without a countermovement all of it is propulsion.
 *
 * Source: McMahon et al. 2018, Strength Cond J 40(4):96–106.
 *
 * @param force      N
 * @param sampleRate samples per second
 * @param massKg     kg
 * @param motion     motion from before onset to the last sample before take-off
 * @param onset      index of onset
 * @param takeoff    index of take-off
 */
export function jumpPhases(
  force: ArrayLike<number>,
  sampleRate: number,
  massKg: number,
  { start, velocity, displacement }: Motion,
  onset: number,
  takeoff: number,
): JumpPhases {
  const last = velocity.length - 1;
  let lowest = 0;
  for (let i = 1; i <= last; i += 1) if (velocity[i]! < velocity[lowest]!) lowest = i;
  const minVelocity = velocity[lowest]!;
  if (minVelocity > -DIP_MPS) {
    const whole = { duration: (takeoff - onset) / sampleRate, impulse: massKg * velocity[last]! };
    const none = { duration: null, impulse: null };
    return {
      unweighting: none,
      braking: { ...none },
      propulsion: whole,
      minVelocity: null,
      forceAtZeroVelocity: null,
      lowestDisplacement: null,
      restless: false,
    };
  }
  let rise = lowest;
  while (rise < last && velocity[rise]! < 0) rise += 1;
  const share = velocity[rise - 1]! / (velocity[rise - 1]! - velocity[rise]!);
  const turn = start + rise - 1 + share;
  const before = force[start + rise - 1]!;
  return {
    unweighting: { duration: (start + lowest - onset) / sampleRate, impulse: massKg * minVelocity },
    braking: { duration: (turn - start - lowest) / sampleRate, impulse: -massKg * minVelocity },
    propulsion: { duration: (takeoff - turn) / sampleRate, impulse: massKg * velocity[last]! },
    minVelocity,
    forceAtZeroVelocity: before + share * (force[start + rise]! - before),
    lowestDisplacement: leastOf(displacement),
    restless: greatestIn(velocity, 0, lowest) > RISE_MPS || leastIn(velocity, rise, last) < -DIP_MPS,
  };
}

function leastOf(values: Float64Array): number {
  return leastIn(values, 0, values.length - 1);
}

function leastIn(values: Float64Array, from: number, to: number): number {
  let least = Infinity;
  for (let i = from; i <= to; i += 1) if (values[i]! < least) least = values[i]!;
  return least;
}

function greatestIn(values: Float64Array, from: number, to: number): number {
  let greatest = -Infinity;
  for (let i = from; i <= to; i += 1) if (values[i]! > greatest) greatest = values[i]!;
  return greatest;
}
