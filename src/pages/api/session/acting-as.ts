import { actAs } from '#src/auth/actingAs.ts';
import { cookieFlags, SESSION_COOKIE, SESSION_MAX_AGE_S } from '#src/auth/cookies.ts';
import { handle } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { actingAs } from '#src/schemas/actingAs.ts';

export const POST = handle(async (viewer, context) => {
  const { input, done } = await readInput(context, actingAs);
  const token = await actAs(viewer, input.membershipId);
  context.cookies.set(SESSION_COOKIE, token, { ...cookieFlags, maxAge: SESSION_MAX_AGE_S });
  return done({ actingAs: input.membershipId }, '/today');
});
