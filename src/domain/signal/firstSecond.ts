import { mean } from '#src/domain/statistics/mean.ts';
import { sampleStandardDeviation } from '#src/domain/statistics/sampleStandardDeviation.ts';

/** The first second of a force curve: its length in samples, mean and sample standard deviation in N. */
export interface FirstSecond {
  samples: number;
  meanN: number;
  sdN: number;
}

/**
 * Mean and spread of the first second of a force curve.
 *
 * @param force      N, finite
 * @param sampleRate samples per second
 * @returns null where the curve is shorter than one second or the second has fewer than two samples
 */
export function firstSecond(force: ArrayLike<number>, sampleRate: number): FirstSecond | null {
  // a rate worked out from time stamps may read 999.9999999
  const samples = Math.floor(sampleRate * (1 + 1e-6));
  if (samples < 2 || force.length < samples) return null;
  const second = Float64Array.from({ length: samples }, (_, i) => force[i]!);
  return { samples, meanN: mean(second), sdN: sampleStandardDeviation(second) };
}
