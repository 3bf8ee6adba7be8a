import { numberList } from '#src/schemas/method/lists.ts';
import { between } from '#src/schemas/method/numbers.ts';

/** Samples a second. */
export const sampleRate = () => between(1, 100_000);

/** Samples of one plate, newton. */
export const forceSamples = () =>
  numberList({ empty: 'Give the samples of the force', most: 1_000_000, min: -1e6, max: 1e6 });
