import { z } from 'zod';
import { calendarDate } from '#src/schemas/method/calendarDate.ts';
import { rowList } from '#src/schemas/method/lists.ts';
import { aboveZero, fromZero } from '#src/schemas/method/numbers.ts';

/** Statures in cm with their dates, in any order. */
export const growthVelocityRequest = z.strictObject({
  measures: rowList(z.strictObject({ on: calendarDate(), stature: aboveZero(300) }), {
    empty: 'Give one line a measurement',
    most: 1000,
  }),
  measurementError: fromZero(100).optional(),
});
