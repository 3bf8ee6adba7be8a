import { z } from 'zod';
import { numberList } from '#src/schemas/method/lists.ts';

/** Loads of weeks, the newest last. */
export const weekChangeRequest = z.strictObject({
  weeks: numberList({ empty: 'Give one number a week', most: 10_000, min: 0 }),
});
