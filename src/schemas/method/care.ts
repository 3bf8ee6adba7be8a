import { z } from 'zod';
import { PAIN_SITES } from '#src/domain/care/care.ts';
import { calendarDate } from '#src/schemas/method/calendarDate.ts';
import { rowList } from '#src/schemas/method/lists.ts';
import { between, flag, oneOf } from '#src/schemas/method/numbers.ts';

const report = z.strictObject({
  on: calendarDate(),
  site: oneOf(PAIN_SITES),
  pain: between(0, 10),
  nextMorning: between(0, 10).nullable().optional(),
  nightPain: flag().optional(),
  numbness: flag().optional(),
  changesSwing: flag().optional(),
});

/** Reports of pain, in any order; judged at the newest. */
export const careRequest = z.strictObject({
  under18: flag(),
  reports: rowList(report, { empty: 'Give one line a report', most: 1000 }),
});
