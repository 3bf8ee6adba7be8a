import { findLowRuns } from '#src/domain/jump/findLowRuns.ts';
import { findTakeoff } from '#src/domain/jump/findTakeoff.ts';
import type { FirstSecond } from '#src/domain/signal/firstSecond.ts';
import { median } from '#src/domain/statistics/median.ts';

/** Below 10 kg nobody stands on the plate. */
const LEAST_BODY_WEIGHT_N = 98.1;
const MOST_WEIGHING_SD_SHARE = 0.01;
/** How far the empty plate may read from 0 in flight: 2 N or 0.5 % of body weight. */
const ZERO_N = 2;
const ZERO_SHARE = 0.005;
/** How far body weight may drift from the weighing to take-off: 3 N or 1 % of body weight. */
const DRIFT_N = 3;
const DRIFT_SHARE = 0.01;
/** A stretch this long back at body weight after the onset means that the onset was another movement. */
const BACK_TO_QUIET_S = 0.2;
const RESTING_MPS = 0.05;
/** With a shifted zero the force in flight stays above the take-off threshold but far below body weight. */
const SHIFTED_FLIGHT_SHARE = 0.15;

/**
 * Why the first second cannot serve as body weight.
 *
 * @param weighing  first second of the curve, null where there is none
 * @param durationS length of the curve
 * @returns the problem in words, or null
 */
export function bodyWeightProblem(weighing: FirstSecond | null, durationS: number): string | null {
  if (weighing === null) return `no quiet second: the file has only ${durationS.toFixed(2)} s`;
  const { meanN, sdN } = weighing;
  if (meanN < LEAST_BODY_WEIGHT_N) return `no quiet second: nobody stands on the plate (${meanN.toFixed(1)} N)`;
  if (sdN > MOST_WEIGHING_SD_SHARE * meanN) {
    const share = ((100 * sdN) / meanN).toFixed(1);
    return `no quiet second: the force varies by ${share} % of body weight (SD), at most 1 % is steady`;
  }
  return null;
}

/** A curve from the point of view of the search for a take-off. */
export interface CurveFromStart {
  force: ArrayLike<number>;
  sampleRate: number;
  bodyWeight: number;
  mass: number;
  start: number;
  band: number;
}

/**
 * Why no take-off was found: a shifted zero, stepping off, a file that ends too soon, or no jump.
 *
 * @param curve the curve with its body weight and onset band (N)
 * @returns the problem in words
 */
export function noTakeoffProblem({ force, sampleRate, bodyWeight, mass, start, band }: CurveFromStart): string {
  const shifted = findTakeoff(force, sampleRate, bodyWeight, mass, start, SHIFTED_FLIGHT_SHARE * bodyWeight);
  if (shifted !== null) {
    const readsN = flightReading(force, sampleRate, shifted.takeoff, shifted.landing);
    return `the zero of the plate has moved: it reads ${readsN.toFixed(1)} N in flight`;
  }
  const left = findLowRuns(force, sampleRate, SHIFTED_FLIGHT_SHARE * bodyWeight, start).at(-1)?.end === null;
  if (left) return 'no take-off: the plate is left without a jump';
  const tail = Math.max(1, Math.round(0.05 * sampleRate));
  let sum = 0;
  for (let i = Math.max(0, force.length - tail); i < force.length; i += 1) sum += force[i]!;
  const endsMoving = Math.abs(sum / Math.min(tail, force.length) - bodyWeight) > Math.max(band, 0.05 * bodyWeight);
  return endsMoving ? 'no take-off: the file ends during the movement' : 'no take-off in the file';
}

/**
 * Whether the plate reads 0 in flight. If not, its zero was off or moved after the weighing (a step or a drift).
 *
 * @param force       N
 * @param sampleRate  samples per second
 * @param bodyWeightN N
 * @param takeoff     index of take-off
 * @param landing     index of landing, or null
 * @returns the problem in words, or null
 */
export function zeroProblem(
  force: ArrayLike<number>,
  sampleRate: number,
  bodyWeightN: number,
  takeoff: number,
  landing: number | null,
): string | null {
  const readsN = flightReading(force, sampleRate, takeoff, landing);
  if (Math.abs(readsN) <= Math.max(ZERO_N, ZERO_SHARE * bodyWeightN)) return null;
  return `the zero of the plate has moved: it reads ${readsN.toFixed(1)} N in flight`;
}

/** Median of the middle half of the flight, clear of ringing and spikes. */
function flightReading(force: ArrayLike<number>, sampleRate: number, takeoff: number, landing: number | null): number {
  const end = landing ?? Math.min(force.length, takeoff + Math.floor(sampleRate));
  const quarter = Math.floor((end - takeoff) / 4);
  const length = Math.max(1, end - takeoff - 2 * quarter);
  return median(Float64Array.from({ length }, (_, i) => force[takeoff + quarter + i]!));
}

/**
 * Whether the force slopes while the athlete stands, so that body weight is another by take-off: a drifting plate or a
 * slow movement. The slope is that of least squares over the quiet samples.
 *
 * @param force       N
 * @param sampleRate  samples per second
 * @param bodyWeightN N
 * @param quietEnd    first sample not quiet any more
 * @param takeoff     index of take-off
 * @returns the problem in words, or null
 */
export function driftProblem(
  force: ArrayLike<number>,
  sampleRate: number,
  bodyWeightN: number,
  quietEnd: number,
  takeoff: number,
): string | null {
  const middle = (quietEnd - 1) / 2;
  let moment = 0;
  let spread = 0;
  for (let i = 0; i < quietEnd; i += 1) {
    moment += (i - middle) * (force[i]! - bodyWeightN);
    spread += (i - middle) ** 2;
  }
  const slope = moment / spread;
  const byTakeoffN = slope * (takeoff - sampleRate / 2);
  if (Math.abs(byTakeoffN) <= Math.max(DRIFT_N, DRIFT_SHARE * bodyWeightN)) return null;
  return `no quiet second: the force drifts by ${(slope * sampleRate).toFixed(1)} N/s while standing`;
}

/** A jump with its edges, for the search for movement before it. */
export interface JumpEdges {
  force: ArrayLike<number>;
  sampleRate: number;
  bodyWeight: number;
  mass: number;
  band: number;
  weighingEnd: number;
  start: number;
  onset: number;
  takeoff: number;
  restless: boolean;
}

/**
 * Whether the athlete moved before the jump: inside the weighing second, slowly up to the onset, in a false start, or
 * up before the dip.
 *
 * @param jump the curve with its edges
 * @returns the problem in words, or null
 */
export function movementProblem(jump: JumpEdges): string | null {
  const { force, sampleRate, bodyWeight, mass, band, weighingEnd, start, onset, takeoff, restless } = jump;
  if (onset < weighingEnd) return 'movement before the jump: it begins inside the weighing second';
  let impulse = 0;
  for (let i = Math.max(weighingEnd, start - Math.floor(sampleRate)); i < start; i += 1)
    impulse += force[i]! - bodyWeight;
  const drift = impulse / (sampleRate * mass);
  if (Math.abs(drift) > RESTING_MPS) {
    return `movement before the jump: ${drift.toFixed(2)} m/s at the onset, or a drifting plate`;
  }
  let quiet = 0;
  for (let i = onset; i < takeoff; i += 1) {
    quiet = Math.abs(force[i]! - bodyWeight) <= band ? quiet + 1 : 0;
    if (quiet >= BACK_TO_QUIET_S * sampleRate) return 'movement before the jump: a false start, then quiet again';
  }
  return restless ? 'movement before the jump: up before the dip, or two dips' : null;
}

/**
 * Whether the flight confirms the impulse. Flight time usually gives 1 to 2 cm more; far more means a landing on bent
 * legs, and a wrong body weight can move either way.
 *
 * Source: 1.7 cm in one study of 18 adults; the limits here are our own.
 *
 * @param heightM           by impulse
 * @param heightFromFlightM by flight time, null where the landing is missing
 * @returns the problem in words, or null
 */
export function heightsProblem(heightM: number, heightFromFlightM: number | null): string | null {
  if (heightFromFlightM === null) return null;
  const surplus = heightFromFlightM - heightM;
  if (surplus >= -Math.max(0.015, 0.06 * heightM) && surplus <= Math.max(0.035, 0.15 * heightM)) return null;
  const both = `${heightM.toFixed(3)} m by impulse, ${heightFromFlightM.toFixed(3)} m by flight time`;
  return `the two heights disagree (${both}): bent legs at landing, or a wrong body weight`;
}
