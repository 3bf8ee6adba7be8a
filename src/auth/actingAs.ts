import { encode } from '@auth/core/jwt';
import type { Viewer } from '#src/access/viewer.ts';
import { SESSION_COOKIE, SESSION_MAX_AGE_S } from '#src/auth/cookies.ts';
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
  return encode({
    token: { sid: token },
    secret: process.env['AUTH_SECRET'] ?? '',
    salt: SESSION_COOKIE,
    maxAge: SESSION_MAX_AGE_S,
  });
}
