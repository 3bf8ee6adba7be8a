import { createHash, randomBytes, randomUUID } from 'node:crypto';
import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer, type Tx } from '#src/db/client.ts';
import { listMembers, listRoster, listSquadsWithCoaches, listUninvited, markInvited } from '#src/db/queries/people.ts';
import { countSquads } from '#src/db/queries/programmeWrites.ts';
import * as tokens from '#src/db/queries/tokens.ts';
import { AppError, invalid, notFound } from '#src/errors/appError.ts';
import type { Invitation } from '#src/schemas/people.ts';
import { writeAudit } from '#src/services/audit.ts';
import { enqueueMail } from '#src/services/mail/enqueueMail.ts';
import { sealToken } from '#src/services/mail/sealToken.ts';

const DAYS = 7;

/** Everything of the people page: members, invitations that wait, addresses not invited, athletes, squads. */
export function listPeople(viewer: Viewer) {
  requirePermission(viewer, 'people:manage');
  return asViewer(viewer, async (trx) => ({
    members: await listMembers(trx),
    invitations: await tokens.listInvitations(trx),
    uninvited: await listUninvited(trx),
    athletes: await listRoster(trx),
    squads: await listSquadsWithCoaches(trx),
  }));
}

/**
 * Invites someone by e-mail: staff with squads, a parent with children, or an athlete of the own-account age. An earlier
 * invitation of this address and role is revoked.
 *
 * @throws {AppError} forbidden, invalid, not-found for squads or athletes that are not the academy's
 */
export function invite(viewer: Viewer, invitation: Invitation): Promise<{ id: string }> {
  requirePermission(viewer, 'people:manage');
  const { email, role, squadIds, athleteIds } = invitation;
  return asViewer(viewer, async (trx) => {
    await requireOwn(trx, invitation);
    const id = randomUUID();
    const token = randomBytes(32).toString('base64url');
    const tokenHash = createHash('sha256').update(token).digest();
    await tokens.revokeEarlier(trx, email, role);
    await tokens.insertInvitation(trx, {
      ...{ id, tokenHash, email, role, squadIds, athleteIds },
      ...{ by: viewer.personId, days: DAYS },
    });
    if (role === 'guardian') await markInvited(trx, email, athleteIds);
    await enqueueMail(trx, viewer, {
      ...{ kind: 'invite', address: email, key: `invite:${id}` },
      payload: { sealed: sealToken(token), academyName: viewer.academyName, role },
    });
    await writeAudit(trx, viewer, {
      ...{ action: 'invite', subject: 'invitation', subjectId: id },
      change: { role, squads: squadIds.length, athletes: athleteIds.length },
    });
    return { id };
  });
}

async function requireOwn(trx: Tx, { role, squadIds, athleteIds }: Invitation): Promise<void> {
  if ((await countSquads(trx, squadIds)) !== new Set(squadIds).size) notFound('squad');
  if (athleteIds.length === 0) return;
  const roster = new Map((await listRoster(trx)).map((athlete) => [athlete.id, athlete]));
  for (const id of athleteIds) {
    const athlete = roster.get(id) ?? notFound('athlete');
    if (role !== 'athlete') continue;
    if (athlete.hasSignIn) throw new AppError('conflict', 'This athlete has a sign-in');
    if (!athlete.mayHaveOwn) invalid('athleteIds', 'A parent makes a user name for an athlete of this age');
  }
}

/**
 * Revokes an invitation that waits: its link opens nothing from now on.
 *
 * @throws {AppError} forbidden, not-found
 */
export function revokeInvitation(viewer: Viewer, id: string): Promise<void> {
  requirePermission(viewer, 'people:manage');
  return asViewer(viewer, async (trx) => {
    if (!(await tokens.revokeInvitation(trx, id))) notFound('invitation');
    await writeAudit(trx, viewer, { action: 'revoke', subject: 'invitation', subjectId: id });
  });
}
