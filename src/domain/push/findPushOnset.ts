/** Force must stay above the threshold this long to be the push. */
const HELD_S = 0.02;

/**
 * Onset of an isometric push: the last sample at or below the threshold before the force stays above it for 20 ms.
 *
 * @param force      N
 * @param sampleRate samples per second
 * @param thresholdN N
 * @returns index, or −1 where the force never stays above
 */
export function findPushOnset(force: ArrayLike<number>, sampleRate: number, thresholdN: number): number {
  const held = Math.max(1, Math.round(HELD_S * sampleRate));
  let lastBelow = -1;
  for (let i = 0; i < force.length; i += 1) {
    if (force[i]! <= thresholdN) lastBelow = i;
    else if (lastBelow !== -1 && i - lastBelow >= held) return lastBelow;
  }
  return -1;
}
