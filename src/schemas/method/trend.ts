import { z } from 'zod';
import { TREND_MOST_POINTS } from '#src/domain/trend/trendMostPoints.ts';
import { numberList } from '#src/schemas/method/lists.ts';
import { oneOf } from '#src/schemas/method/numbers.ts';

/** One y for each x. */
export const trendRequest = z
  .strictObject({
    x: numberList({ empty: 'Give one number a point', most: TREND_MOST_POINTS }),
    y: numberList({ empty: 'Give one number a point', most: TREND_MOST_POINTS }),
    alternative: oneOf(['two-sided', 'greater', 'less']).optional(),
  })
  .refine(({ x, y }) => x.length === y.length, { path: ['y'], message: 'Give as many y as x' });
