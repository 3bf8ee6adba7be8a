import { INDEX_ROUNDING } from '#src/domain/ground/sampleAt.ts';

/**
 * The largest sample between two times, both included; the first of equal ones.
 *
 * @param samples    evenly spaced values
 * @param sampleRate Hz
 * @param fromS      seconds from the first sample
 * @param toS        seconds from the first sample; beyond the end means the end
 * @returns the value and its time in s, or null where no sample lies there
 * @example peakBetween([1, 5, 3, 9], 10, 0, 0.2) // → { force: 5, time: 0.1 }
 */
export function peakBetween(
  samples: ArrayLike<number>,
  sampleRate: number,
  fromS: number,
  toS: number,
): { force: number; time: number } | null {
  const first = Math.ceil(fromS * sampleRate - INDEX_ROUNDING);
  const last = Math.min(samples.length - 1, Math.floor(toS * sampleRate + INDEX_ROUNDING));
  if (first < 0 || first > last) return null;
  let at = first;
  for (let i = first + 1; i <= last; i += 1) if (samples[i]! > samples[at]!) at = i;
  return { force: samples[at]!, time: at / sampleRate };
}
