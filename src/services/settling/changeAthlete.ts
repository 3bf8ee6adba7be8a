import type { z } from 'zod';
import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer } from '#src/db/client.ts';
import { findAthlete } from '#src/db/queries/athletes.ts';
import * as queries from '#src/db/queries/settling.ts';
import { notFound } from '#src/errors/appError.ts';
import type {
  correctHandedness as handednessSchema,
  setRestriction as restrictionSchema,
} from '#src/schemas/settle.ts';
import { writeAudit } from '#src/services/audit.ts';
import { rejudgeWithin } from '#src/services/judging/judgeAthletes.ts';

/**
 * Corrects what an athlete plays. Every lead and trail figure follows, old sessions included, and the athlete is judged
 * again.
 *
 * @throws {AppError} forbidden, not-found
 */
export function correctHandedness(
  viewer: Viewer,
  athleteId: string,
  { plays, reason }: z.infer<typeof handednessSchema>,
) {
  requirePermission(viewer, 'handedness:correct');
  return asViewer(viewer, async (trx) => {
    const athlete = (await findAthlete(trx, athleteId)) ?? notFound('athlete');
    await queries.insertHandedness(trx, { athleteId, plays, reason, by: viewer.personId });
    await writeAudit(trx, viewer, {
      ...{ action: 'correct', subject: 'handedness', subjectId: athleteId, athleteId },
      change: { from: athlete.plays, to: plays },
    });
    if (athlete.plays !== plays) await rejudgeWithin(trx, viewer, [athleteId], 'handedness corrected');
  });
}

/**
 * Sets what a child may and may not do, above everything on every screen of theirs.
 *
 * @throws {AppError} forbidden, not-found
 */
export function setRestriction(viewer: Viewer, athleteId: string, { allowed }: z.infer<typeof restrictionSchema>) {
  requirePermission(viewer, 'restriction:set');
  return asViewer(viewer, async (trx) => {
    if (!(await findAthlete(trx, athleteId))) notFound('athlete');
    const id = await queries.insertRestriction(trx, { athleteId, allowed, by: viewer.personId });
    await writeAudit(trx, viewer, { action: 'set', subject: 'restriction', subjectId: id, athleteId });
    return { id };
  });
}

/**
 * Clears a restriction.
 *
 * @throws {AppError} forbidden, not-found if none of this id is in force in scope
 */
export function clearRestriction(viewer: Viewer, restrictionId: string): Promise<{ athleteId: string }> {
  requirePermission(viewer, 'restriction:clear');
  return asViewer(viewer, async (trx) => {
    const cleared = (await queries.clearRestriction(trx, restrictionId, viewer.personId)) ?? notFound('restriction');
    const { athleteId } = cleared;
    await writeAudit(trx, viewer, { action: 'clear', subject: 'restriction', subjectId: restrictionId, athleteId });
    return { athleteId };
  });
}
