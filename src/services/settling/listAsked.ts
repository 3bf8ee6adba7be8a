import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer } from '#src/db/client.ts';
import { listAskedGrowth, listAskedTrials } from '#src/db/queries/settling.ts';

/** Values that wait for a yes or no, each with the athlete's own median before it. */
export function listAsked(viewer: Viewer) {
  requirePermission(viewer, 'trial:settle');
  return asViewer(viewer, async (trx) => ({ trials: await listAskedTrials(trx), growth: await listAskedGrowth(trx) }));
}
