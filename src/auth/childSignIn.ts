import { randomUUID } from 'node:crypto';
import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { hashPassword } from '#src/auth/password.ts';
import { requirePassword } from '#src/auth/requirePassword.ts';
import { asAuth, asViewer } from '#src/db/client.ts';
import { isUniqueViolation } from '#src/db/isUniqueViolation.ts';
import {
  addMembership,
  findAccount,
  insertAccount,
  linkAthlete,
  revokeSessions,
  setCredential,
} from '#src/db/queries/accounts.ts';
import { findChild } from '#src/db/queries/children.ts';
import { AppError, invalid, notFound } from '#src/errors/appError.ts';
import { writeAudit } from '#src/services/audit.ts';

/**
 * Makes a user name and a password for one's own child below the academy's own-account age. No e-mail is asked for.
 *
 * @throws {AppError} forbidden, not-found, conflict where the child has a sign-in or is old enough for an invitation of
 *   their own, invalid
 */
export async function makeChildSignIn(
  viewer: Viewer,
  athleteId: string,
  { userName, password }: { userName: string; password: string },
): Promise<void> {
  const child = await requireYoungChild(viewer, athleteId);
  if (child.personId) throw new AppError('conflict', 'The child has a sign-in');
  const { givenName, familyName } = child;
  requirePassword(password, [viewer.academyName, givenName, familyName, `${givenName} ${familyName}`, userName]);
  const passwordHash = await hashPassword(password);
  const personId = randomUUID();
  try {
    await asAuth(viewer.academyId, async (trx) => {
      await insertAccount(trx, { personId, givenName, familyName, contact: { user_name: userName }, passwordHash });
      await addMembership(trx, viewer.academyId, personId, 'athlete');
      if (!(await linkAthlete(trx, viewer.academyId, athleteId, personId))) {
        throw new AppError('conflict', 'The child has a sign-in by now');
      }
      await writeAudit(trx, viewer, { action: 'make', subject: 'child sign-in', subjectId: personId, athleteId });
    });
  } catch (error) {
    if (isUniqueViolation(error)) invalid('userName', 'Someone has this user name');
    throw error;
  }
}

/**
 * Sets another password for the user name of one's own child, and ends the child's sessions.
 *
 * @throws {AppError} forbidden, not-found, conflict where the child has no user name, invalid
 */
export async function setChildPassword(viewer: Viewer, athleteId: string, password: string): Promise<void> {
  const { personId, givenName, familyName } = await requireYoungChild(viewer, athleteId);
  if (!personId) throw new AppError('conflict', 'The child has no sign-in');
  requirePassword(password, [viewer.academyName, givenName, familyName, `${givenName} ${familyName}`]);
  const passwordHash = await hashPassword(password);
  await asAuth(viewer.academyId, async (trx) => {
    // Who signs in by e-mail sets their own.
    if (!(await findAccount(trx, personId))?.userName) throw new AppError('conflict', 'The child has no user name');
    await setCredential(trx, personId, passwordHash);
    await revokeSessions(trx, personId);
    await writeAudit(trx, viewer, { action: 'set', subject: 'child password', subjectId: personId, athleteId });
  });
}

/**
 * Whether a parent makes or may change the child's sign-in, for the child's page.
 *
 * @throws {AppError} forbidden, not-found
 */
export async function childSignInState(
  viewer: Viewer,
  athleteId: string,
): Promise<{ state: 'none' | 'user name' | 'own'; userName: string | null; ownAccountAge: number }> {
  requirePermission(viewer, 'child-sign-in:make');
  const child = (await asViewer(viewer, (trx) => findChild(trx, athleteId))) ?? notFound('athlete');
  const { personId, ownAccountAge } = child;
  if (!child.isYoung) return { state: 'own', userName: null, ownAccountAge };
  if (!personId) return { state: 'none', userName: null, ownAccountAge };
  const account = await asAuth(viewer.academyId, (trx) => findAccount(trx, personId));
  const userName = account?.userName ?? null;
  return { state: userName ? 'user name' : 'own', userName, ownAccountAge };
}

async function requireYoungChild(viewer: Viewer, athleteId: string) {
  requirePermission(viewer, 'child-sign-in:make');
  const child = (await asViewer(viewer, (trx) => findChild(trx, athleteId))) ?? notFound('athlete');
  if (!child.isYoung) throw new AppError('conflict', 'The director invites this athlete by e-mail');
  return child;
}
