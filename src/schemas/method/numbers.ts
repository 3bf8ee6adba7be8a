import { z } from 'zod';

/** No quantity of this trade comes near it; squares and sums of what is below stay finite. */
export const LARGEST = 1e12;

const missingOr =
  (message: string) =>
  ({ input }: { input: unknown }) =>
    input === undefined ? 'This is missing' : message;

/** A finite number, both ends allowed. */
export const between = (min: number, max: number) =>
  z
    .number({ error: missingOr('Give a number') })
    .min(min, `Give ${min} or more`)
    .max(max, `Give ${max} or less`);

/** A finite number from 0. */
export const fromZero = (max = LARGEST) => between(0, max);

/** A finite number of either sign. */
export const signed = (max = LARGEST) => between(-max, max);

/** A finite number above 0. */
export const aboveZero = (max = LARGEST) =>
  z
    .number({ error: missingOr('Give a number') })
    .positive('Give a number above 0')
    .max(max, `Give ${max} or less`);

/** A whole number, both ends allowed. */
export const whole = (min: number, max: number) => between(min, max).int('Give a whole number');

/** Yes or no. */
export const flag = () => z.boolean({ error: missingOr('Say true or false') });

/** One of a few words. */
export const oneOf = <const T extends readonly [string, ...string[]]>(words: T) =>
  z.enum(words, { error: missingOr(`Choose one of ${words.join(', ')}`) });
