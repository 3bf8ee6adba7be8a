import { z } from 'zod';
import { aboveZero, fromZero } from '#src/schemas/method/numbers.ts';

/** Either the time in the air or the speed at take-off. */
export const jumpHeightRequest = z
  .strictObject({
    flightTime: fromZero(10).optional(),
    takeoffVelocity: fromZero(100).optional(),
    g: aboveZero(100).optional(),
    timeToTakeoff: aboveZero(1000).optional(),
  })
  .superRefine(({ flightTime, takeoffVelocity }, context) => {
    if ((flightTime === undefined) !== (takeoffVelocity === undefined)) return;
    const message =
      flightTime === undefined
        ? 'Give the flight time or the take-off velocity'
        : 'Give the flight time or the take-off velocity, not both';
    context.addIssue({ code: 'custom', path: ['flightTime'], message });
  });
