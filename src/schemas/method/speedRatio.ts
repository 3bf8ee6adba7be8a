import { z } from 'zod';
import { fromZero } from '#src/schemas/method/numbers.ts';

/** Both speeds in one unit. */
export const speedRatioRequest = z.strictObject({ ballSpeed: fromZero(1000), clubSpeed: fromZero(1000) });
