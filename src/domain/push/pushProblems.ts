import type { FirstSecond } from '#src/domain/signal/firstSecond.ts';

/** Preload may vary by 10 N or 2 % (SD), and rise or fall within its second by 6 N or 1.5 % between its halves. */
const STEADY_N = 10;
const STEADY_SHARE = 0.02;
const LEVEL_N = 6;
const LEVEL_SHARE = 0.015;
/** A dip this long below the preload before the push is a swing into it. */
const DIP_S = 0.02;
const STILL_RISING_SHARE = 0.02;
const TAIL_S = 0.05;

/**
 * Why the first second cannot serve as preload: too short, below 0, unsteady, or sloping (a drifting plate or an early push).
 *
 * @param force    N
 * @param preload  first second of the curve, null where there is none
 * @param durationS length of the curve
 * @returns the problem in words, or null
 */
export function preloadProblem(
  force: ArrayLike<number>,
  preload: FirstSecond | null,
  durationS: number,
): string | null {
  if (preload === null) return `no quiet second: the file has only ${durationS.toFixed(2)} s`;
  const { meanN, sdN, samples } = preload;
  if (meanN < -STEADY_N) return `the zero of the plate has moved: it reads ${meanN.toFixed(1)} N before the push`;
  if (sdN > Math.max(STEADY_N, STEADY_SHARE * Math.abs(meanN))) {
    return `no quiet second: the preload varies by ${sdN.toFixed(1)} N (SD)`;
  }
  const half = samples >> 1;
  let first = 0;
  let second = 0;
  for (let i = 0; i < half; i += 1) {
    first += force[i]! / half;
    second += force[samples - half + i]! / half;
  }
  if (Math.abs(second - first) <= Math.max(LEVEL_N, LEVEL_SHARE * Math.abs(meanN))) return null;
  return `the preload moves by ${(second - first).toFixed(1)} N within its second: an early push, or a drifting plate`;
}

/**
 * Whether the athlete dipped before the push or let go and pushed again.
 *
 * @param force       N
 * @param sampleRate  samples per second
 * @param preloadN    N
 * @param bandN       5 SD of the preload, N
 * @param weighingEnd first sample after the preload second
 * @param onset       index of onset
 * @param peak        index of the peak
 * @returns the problem in words, or null
 */
export function pushStartProblem(
  force: ArrayLike<number>,
  sampleRate: number,
  preloadN: number,
  bandN: number,
  weighingEnd: number,
  onset: number,
  peak: number,
): string | null {
  // the last sample of the preload may be the onset itself
  if (onset < weighingEnd - 1) return 'movement before the push: it begins inside the preload second';
  const long = DIP_S * sampleRate;
  const dipBand = Math.max(bandN, STEADY_N);
  let dip = 0;
  for (let i = weighingEnd; i < onset; i += 1) {
    dip = force[i]! < preloadN - dipBand ? dip + 1 : 0;
    if (dip >= long) return 'movement before the push: a dip below the preload';
  }
  let released = 0;
  for (let i = onset + 1; i < peak; i += 1) {
    released = force[i]! <= preloadN + bandN ? released + 1 : 0;
    if (released >= long) return 'movement before the push: a false start, then a second push';
  }
  return null;
}

/**
 * Whether the force still rises when the file ends, by the means of the last two 50 ms.
 *
 * @param force      N
 * @param sampleRate samples per second
 * @param peakN      N
 */
export function stillRising(force: ArrayLike<number>, sampleRate: number, peakN: number): boolean {
  const tail = Math.max(1, Math.round(TAIL_S * sampleRate));
  if (force.length < 2 * tail) return false;
  let rise = 0;
  for (let i = force.length - tail; i < force.length; i += 1) rise += (force[i]! - force[i - tail]!) / tail;
  return rise > STILL_RISING_SHARE * peakN;
}
