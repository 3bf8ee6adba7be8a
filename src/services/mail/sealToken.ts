import { createCipheriv, createDecipheriv, hkdfSync, randomBytes } from 'node:crypto';

// A message that waits must hold the link it will carry, while the database keeps no token that opens anything.
const key = (): Buffer => Buffer.from(hkdfSync('sha256', process.env['AUTH_SECRET'] ?? '', '', 'marram outbox', 32));

/** A token as the outbox may hold it: useless without the server's own secret. */
export function sealToken(token: string): string {
  const iv = randomBytes(12);
  const cipher = createCipheriv('aes-256-gcm', key(), iv);
  const body = Buffer.concat([cipher.update(token, 'utf8'), cipher.final()]);
  return Buffer.concat([iv, cipher.getAuthTag(), body]).toString('base64url');
}

/**
 * The token again.
 *
 * @throws {Error} where it was sealed under another secret, or changed
 */
export function unsealToken(sealed: string): string {
  const bytes = Buffer.from(sealed, 'base64url');
  const decipher = createDecipheriv('aes-256-gcm', key(), bytes.subarray(0, 12));
  decipher.setAuthTag(bytes.subarray(12, 28));
  return Buffer.concat([decipher.update(bytes.subarray(28)), decipher.final()]).toString('utf8');
}
