import { getToken } from '@auth/core/jwt';
import type { Viewer } from '#src/access/viewer.ts';
import { SESSION_COOKIE } from '#src/auth/cookies.ts';
import { hashToken } from '#src/auth/token.ts';
import { authDb } from '#src/db/client.ts';
import { findLiveSession, touchSession } from '#src/db/queries/sessions.ts';

/** Who is signed in behind this request, with the role they hold now; null for a stranger or an ended session. */
export async function viewerOf(request: Request): Promise<Viewer | null> {
  const token = await sessionToken(request);
  if (!token) return null;
  const live = await findLiveSession(authDb(), hashToken(token));
  if (!live) return null;
  if (Date.now() - live.lastSeenAt.getTime() > 60_000) await touchSession(authDb(), live.sessionId);
  const { lastSeenAt, ...viewer } = live;
  return viewer;
}

async function sessionToken(request: Request): Promise<string | null> {
  if (!request.headers.get('cookie')?.includes(SESSION_COOKIE)) return null;
  const token = await getToken({
    req: request,
    secret: process.env['AUTH_SECRET'] ?? '',
    cookieName: SESSION_COOKIE,
    salt: SESSION_COOKIE,
    secureCookie: true,
  });
  return typeof token?.['sid'] === 'string' ? token['sid'] : null;
}
