import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** A load lifted `reps` times to the limit; `load` in any unit, ≥ 0. */
export interface OneRepMaxInput {
  load: number;
  reps: number;
}

/** Estimates in the unit of the load; null above ten repetitions, with the reason. */
export interface OneRepMax {
  epley: number | null;
  brzycki: number | null;
  reason: string | null;
}

const MOST_REPS = 10;

/**
 * Load that could be lifted once, from a load lifted several times: Epley `w(1 + r/30)`, Brzycki `36w/(37 − r)`.
 * One repetition is the load itself. Above ten repetitions both are refused (Brzycki grows without bound at 37).
 * Under 16, repetitions in reserve are preferred to either.
 *
 * Source: common practice (Epley 1985, Brzycki 1993), from memory.
 *
 * @param input load ≥ 0, whole repetitions ≥ 1
 * @throws {RangeError} if the load is negative or not finite, or the repetitions are not a whole number ≥ 1
 * @example oneRepMax({ load: 100, reps: 5 }) // → epley 116.6667, brzycki 112.5
 */
export function oneRepMax({ load, reps }: OneRepMaxInput): OneRepMax {
  requireFiniteNumber('oneRepMax', 'load', load, { min: 0 });
  if (!Number.isInteger(reps) || reps < 1) throw new RangeError(`oneRepMax requires whole reps ≥ 1, got ${reps}`);
  if (reps > MOST_REPS) {
    return { epley: null, brzycki: null, reason: `more than ${MOST_REPS} repetitions: no estimate is sound` };
  }
  return {
    epley: reps === 1 ? load : load * (1 + reps / 30),
    brzycki: (36 * load) / (37 - reps),
    reason: null,
  };
}
