import type { Viewer } from '#src/access/viewer.ts';
import { consumePresent } from '#src/auth/limits.ts';
import { hashPassword, verifyPassword } from '#src/auth/password.ts';
import { requirePassword } from '#src/auth/requirePassword.ts';
import { asAuth, authDb } from '#src/db/client.ts';
import { findAccount, revokeSessions, setCredential } from '#src/db/queries/accounts.ts';
import { revokeResets } from '#src/db/queries/tokens.ts';
import { invalid } from '#src/errors/appError.ts';
import { writeAudit } from '#src/services/audit.ts';

/**
 * Changes one's own password and ends every other session.
 *
 * @throws {AppError} invalid for `present` or `password`; too-many
 */
export async function changePassword(viewer: Viewer, present: string, password: string): Promise<void> {
  const { personId, academyId, academyName, sessionId } = viewer;
  await consumePresent(personId);
  const account = await authDb()
    .transaction()
    .execute((trx) => findAccount(trx, personId));
  if (!(await verifyPassword(account?.passwordHash ?? undefined, present))) {
    invalid('present', 'That is not your present password');
  }
  requirePassword(password, [academyName, viewer.name, account?.userName ?? '', account?.email?.split('@')[0] ?? '']);
  const passwordHash = await hashPassword(password);
  await asAuth(academyId, async (trx) => {
    await setCredential(trx, personId, passwordHash);
    await revokeResets(trx, personId);
    await revokeSessions(trx, personId, sessionId);
    await writeAudit(trx, viewer, { action: 'change', subject: 'password', subjectId: personId });
  });
}
