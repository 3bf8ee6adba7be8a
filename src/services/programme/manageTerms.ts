import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer, type Tx } from '#src/db/client.ts';
import * as queries from '#src/db/queries/programmeWrites.ts';
import { invalid, notFound } from '#src/errors/appError.ts';
import type { TermInput } from '#src/schemas/people.ts';
import { writeAudit } from '#src/services/audit.ts';

/** Terms of the academy, newest first. */
export function listTerms(viewer: Viewer) {
  requirePermission(viewer, 'programme:manage');
  return asViewer(viewer, (trx) => queries.listTerms(trx));
}

/**
 * Adds a term.
 *
 * @throws {AppError} forbidden, invalid where it overlaps another
 */
export function addTerm(viewer: Viewer, term: TermInput): Promise<{ id: string }> {
  requirePermission(viewer, 'programme:manage');
  return asViewer(viewer, async (trx) => {
    await requireFreeDates(trx, term, null);
    const id = await queries.insertTerm(trx, term);
    await writeAudit(trx, viewer, { action: 'add', subject: 'term', subjectId: id, change: { ...term } });
    return { id };
  });
}

/**
 * Changes the name or the dates of a term.
 *
 * @throws {AppError} forbidden, not-found, invalid where it overlaps another
 */
export function changeTerm(viewer: Viewer, id: string, term: TermInput): Promise<void> {
  requirePermission(viewer, 'programme:manage');
  return asViewer(viewer, async (trx) => {
    await requireFreeDates(trx, term, id);
    if (!(await queries.updateTerm(trx, id, term))) notFound('term');
    await writeAudit(trx, viewer, { action: 'change', subject: 'term', subjectId: id, change: { ...term } });
  });
}

async function requireFreeDates(trx: Tx, { startsOn, endsOn }: TermInput, own: string | null): Promise<void> {
  const others = (await queries.listTerms(trx)).filter(({ id }) => id !== own);
  if (others.some((term) => term.startsOn <= endsOn && startsOn <= term.endsOn)) {
    invalid('startsOn', 'Another term has some of these dates');
  }
}
