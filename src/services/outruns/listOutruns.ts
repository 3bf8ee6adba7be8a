import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer } from '#src/db/client.ts';
import * as queries from '#src/db/queries/outruns.ts';

/** Outruns of the athletes in scope, open ones first. */
export function listOutruns(viewer: Viewer) {
  requirePermission(viewer, 'outrun:see');
  return asViewer(viewer, (trx) => queries.listOutruns(trx));
}
