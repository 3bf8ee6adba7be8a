import { randomUUID } from 'node:crypto';
import { hashPassword } from '#src/auth/password.ts';
import { requirePassword } from '#src/auth/requirePassword.ts';
import { hashToken, makeToken } from '#src/auth/token.ts';
import { asAuth, authDb } from '#src/db/client.ts';
import { findMemberByEmail, revokeSessions, setCredential } from '#src/db/queries/accounts.ts';
import { findReset, insertReset, revokeResets, useToken } from '#src/db/queries/tokens.ts';
import { notFound } from '#src/errors/appError.ts';
import { writeAudit } from '#src/services/audit.ts';
import { enqueueMail } from '#src/services/mail/enqueueMail.ts';
import { sealToken } from '#src/services/mail/sealToken.ts';

const MINUTES = 10;

/**
 * Sends a link for a new password where the address is a member's, and does nothing where it is nobody's. Whoever asks
 * is answered before this is done: neither the answer nor its time tells which.
 */
export async function sendReset(email: string): Promise<void> {
  const member = await authDb()
    .transaction()
    .execute((trx) => findMemberByEmail(trx, email));
  if (!member) return;
  const { personId, academyId } = member;
  const [id, token] = [randomUUID(), makeToken()];
  await asAuth(academyId, async (trx) => {
    await revokeResets(trx, personId);
    await insertReset(trx, { id, tokenHash: hashToken(token), personId, minutes: MINUTES });
    await enqueueMail(trx, null, {
      ...{ kind: 'reset', personId, key: `reset:${id}` },
      payload: { sealed: sealToken(token) },
    });
  });
}

/** Whether a link for a new password can still be used. Asking uses nothing up. */
export async function isResetOpen(token: string): Promise<boolean> {
  return (await findOpen(token)) !== undefined;
}

const findOpen = (token: string) =>
  authDb()
    .transaction()
    .execute((trx) => findReset(trx, hashToken(token)));

/**
 * Sets a new password, uses the link up and ends every session of the person.
 *
 * @throws {AppError} not-found for a link that is unknown, used or past; invalid for a weak password
 */
export async function resetPassword(token: string, password: string): Promise<void> {
  const { personId, givenName, familyName } = (await findOpen(token)) ?? notFound('link');
  requirePassword(password, [givenName, familyName, `${givenName} ${familyName}`]);
  const passwordHash = await hashPassword(password);
  await authDb()
    .transaction()
    .execute(async (trx) => {
      if (!(await useToken(trx, 'reset', hashToken(token)))) notFound('link');
      await setCredential(trx, personId, passwordHash);
      await revokeResets(trx, personId);
      await revokeSessions(trx, personId);
      await writeAudit(trx, null, { action: 'reset', subject: 'password', subjectId: personId });
    });
}
