import { z } from 'zod';

/** What each kind of message carries: ids, names of squads and academies, never a health detail. */
export const mailPayloads = {
  outrun: z.strictObject({
    outrunId: z.uuid(),
    squadName: z.string().min(1).max(60),
    level: z.enum(['look', 'act']),
    /** Raised now, or its level has risen. */
    risen: z.boolean(),
  }),
  invite: z.strictObject({
    /** The token, sealed; gone from the row once the message is sent. */
    sealed: z.string().min(1).max(400),
    academyName: z.string().min(1).max(120),
    role: z.enum(['director', 'strength_coach', 'swing_coach', 'guardian', 'athlete']),
  }),
  reset: z.strictObject({ sealed: z.string().min(1).max(400) }),
};

export type MailKind = keyof typeof mailPayloads;
export type MailPayload<Kind extends MailKind> = z.infer<(typeof mailPayloads)[Kind]>;
