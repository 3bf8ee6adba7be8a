import { z } from 'zod';
import { fromZero, whole } from '#src/schemas/method/numbers.ts';

/** A load and how often it was lifted. */
export const oneRepMaxRequest = z.strictObject({ load: fromZero(1e6), reps: whole(1, 1000) });
