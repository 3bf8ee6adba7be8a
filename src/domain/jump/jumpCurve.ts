import { findOnset } from '#src/domain/jump/findOnset.ts';
import { findTakeoff, type Takeoff } from '#src/domain/jump/findTakeoff.ts';
import { jumpPhases, type JumpPhase } from '#src/domain/jump/jumpPhases.ts';
import {
  bodyWeightProblem,
  driftProblem,
  heightsProblem,
  movementProblem,
  noTakeoffProblem,
  zeroProblem,
} from '#src/domain/jump/jumpProblems.ts';
import { takeoffThreshold } from '#src/domain/jump/takeoffThreshold.ts';
import { curveQuality, type CurveQuality } from '#src/domain/signal/curveQuality.ts';
import { findGlitch } from '#src/domain/signal/findGlitch.ts';
import { firstSecond } from '#src/domain/signal/firstSecond.ts';
import { sampleRateFindings } from '#src/domain/signal/sampleRateFindings.ts';
import { requireFiniteList } from '#src/domain/statistics/requireFiniteList.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** Vertical force of one plate (N), quiet standing first; samples per second; g in m/s², default 9.81. */
export interface JumpCurveInput {
  sampleRate: number;
  force: ArrayLike<number>;
  g?: number;
}

/**
 * A countermovement jump read from its force. Forces N, mass kg, times s, velocities m/s, lengths m, impulses net N·s,
 * power W, `rsiMod` m/s; indices count samples from 0. All but body weight, mass and `weighingSd` are null where
 * `quality.ok` is false.
 */
export interface JumpCurve {
  bodyWeight: number | null;
  mass: number | null;
  weighingSd: number | null;
  onsetIndex: number | null;
  takeoffIndex: number | null;
  landingIndex: number | null;
  unweighting: JumpPhase;
  braking: JumpPhase;
  propulsion: JumpPhase;
  minVelocity: number | null;
  takeoffVelocity: number | null;
  height: number | null;
  flightTime: number | null;
  heightFromFlight: number | null;
  timeToTakeoff: number | null;
  rsiMod: number | null;
  peakForce: number | null;
  peakPower: number | null;
  forceAtZeroVelocity: number | null;
  lowestDisplacement: number | null;
  quality: CurveQuality;
  reason: string | null;
}

const ONSET_SDS = 5;
const LEAST_BAND_N = 1;
const STEP_BACK_S = 0.03;
/** A leap of this share of body weight between two samples, and back, is not force. */
const GLITCH_SHARE = 0.4;

/**
 * Reads a countermovement jump by impulse. Body weight is the mean of the first second; onset the first sample outside
 * max(5 SD, 1 N); integration starts 30 ms before it, by trapezoid, and ends at the last sample before take-off, the
 * first sample below 10 N (or 5 SD of the unloaded plate). Height is v²/2g; `heightFromFlight` g·t²/8.
 * A curve that cannot be read rightly is refused (`quality.ok` false, nulls, the reason), never guessed at.
 *
 * Source: McMahon et al. 2018, Strength Cond J 40(4):96–106; Owen et al. 2014 (from memory).
 *
 * @param input at least one finite sample
 * @throws {RangeError} if the curve is empty, a sample is not finite, or the rate or g is not above 0
 */
export function jumpCurve({ sampleRate, force, g = 9.81 }: JumpCurveInput): JumpCurve {
  requireFiniteNumber('jumpCurve', 'sampleRate', sampleRate, { above: 0 });
  requireFiniteNumber('jumpCurve', 'g', g, { above: 0 });
  requireFiniteList('jumpCurve', force);

  const { rejecting, remarks } = sampleRateFindings(sampleRate);
  const weighing = firstSecond(force, sampleRate);
  const weighingProblem = bodyWeightProblem(weighing, force.length / sampleRate);
  if (weighing === null || weighingProblem !== null) {
    const problems = [...rejecting, weighingProblem].filter((problem) => problem !== null);
    return refused(problems, remarks, { weighingSd: weighing?.sdN ?? null });
  }
  const bodyWeight = weighing.meanN;
  const mass = bodyWeight / g;
  const weighed = { bodyWeight, mass, weighingSd: weighing.sdN };
  if (rejecting.length > 0) return refused(rejecting, remarks, weighed);

  const band = Math.max(ONSET_SDS * weighing.sdN, LEAST_BAND_N);
  const onset = findOnset(force, sampleRate, bodyWeight, band);
  if (onset === -1) return refused(['no take-off: the force never leaves body weight'], remarks, weighed);
  const start = Math.max(0, onset - Math.round(STEP_BACK_S * sampleRate));
  const threshold = takeoffThreshold(force, sampleRate, bodyWeight);
  const found = findTakeoff(force, sampleRate, bodyWeight, mass, start, threshold);
  if (found === null) {
    const problem = noTakeoffProblem({ force, sampleRate, bodyWeight, mass, start, band });
    return refused([problem], remarks, weighed);
  }
  const { takeoff, landing, motion } = found;
  const zero = zeroProblem(force, sampleRate, bodyWeight, takeoff, landing);
  if (zero !== null) return refused([zero], remarks, { weighingSd: weighing.sdN });

  const glitch = findGlitch(force, sampleRate, GLITCH_SHARE * bodyWeight, takeoff + Math.ceil(0.02 * sampleRate) + 1);
  if (glitch !== -1) {
    return refused(
      [`the signal leaps at ${(glitch / sampleRate).toFixed(3)} s: samples are lost or false`],
      remarks,
      weighed,
    );
  }
  const phases = jumpPhases(force, sampleRate, mass, motion, onset, takeoff);
  const movement = movementProblem({
    force,
    sampleRate,
    bodyWeight,
    mass,
    band,
    weighingEnd: weighing.samples,
    start,
    onset,
    takeoff,
    restless: phases.restless,
  });
  if (movement !== null) return refused([movement], remarks, weighed);
  const drift = driftProblem(force, sampleRate, bodyWeight, Math.max(start, weighing.samples), takeoff);
  if (drift !== null) return refused([drift], remarks, { weighingSd: weighing.sdN });

  const takeoffVelocity = motion.velocity.at(-1)!;
  const height = takeoffVelocity ** 2 / (2 * g);
  const flightTime = landing === null ? null : (landing - takeoff) / sampleRate;
  const heightFromFlight = flightTime === null ? null : (g * flightTime ** 2) / 8;
  const heights = heightsProblem(height, heightFromFlight);
  if (heights !== null) return refused([heights], remarks, { weighingSd: weighing.sdN });

  const missing = missingParts(found, phases.minVelocity === null);
  if (found.again) remarks.push('two take-offs: the first one is used');
  const timeToTakeoff = (takeoff - onset) / sampleRate;
  const { restless: _, ...read } = phases;
  return {
    ...weighed,
    onsetIndex: onset,
    takeoffIndex: takeoff,
    landingIndex: landing,
    ...read,
    takeoffVelocity,
    height,
    flightTime,
    heightFromFlight,
    timeToTakeoff,
    rsiMod: height / timeToTakeoff,
    ...peaks(force, onset, takeoff, found),
    quality: curveQuality({ rejecting: [], remarks: [...missing, ...remarks] }),
    reason: missing.length === 0 ? null : missing.join('; '),
  };
}

function missingParts({ landing, landsElsewhere }: Takeoff, noDip: boolean): string[] {
  const missing: string[] = [];
  if (landing === null) {
    const where = landsElsewhere ? 'the landing is not on the plate' : 'the file ends in flight';
    missing.push(`${where}: no flight time, and the height has no second measure beside it`);
  }
  if (noDip) missing.push('no countermovement: no unweighting and no braking');
  return missing;
}

function peaks(force: ArrayLike<number>, onset: number, takeoff: number, { motion }: Takeoff) {
  let peakForce = -Infinity;
  let peakPower = -Infinity;
  for (let i = onset; i < takeoff; i += 1) {
    peakForce = Math.max(peakForce, force[i]!);
    peakPower = Math.max(peakPower, force[i]! * motion.velocity[i - motion.start]!);
  }
  return { peakForce, peakPower };
}

type Weighed = Partial<Pick<JumpCurve, 'bodyWeight' | 'mass' | 'weighingSd'>>;

function refused(rejecting: string[], remarks: string[], weighed: Weighed): JumpCurve {
  const none = { duration: null, impulse: null };
  return {
    bodyWeight: weighed.bodyWeight ?? null,
    mass: weighed.mass ?? null,
    weighingSd: weighed.weighingSd ?? null,
    onsetIndex: null,
    takeoffIndex: null,
    landingIndex: null,
    unweighting: none,
    braking: { ...none },
    propulsion: { ...none },
    minVelocity: null,
    takeoffVelocity: null,
    height: null,
    flightTime: null,
    heightFromFlight: null,
    timeToTakeoff: null,
    rsiMod: null,
    peakForce: null,
    peakPower: null,
    forceAtZeroVelocity: null,
    lowestDisplacement: null,
    quality: curveQuality({ rejecting, remarks }),
    reason: rejecting.join('; '),
  };
}
