import { createHash, randomBytes } from 'node:crypto';

/** A fresh 256-bit token for a session, as text for the cookie. */
export const makeToken = (): string => randomBytes(32).toString('base64url');

/** What the database keeps of a token: it cannot be turned back into one. */
export const hashToken = (token: string): Buffer => createHash('sha256').update(token).digest();
