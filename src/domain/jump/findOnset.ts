/** Time over which at least half of the samples must be outside, so that a lone outlier is no onset. */
const CONFIRM_S = 0.03;

/**
 * Onset of movement: the first sample outside body weight ± band, confirmed by at least half of the 30 ms from it
 * being outside too.
 *
 * Source: five standard deviations after Owen et al. 2014 (from memory); the confirmation is our own.
 *
 * @param force       N
 * @param sampleRate  samples per second
 * @param bodyWeightN centre of the band
 * @param bandN       half-width of the band
 * @returns index, or −1 where nothing moves
 */
export function findOnset(force: ArrayLike<number>, sampleRate: number, bodyWeightN: number, bandN: number): number {
  const { length } = force;
  const window = Math.max(1, Math.round(CONFIRM_S * sampleRate));
  const outside = (i: number) => (Math.abs(force[i]! - bodyWeightN) > bandN ? 1 : 0);
  let count = 0;
  for (let i = 0; i < Math.min(window, length); i += 1) count += outside(i);
  for (let i = 0; i < length; i += 1) {
    const seen = Math.min(window, length - i);
    if (outside(i) === 1 && 2 * count >= seen) return i;
    count -= outside(i);
    if (i + window < length) count += outside(i + window);
  }
  return -1;
}
