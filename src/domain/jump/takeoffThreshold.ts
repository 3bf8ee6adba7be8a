import { sampleStandardDeviation } from '#src/domain/statistics/sampleStandardDeviation.ts';

const LEAST_N = 10;
const UNLOADED_SHARE = 0.05;

/**
 * Force below which the feet have left the plate: 10 N, or five standard deviations of a second of the unloaded plate
 * where the file holds one (below 5 % of body weight throughout; its middle second) and that is larger.
 *
 * Source: Owen et al. 2014 (from memory).
 *
 * @param force       N
 * @param sampleRate  samples per second
 * @param bodyWeightN N
 * @returns N
 */
export function takeoffThreshold(force: ArrayLike<number>, sampleRate: number, bodyWeightN: number): number {
  const second = Math.floor(sampleRate);
  let run = 0;
  let longest = 0;
  let longestEnd = 0;
  for (let i = 0; i < force.length; i += 1) {
    run = force[i]! < UNLOADED_SHARE * bodyWeightN ? run + 1 : 0;
    if (run > longest) {
      longest = run;
      longestEnd = i + 1;
    }
  }
  if (longest < second || second < 2) return LEAST_N;
  const from = longestEnd - longest + ((longest - second) >> 1);
  const unloaded = Float64Array.from({ length: second }, (_, i) => force[from + i]!);
  return Math.max(LEAST_N, 5 * sampleStandardDeviation(unloaded));
}
