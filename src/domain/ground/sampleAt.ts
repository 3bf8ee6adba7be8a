/** Event times are decimal: a sample's own time may miss it by the last binary digits. */
export const INDEX_ROUNDING = 1e-6;

/**
 * The value of a sampled signal at a time, by linear interpolation between the samples around it.
 *
 * @param samples    evenly spaced values
 * @param sampleRate Hz
 * @param timeS      seconds from the first sample
 * @returns the value in the unit of the samples, or null outside the signal
 * @example sampleAt([0, 10, 20], 10, 0.15) // → 15
 */
export function sampleAt(samples: ArrayLike<number>, sampleRate: number, timeS: number): number | null {
  const last = samples.length - 1;
  const position = timeS * sampleRate;
  if (position < -INDEX_ROUNDING || position > last + INDEX_ROUNDING) return null;
  const clamped = Math.min(Math.max(position, 0), last);
  const below = Math.floor(clamped);
  const part = clamped - below;
  return part === 0 ? samples[below]! : samples[below]! + part * (samples[below + 1]! - samples[below]!);
}
