import { randomUUID } from 'node:crypto';
import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer } from '#src/db/client.ts';
import { isUniqueViolation } from '#src/db/isUniqueViolation.ts';
import { listMembers, listRoster, listSquadsWithCoaches } from '#src/db/queries/people.ts';
import * as queries from '#src/db/queries/programmeWrites.ts';
import { invalid, notFound } from '#src/errors/appError.ts';
import type { NewAthlete } from '#src/schemas/people.ts';
import { writeAudit } from '#src/services/audit.ts';

/** Squads with their coaches and athletes, and everyone who could coach them. */
export function listSquadsToManage(viewer: Viewer) {
  requirePermission(viewer, 'programme:manage');
  return asViewer(viewer, async (trx) => {
    const [squads, members, athletes] = [
      await listSquadsWithCoaches(trx),
      await listMembers(trx),
      await listRoster(trx),
    ];
    const coaches = members.filter(({ role }) => role === 'strength_coach' || role === 'swing_coach');
    return { squads, coaches, athletes };
  });
}

/**
 * Makes a squad.
 *
 * @throws {AppError} forbidden, invalid where there is one of this name
 */
export async function addSquad(viewer: Viewer, name: string): Promise<{ id: string }> {
  requirePermission(viewer, 'programme:manage');
  const id = randomUUID();
  await withFreeName(() =>
    asViewer(viewer, async (trx) => {
      await queries.insertSquad(trx, id, name);
      await writeAudit(trx, viewer, { action: 'add', subject: 'squad', subjectId: id });
    }),
  );
  return { id };
}

/**
 * Renames a squad.
 *
 * @throws {AppError} forbidden, not-found, invalid where there is one of this name
 */
export async function renameSquad(viewer: Viewer, id: string, name: string): Promise<void> {
  requirePermission(viewer, 'programme:manage');
  await withFreeName(() =>
    asViewer(viewer, async (trx) => {
      if (!(await queries.renameSquad(trx, id, name))) notFound('squad');
      await writeAudit(trx, viewer, { action: 'rename', subject: 'squad', subjectId: id });
    }),
  );
}

async function withFreeName(work: () => Promise<void>): Promise<void> {
  try {
    await work();
  } catch (error) {
    if (isUniqueViolation(error)) invalid('name', 'There is a squad of this name');
    throw error;
  }
}

/**
 * Sets the coaches of a squad, all of them: whoever is not named coaches it no more.
 *
 * @throws {AppError} forbidden, not-found for a squad or a coach that is not the academy's
 */
export function setSquadCoaches(viewer: Viewer, squadId: string, personIds: readonly string[]): Promise<void> {
  requirePermission(viewer, 'programme:manage');
  return asViewer(viewer, async (trx) => {
    if ((await queries.countSquads(trx, [squadId])) !== 1) notFound('squad');
    if ((await queries.countCoaches(trx, personIds)) !== new Set(personIds).size) notFound('coach');
    await queries.setSquadCoaches(trx, squadId, [...new Set(personIds)]);
    await writeAudit(trx, viewer, {
      ...{ action: 'set coaches', subject: 'squad', subjectId: squadId },
      change: { coaches: personIds },
    });
  });
}

/**
 * Adds an athlete to a squad, with what they play.
 *
 * @throws {AppError} forbidden, not-found for a squad that is not the academy's, invalid for a birth that is to come
 */
export function addAthlete(viewer: Viewer, athlete: NewAthlete): Promise<{ id: string }> {
  requirePermission(viewer, 'programme:manage');
  if (athlete.birthDate > new Date().toISOString().slice(0, 10)) invalid('year', 'This date is to come');
  const id = randomUUID();
  return asViewer(viewer, async (trx) => {
    if ((await queries.countSquads(trx, [athlete.squadId])) !== 1) notFound('squad');
    await queries.insertAthlete(trx, { id, ...athlete }, viewer.personId);
    await writeAudit(trx, viewer, { action: 'add', subject: 'athlete', subjectId: id, athleteId: id });
    return { id };
  });
}

/**
 * Moves an athlete to another squad. What was measured stays where it was measured.
 *
 * @throws {AppError} forbidden, not-found
 */
export function moveAthlete(viewer: Viewer, athleteId: string, squadId: string): Promise<void> {
  requirePermission(viewer, 'programme:manage');
  return asViewer(viewer, async (trx) => {
    if ((await queries.countSquads(trx, [squadId])) !== 1) notFound('squad');
    if (!(await queries.moveAthlete(trx, athleteId, squadId))) notFound('athlete');
    await writeAudit(trx, viewer, {
      ...{ action: 'move', subject: 'athlete', subjectId: athleteId, athleteId },
      change: { squadId },
    });
  });
}
