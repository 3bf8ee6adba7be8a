/** A jolt counts if the opposite one follows within this time; muscles need longer. */
const RETURN_WITHIN_S = 0.02;

/**
 * First place where the signal leaps between two samples and leaps back within 20 ms: a spike or a lost stretch of the
 * recording, not force.
 *
 * @param force      N
 * @param sampleRate samples per second
 * @param leapN      smallest change between two samples that counts
 * @param end        first sample not to be looked at
 * @returns index of the first sample after the leap, or −1
 */
export function findGlitch(force: ArrayLike<number>, sampleRate: number, leapN: number, end: number): number {
  const within = Math.max(1, Math.floor(RETURN_WITHIN_S * sampleRate));
  let lastUp = -Infinity;
  let lastDown = -Infinity;
  for (let i = 1; i < end; i += 1) {
    const change = force[i]! - force[i - 1]!;
    if (change > leapN) {
      if (i - lastDown <= within) return lastDown;
      lastUp = i;
    } else if (change < -leapN) {
      if (i - lastUp <= within) return lastUp;
      lastDown = i;
    }
  }
  return -1;
}
