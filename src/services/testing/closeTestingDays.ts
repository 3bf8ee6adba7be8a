import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer, type Tx } from '#src/db/client.ts';
import { listAthletesTested, lockTestingDays, setDaysClosed } from '#src/db/queries/testingDays.ts';
import { notFound } from '#src/errors/appError.ts';
import { writeAudit } from '#src/services/audit.ts';
import { rejudgeWithin, type Judged } from '#src/services/judging/judgeAthletes.ts';

/**
 * Closes days without judging, for a caller who judges once for all that a date brought.
 *
 * @returns the athletes with a trial on these days
 */
export async function markDaysClosedWithin(trx: Tx, viewer: Viewer, ids: readonly string[]): Promise<string[]> {
  requirePermission(viewer, 'testing-day:close');
  if (ids.length === 0) return [];
  const days = await lockTestingDays(trx, ids);
  if (days.length !== new Set(ids).size) notFound('testing day');
  const open = days.filter(({ state }) => state === 'open');
  if (open.length > 0)
    await setDaysClosed(
      trx,
      open.map(({ id }) => id),
      viewer.personId,
    );
  for (const { id } of open) await writeAudit(trx, viewer, { action: 'close', subject: 'testing_day', subjectId: id });
  return listAthletesTested(trx, ids);
}

/** `closeTestingDays` within another's transaction. */
export async function closeTestingDaysWithin(trx: Tx, viewer: Viewer, ids: readonly string[]): Promise<Judged[]> {
  const athleteIds = await markDaysClosedWithin(trx, viewer, ids);
  return rejudgeWithin(trx, viewer, athleteIds, 'a closed testing day');
}

/**
 * Closes testing days and judges the athletes who were tested, in one transaction. Closing a closed day judges again.
 *
 * @throws {AppError} forbidden, not-found
 */
export const closeTestingDays = (viewer: Viewer, ids: readonly string[]): Promise<Judged[]> =>
  asViewer(viewer, (trx) => closeTestingDaysWithin(trx, viewer, ids));
