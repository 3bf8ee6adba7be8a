/**
 * Force at a time after a sample, by linear interpolation.
 *
 * @param force      N
 * @param sampleRate samples per second
 * @param from       index of the sample
 * @param afterS     time after it, s
 * @returns N, or null where the file ends before
 */
export function forceAtTime(force: ArrayLike<number>, sampleRate: number, from: number, afterS: number): number | null {
  const position = from + afterS * sampleRate;
  // 0.15 · 1000 may miss a whole number by the last digit
  const nearest = Math.round(position);
  if (Math.abs(position - nearest) < 1e-6) return force[nearest] ?? null;
  const before = Math.floor(position);
  const low = force[before];
  const high = force[before + 1];
  return low === undefined || high === undefined ? null : low + (position - before) * (high - low);
}
