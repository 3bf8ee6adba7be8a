import type { CurveFindings } from '#src/domain/signal/curveQuality.ts';

const LEAST_HZ = 200;
const ADVISED_HZ = 500;
/** A rate worked out from time stamps misses a whole number by its last digits. */
const ROUNDING = 1e-6;

/**
 * What a sample rate does to a force curve: below 200 Hz rates of force and contact times are biased; 500 Hz is
 * tolerable and 1000 Hz advised.
 *
 * Source: from memory of the measurement literature.
 *
 * @param sampleRate samples per second, above 0
 */
export function sampleRateFindings(sampleRate: number): CurveFindings {
  if (sampleRate < LEAST_HZ * (1 - ROUNDING)) {
    return { rejecting: [`sample rate ${sampleRate} Hz is too low: at least ${LEAST_HZ} Hz is needed`], remarks: [] };
  }
  if (sampleRate < ADVISED_HZ * (1 - ROUNDING)) {
    return { rejecting: [], remarks: [`sample rate ${sampleRate} Hz is low: ${ADVISED_HZ} Hz or more is advised`] };
  }
  return { rejecting: [], remarks: [] };
}
