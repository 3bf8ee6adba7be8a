import { z } from 'zod';
import { numberList } from '#src/schemas/method/lists.ts';
import { fromZero, oneOf } from '#src/schemas/method/numbers.ts';

const trials = () => numberList({ empty: 'Give one number a trial', most: 10_000, min: 0 });
const percent = () => fromZero(1000);

/** Trials of both legs in one unit, and where their noise comes from. */
export const asymmetryRequest = z.strictObject({
  lead: trials(),
  trail: trials(),
  better: oneOf(['higher', 'lower']).optional(),
  noise: z
    .union(
      [
        z.literal('trials'),
        z.strictObject({ cvPct: percent() }),
        z.strictObject({
          typicalErrorPct: z.union([percent(), z.strictObject({ lead: percent(), trail: percent() })]),
        }),
      ],
      { error: 'Give either a typical error (for both legs) or one coefficient of variation, in per cent from 0' },
    )
    .optional(),
});
