import type { Viewer } from '#src/access/viewer.ts';
import { sealSession } from '#src/auth/sealSession.ts';
import { hashToken, makeToken } from '#src/auth/token.ts';
import { authDb } from '#src/db/client.ts';
import { turnSession } from '#src/db/queries/sessions.ts';
import { notFound } from '#src/errors/appError.ts';

/**
 * Turns the session to another (academy, role) of the same person, under a new token: the value for the cookie.
 *
 * @throws {AppError} not-found if that membership is not theirs or has ended
 */
export async function actAs(viewer: Viewer, membershipId: string): Promise<string> {
  const token = makeToken();
  const { sessionId, personId } = viewer;
  const turned = await turnSession(authDb(), { sessionId, personId, membershipId, tokenHash: hashToken(token) });
  if (!turned) notFound('membership');
  return sealSession(token);
}
