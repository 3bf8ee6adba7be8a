import { z } from 'zod';
import { numberList, rowList } from '#src/schemas/method/lists.ts';

const row = numberList({ empty: 'Give one number a trial', most: 100 });

/** Rows are people, columns are trials. */
export const reliabilityRequest = z.strictObject({
  table: rowList(row, { empty: 'Give one row a person', most: 10_000 }).superRefine((table, context) => {
    const width = table[0]!.length;
    const odd = table.findIndex((each) => each.length !== width);
    if (odd === -1) return;
    const message = `Give every person as many trials as the first, ${width}`;
    context.addIssue({ code: 'custom', path: [odd], message });
  }),
});
