import { acceptInvitation } from '#src/auth/acceptInvitation.ts';
import { actAs } from '#src/auth/actingAs.ts';
import { cookieFlags, SESSION_COOKIE, SESSION_MAX_AGE_S } from '#src/auth/cookies.ts';
import { clientAddress, consumeLink } from '#src/auth/limits.ts';
import { sealSession } from '#src/auth/sealSession.ts';
import { startSession } from '#src/auth/signIn.ts';
import { viewerOf } from '#src/auth/viewerOf.ts';
import { handleLink } from '#src/http/handleLink.ts';
import { acceptInvitation as schema } from '#src/schemas/people.ts';

/** Accepts, and goes on signed in as the role that was accepted. */
export const POST = handleLink('/invite', schema, async (input, context) => {
  await consumeLink(clientAddress(context.request));
  const viewer = await viewerOf(context.request);
  const { personId, membershipId } = await acceptInvitation(viewer, input);
  const cookie = viewer ? await actAs(viewer, membershipId) : await sealSession(await startSession(personId));
  context.cookies.set(SESSION_COOKIE, cookie, { ...cookieFlags, maxAge: SESSION_MAX_AGE_S });
  return '/today';
});
