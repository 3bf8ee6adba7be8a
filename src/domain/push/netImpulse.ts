import { forceAtTime } from '#src/domain/push/forceAtTime.ts';

/**
 * Impulse of the force above the preload over a window from a sample, by trapezoid, the last part interpolated.
 *
 * @param force      N
 * @param sampleRate samples per second
 * @param from       index of the sample
 * @param windowS    length of the window, s
 * @param preloadN   N
 * @returns N·s, or null where the file ends before
 */
export function netImpulse(
  force: ArrayLike<number>,
  sampleRate: number,
  from: number,
  windowS: number,
  preloadN: number,
): number | null {
  const last = forceAtTime(force, sampleRate, from, windowS);
  if (last === null) return null;
  const whole = Math.floor(windowS * sampleRate + 1e-6);
  let impulse = 0;
  for (let i = from + 1; i <= from + whole; i += 1) {
    impulse += (force[i]! + force[i - 1]! - 2 * preloadN) / (2 * sampleRate);
  }
  const restS = windowS - whole / sampleRate;
  return impulse + (restS * (force[from + whole]! + last - 2 * preloadN)) / 2;
}
