import { encode } from '@auth/core/jwt';
import { SESSION_COOKIE, SESSION_MAX_AGE_S } from '#src/auth/cookies.ts';

/** A session's token as the cookie carries it. */
export const sealSession = (token: string): Promise<string> =>
  encode({
    token: { sid: token },
    secret: process.env['AUTH_SECRET'] ?? '',
    salt: SESSION_COOKIE,
    maxAge: SESSION_MAX_AGE_S,
  });
