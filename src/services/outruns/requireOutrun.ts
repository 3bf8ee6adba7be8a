import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer } from '#src/db/client.ts';
import { findOutrun } from '#src/db/queries/outruns.ts';
import type { DataLine } from '#src/domain/outrun/athleteHistory.ts';
import type { Criterion, CriterionName } from '#src/domain/outrun/criterion.ts';
import type { OutrunPolicy } from '#src/domain/outrun/policy.ts';
import { notFound } from '#src/errors/appError.ts';
import { loadHeader } from '#src/services/records/loadHeader.ts';

/** What a judgement keeps of its result. */
interface KeptResult {
  points: number;
  criteria: Criterion[];
  clearsWhen: string[];
  falseAlarms: string[];
  policy: OutrunPolicy;
  dataUsed: Record<CriterionName, DataLine[]>;
  impossibleBefore: string | null;
}

/**
 * An outrun with the evidence of the judgement that last gave it its level, and the athlete's cautions.
 *
 * @throws {AppError} forbidden, not-found
 */
export function requireOutrun(viewer: Viewer, outrunId: string) {
  requirePermission(viewer, 'outrun:see');
  return asViewer(viewer, async (trx) => {
    const { heldResult, ...outrun } = (await findOutrun(trx, outrunId)) ?? notFound('outrun');
    const { header } = await loadHeader(trx, viewer, outrun.athleteId);
    const { criteria, dataUsed, ...kept } = heldResult as unknown as KeptResult;
    const evidence = criteria.map((criterion) => ({ ...criterion, dataUsed: dataUsed[criterion.name] ?? [] }));
    return { outrun, header, evidence, ...kept };
  });
}
