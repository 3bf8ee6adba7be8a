import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer, type Tx } from '#src/db/client.ts';
import * as queries from '#src/db/queries/settling.ts';
import { AppError, notFound } from '#src/errors/appError.ts';
import type { Settle } from '#src/schemas/settle.ts';
import { writeAudit } from '#src/services/audit.ts';
import { rejudgeWithin } from '#src/services/judging/judgeAthletes.ts';

interface Waiting {
  id: string;
  athleteId: string;
  state: string;
  version: number;
  settledBy: string | null;
}

/**
 * Confirms an asked trial, or voids a trial with a reason. If its day is closed, the athlete is judged again in the
 * same transaction; an open day judges nothing.
 *
 * @throws {AppError} forbidden, not-found, conflict if someone else changed it since
 */
export function settleTrial(viewer: Viewer, trialId: string, input: Settle): Promise<void> {
  requirePermission(viewer, 'trial:settle');
  return asViewer(viewer, async (trx) => {
    const trial = (await queries.lockTrial(trx, trialId)) ?? notFound('trial');
    await settle(trx, viewer, { trial, input, subject: 'trial', write: queries.settleTrial });
    if (trial.dayState === 'closed') await rejudgeWithin(trx, viewer, [trial.athleteId], causeOf(input));
  });
}

/**
 * Confirms an asked growth measure, or voids one with a reason; the athlete is judged again.
 *
 * @throws {AppError} forbidden, not-found, conflict
 */
export function settleGrowthMeasure(viewer: Viewer, measureId: string, input: Settle): Promise<void> {
  requirePermission(viewer, 'trial:settle');
  return asViewer(viewer, async (trx) => {
    const measure = (await queries.lockGrowthMeasure(trx, measureId)) ?? notFound('growth measure');
    await settle(trx, viewer, {
      ...{ trial: measure, input, subject: 'growth_measure' },
      write: queries.settleGrowthMeasure,
    });
    await rejudgeWithin(trx, viewer, [measure.athleteId], causeOf(input));
  });
}

const causeOf = ({ verdict }: Settle): string => (verdict === 'confirm' ? 'a value confirmed' : 'a value made void');

async function settle(
  trx: Tx,
  viewer: Viewer,
  {
    trial,
    input,
    subject,
    write,
  }: { trial: Waiting; input: Settle; subject: string; write: typeof queries.settleTrial },
): Promise<void> {
  if (trial.version !== input.version || trial.state === 'void') {
    const who = trial.settledBy ?? 'someone else';
    throw new AppError('conflict', `Changed in the meantime by ${who}: the value is ${trial.state} now`);
  }
  const state = input.verdict === 'confirm' ? 'valid' : 'void';
  await write(trx, { id: trial.id, state, voidReason: input.reason ?? null, by: viewer.personId });
  await writeAudit(trx, viewer, {
    ...{ action: input.verdict, subject, subjectId: trial.id, athleteId: trial.athleteId },
    change: { from: trial.state, to: state },
  });
}
