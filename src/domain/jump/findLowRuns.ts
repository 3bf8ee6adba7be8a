/** A stretch with next to no force: `start` its first sample, `end` the first loaded one, null at the end of the file. */
export interface LowRun {
  start: number;
  end: number | null;
}

/** Shorter stretches are lost samples or a deep dip, not flight: 60 ms are 4 mm of height. */
const SHORTEST_S = 0.06;
/** Force must stay up this long to end a stretch: noise and ringing of the plate do not. */
const LOADED_S = 0.02;

/**
 * Stretches of at least 60 ms that begin with a sample below the threshold and end where the force stays at or above
 * it for 20 ms.
 *
 * @param force      N
 * @param sampleRate samples per second
 * @param thresholdN N
 * @param from       first sample to look at
 * @returns in order of time; only the last may run to the end of the file
 */
export function findLowRuns(force: ArrayLike<number>, sampleRate: number, thresholdN: number, from: number): LowRun[] {
  const shortest = SHORTEST_S * sampleRate;
  const loaded = Math.max(1, Math.round(LOADED_S * sampleRate));
  const runs: LowRun[] = [];
  let start = -1;
  let above = 0;
  for (let i = from; i < force.length; i += 1) {
    if (force[i]! < thresholdN) {
      if (start === -1) start = i;
      above = 0;
    } else if (start !== -1) {
      above += 1;
      if (above < loaded) continue;
      const end = i - above + 1;
      if (end - start >= shortest) runs.push({ start, end });
      start = -1;
      above = 0;
    }
  }
  // load that does not last 20 ms within the file is no landing yet
  if (start !== -1 && force.length - above - start >= shortest) runs.push({ start, end: null });
  return runs;
}
