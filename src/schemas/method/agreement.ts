import { z } from 'zod';
import { rowList } from '#src/schemas/method/lists.ts';
import { oneOf } from '#src/schemas/method/numbers.ts';

const side = () => oneOf(['lead', 'trail', 'none']);

/** The weaker side in two tests or sessions, one pair a comparison. */
export const agreementRequest = z.strictObject({
  pairs: rowList(z.tuple([side(), side()], { error: 'Give two sides, as in lead trail' }), {
    empty: 'Give one pair of sides a comparison',
    most: 10_000,
  }),
});
