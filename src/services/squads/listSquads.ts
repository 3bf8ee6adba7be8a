import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer } from '#src/db/client.ts';
import * as squads from '#src/db/queries/squads.ts';

/** The viewer's squads with how many train there, when tested last, and how many outruns are open. */
export function listSquads(viewer: Viewer) {
  requirePermission(viewer, 'squad:see');
  return asViewer(viewer, (trx) => squads.listSquads(trx));
}
