import { skipCSRFCheck } from '@auth/core';
import { CredentialsSignin } from '@auth/core/errors';
import Credentials from '@auth/core/providers/credentials';
import type { AuthConfig } from '@auth/core/types';
import { cookies, SESSION_MAX_AGE_S } from '#src/auth/cookies.ts';
import { signIn, signOut, startSession } from '#src/auth/signIn.ts';
import { safePath } from '#src/http/safePath.ts';
import { AppError } from '#src/errors/appError.ts';
import { reportError } from '#src/errors/reportError.ts';

class Refused extends CredentialsSignin {
  constructor(override code: string) {
    super();
  }
}

// What the integration's own `defineConfig` adds is the prefix; its package ships sources that our settings would check.
const config: Omit<AuthConfig, 'raw'> & { prefix: string } = {
  prefix: '/api/auth',
  basePath: '/api/auth',
  secret: process.env['AUTH_SECRET'],
  trustHost: true,
  // Our own server asks every unsafe request for its exact Origin, so the form needs no second token.
  skipCSRFCheck,
  session: { strategy: 'jwt', maxAge: SESSION_MAX_AGE_S },
  cookies,
  pages: { signIn: '/sign-in', error: '/sign-in', signOut: '/' },
  logger: { error: (error) => logUnlessRefused(error), warn: () => undefined, debug: () => undefined },
  providers: [
    Credentials({
      id: 'password',
      credentials: { name: {}, password: {} },
      authorize: async ({ name, password }, request) => {
        try {
          const personId = await signIn(String(name ?? ''), String(password ?? ''), request);
          if (personId) return { id: personId };
        } catch (error) {
          if (error instanceof AppError) throw new Refused(error.code);
          reportError(error, '/api/auth');
          throw new Refused('unavailable');
        }
        throw new Refused('wrong');
      },
    }),
  ],
  callbacks: {
    // The token holds the key of a row that can be revoked, and nothing about the person.
    jwt: async ({ token, user, trigger }) =>
      trigger === 'signIn' && user?.id ? { sid: await startSession(user.id) } : { sid: token['sid'] },
    session: ({ session }) => ({ expires: session.expires }),
    redirect: ({ url, baseUrl }) => {
      const path = url.startsWith(baseUrl) ? url.slice(baseUrl.length) || '/' : url;
      return `${baseUrl}${path === '/' ? '/' : pathOrSignIn(path)}`;
    },
  },
  events: {
    signOut: async (message) => {
      if ('token' in message && typeof message.token?.['sid'] === 'string') await signOut(message.token['sid']);
    },
  },
};

export default config;

// The library comes back to the sign-in page with its own error; that one path may pass.
const pathOrSignIn = (path: string): string => (path.startsWith('/sign-in?') ? path : safePath(path));

function logUnlessRefused(error: Error): void {
  if (!(error instanceof CredentialsSignin)) reportError(error, '/api/auth');
}
