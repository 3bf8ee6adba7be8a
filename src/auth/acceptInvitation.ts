import { randomUUID } from 'node:crypto';
import type { z } from 'zod';
import type { Viewer } from '#src/access/viewer.ts';
import { hashPassword } from '#src/auth/password.ts';
import { requirePassword } from '#src/auth/requirePassword.ts';
import { hashToken } from '#src/auth/token.ts';
import { asAuth, authDb, type Tx } from '#src/db/client.ts';
import { isUniqueViolation } from '#src/db/isUniqueViolation.ts';
import { addChildren, addCoachSquads, addMembership, insertAccount, linkAthlete } from '#src/db/queries/accounts.ts';
import { findInvitation, useToken } from '#src/db/queries/tokens.ts';
import { AppError, invalid, notFound } from '#src/errors/appError.ts';
import type { acceptInvitation as schema } from '#src/schemas/people.ts';
import { writeAudit } from '#src/services/audit.ts';

type Invitation = NonNullable<Awaited<ReturnType<typeof showInvitation>>>;

/** What an invitation is, for its page. Showing it uses nothing up: mail scanners open links too. */
export async function showInvitation(token: string) {
  const found = await authDb()
    .transaction()
    .execute((trx) => findInvitation(trx, hashToken(token)));
  if (!found?.academyId || !found.email || !found.role) return undefined;
  return { ...found, academyId: found.academyId, email: found.email, role: found.role };
}

/**
 * Accepts an invitation: makes the person (or takes the signed-in one, whose address it must be), gives the role with
 * its squads or children, and uses the token up. Of any number at once, one gets it.
 *
 * @throws {AppError} not-found for a token that is unknown, used, revoked or past; conflict where another person is
 *   signed in, or the address has a sign-in and nobody is; invalid
 */
export async function acceptInvitation(
  viewer: Viewer | null,
  input: z.infer<typeof schema>,
): Promise<{ personId: string; membershipId: string }> {
  const invitation = (await showInvitation(input.token)) ?? notFound('invitation');
  if ((viewer?.personId ?? null) !== invitation.personId) {
    throw new AppError('conflict', 'This invitation is for another address than the one that is signed in');
  }
  const account = viewer ? null : await newAccount(invitation, input);
  try {
    return await asAuth(invitation.academyId, async (trx) => {
      if (!(await useToken(trx, 'invite', hashToken(input.token)))) notFound('invitation');
      if (account) await insertAccount(trx, account);
      const personId = viewer?.personId ?? account!.personId;
      const membershipId = await joinAs(trx, invitation, personId);
      await writeAudit(trx, null, {
        ...{ action: 'accept', subject: 'invitation', subjectId: invitation.id },
        change: { personId, role: invitation.role },
      });
      return { personId, membershipId };
    });
  } catch (error) {
    if (isUniqueViolation(error)) throw new AppError('conflict', 'This address has a sign-in by now');
    throw error;
  }
}

async function newAccount(invitation: Invitation, { givenName, familyName, password }: z.infer<typeof schema>) {
  if (!givenName) invalid('givenName', 'Your given name');
  if (!familyName) invalid('familyName', 'Your family name');
  if (!password) invalid('password', 'A password');
  const { academyName, email } = invitation;
  requirePassword(password, [academyName, givenName, familyName, `${givenName} ${familyName}`, email.split('@')[0]!]);
  const passwordHash = await hashPassword(password);
  return { personId: randomUUID(), givenName, familyName, contact: { email }, passwordHash };
}

async function joinAs(trx: Tx, { academyId, role, squadIds, athleteIds }: Invitation, personId: string) {
  const membershipId = await addMembership(trx, academyId, personId, role);
  await addCoachSquads(trx, academyId, personId, squadIds);
  if (role === 'guardian') await addChildren(trx, academyId, personId, athleteIds);
  if (role === 'athlete' && !(await linkAthlete(trx, academyId, athleteIds[0]!, personId))) {
    throw new AppError('conflict', 'This athlete has a sign-in by now');
  }
  return membershipId;
}
