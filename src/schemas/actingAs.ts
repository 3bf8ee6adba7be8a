import { z } from 'zod';

/** Which of one's own memberships to act as from now on. */
export const actingAs = z.strictObject({ membershipId: z.uuid() });
