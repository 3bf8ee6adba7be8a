import { cannotSay, found, type Criterion } from '#src/domain/outrun/criterion.ts';
import { figure } from '#src/domain/outrun/figure.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** Degrees of attack or dynamic loft gained from which distance may have come from delivery. */
export const DELIVERY_DEG = 2;

/**
 * From delivery (information): carry up by at least one minimal detectable change, club speed unchanged (by less than
 * one), attack angle or dynamic loft up by at least 2°, and the leg no stronger: then the distance came from how the
 * club is delivered. An upward attack with the driver is sound.
 *
 * Source: common practice, no source; the line is our own.
 *
 * @returns the larger of the two angle changes, degrees
 * @throws {RangeError} if a figure is not finite or a detectable change negative
 */
export function delivery(block: OutrunInput['delivery']): Criterion {
  const cannot = (reason: string) => cannotSay('delivery', DELIVERY_DEG, reason);
  if (!block) return cannot('No change of carry, club speed and delivery between two driver sessions was given.');
  const { carryChange, carryMdc, clubSpeedChange, clubSpeedMdc, attackChangeDeg, loftChangeDeg, strengthRisen } = block;
  requireFiniteNumber('delivery', 'carryChange', carryChange);
  requireFiniteNumber('delivery', 'carryMdc', carryMdc, { min: 0 });
  requireFiniteNumber('delivery', 'clubSpeedChange', clubSpeedChange);
  requireFiniteNumber('delivery', 'clubSpeedMdc', clubSpeedMdc, { min: 0 });
  const angles = [attackChangeDeg, loftChangeDeg].filter((angle) => angle !== undefined && angle !== null);
  for (const angle of angles) requireFiniteNumber('delivery', 'angle', angle);
  if (angles.length === 0) return cannot('Neither attack angle nor dynamic loft was measured at both sessions.');

  const value = Math.max(...angles);
  const carryUp = carryChange >= carryMdc;
  const speedHeld = Math.abs(clubSpeedChange) < clubSpeedMdc;
  const angleUp = value >= DELIVERY_DEG;
  const met = carryUp && speedHeld && angleUp && !strengthRisen;
  const facts =
    `Carry ${signed(carryChange)} m (detectable from ${figure(carryMdc)}), club speed ${signed(clubSpeedChange)} m/s ` +
    `(detectable from ${figure(clubSpeedMdc)}), attack or loft ${signed(value)}°, lead push ${strengthRisen ? 'risen' : 'not risen'}`;
  return found('delivery', DELIVERY_DEG, {
    verdict: met ? 'met' : 'not met',
    points: 0,
    value,
    standardError: null,
    interval90: null,
    reason: `${facts}: ${met ? 'the distance came from delivery' : 'the distance is not explained by delivery alone'}.`,
  });
}

function signed(value: number): string {
  const text = figure(value);
  return value > 0 ? `+${text}` : text;
}
