import { clientAddress, consumeSignIn, forgiveSignIn } from '#src/auth/limits.ts';
import { SESSION_MAX_AGE_S } from '#src/auth/cookies.ts';
import { verifyPassword } from '#src/auth/password.ts';
import { hashToken, makeToken } from '#src/auth/token.ts';
import { authDb } from '#src/db/client.ts';
import { findCredential, insertSession, listMemberships, revokeSession } from '#src/db/queries/sessions.ts';
import { AppError } from '#src/errors/appError.ts';

const LONGEST_PASSWORD = 256;

/**
 * The id of the person with this name (e-mail or user name) and password, or undefined. An unknown name and a wrong
 * password take the same time and give the same answer.
 *
 * @throws {AppError} too-many
 */
export async function signIn(name: string, password: string, request: Request): Promise<string | undefined> {
  const known = name.trim().toLowerCase();
  if (!known || known.length > 200 || !password || password.length > LONGEST_PASSWORD) return undefined;
  await consumeSignIn(known, clientAddress(request));
  const found = await findCredential(authDb(), known);
  if (!(await verifyPassword(found?.passwordHash, password))) return undefined;
  await forgiveSignIn(known);
  return found?.personId;
}

/**
 * Starts a session in the person's first membership and returns its token.
 *
 * @throws {AppError} forbidden if the person belongs to no academy now
 */
export async function startSession(personId: string): Promise<string> {
  const [first] = await listMemberships(authDb(), personId);
  if (!first) throw new AppError('forbidden', 'No academy');
  const token = makeToken();
  const expiresAt = new Date(Date.now() + SESSION_MAX_AGE_S * 1000);
  await insertSession(authDb(), { tokenHash: hashToken(token), personId, membershipId: first.id, expiresAt });
  return token;
}

/** Ends the session of this token. */
export const signOut = (token: string): Promise<void> => revokeSession(authDb(), hashToken(token));
