import { z } from 'zod';

/** Confirming or voiding a value; `version` is the one that was on the screen. */
export const settle = z
  .strictObject({
    verdict: z.enum(['confirm', 'void']),
    reason: z.string().trim().min(1).max(200).optional(),
    version: z.coerce.number().int().min(1),
  })
  .refine(({ verdict, reason }) => verdict === 'confirm' || reason !== undefined, {
    path: ['reason'],
    message: 'Say why the value is void',
  });
export type Settle = z.infer<typeof settle>;

/** What an athlete plays, corrected for good: every lead and trail figure follows. */
export const correctHandedness = z.strictObject({
  plays: z.enum(['left', 'right']),
  reason: z.string().trim().min(1).max(200),
});

/** What a child may and may not do; never why. */
export const setRestriction = z.strictObject({ allowed: z.string().trim().min(1).max(500) });

/** Nothing to say beside the act itself. */
export const nothing = z.strictObject({});
