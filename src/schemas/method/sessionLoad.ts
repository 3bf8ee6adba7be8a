import { z } from 'zod';
import { rowList } from '#src/schemas/method/lists.ts';
import { fromZero } from '#src/schemas/method/numbers.ts';

const SEVEN = 'Give seven days, an empty one for rest';
const day = rowList(z.strictObject({ rpe: fromZero(10), minutes: fromZero(1440) }), {
  empty: 'Give the sessions of the day, none for rest',
  least: 0,
  most: 50,
});

/** The sessions of each of seven days. */
export const sessionLoadRequest = z.strictObject({
  days: rowList(day, { empty: SEVEN, least: 1, most: 7 }).refine((days) => days.length === 7, { message: SEVEN }),
});
