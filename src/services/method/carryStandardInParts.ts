import { setImmediate } from 'node:timers/promises';
import {
  standardSession,
  standardShots,
  type CarryStandardInput,
  type CarryStandardResult,
  type StandardisedShot,
} from '#src/domain/driver/carryStandard.ts';

/** Each shot flies twice, a few milliseconds; between parts other requests have their turn. */
const SHOTS_A_PART = 10;

/**
 * `carryStandard` for a request: the same answer, worked out in parts so that a long session holds nobody up.
 *
 * @throws {RangeError} as `carryStandard`
 */
export async function carryStandardInParts({ shots, conditions }: CarryStandardInput): Promise<CarryStandardResult> {
  const standardised: StandardisedShot[] = [];
  for (let i = 0; i < shots.length; i += SHOTS_A_PART) {
    if (i > 0) await setImmediate();
    standardised.push(...standardShots({ shots: shots.slice(i, i + SHOTS_A_PART), conditions }));
  }
  return standardSession(shots, standardised);
}
