import type { Viewer } from '#src/access/viewer.ts';
import type { Tx } from '#src/db/client.ts';
import { insertAudit } from '#src/db/queries/audit.ts';

export interface AuditEntry {
  /** What was done, in the trade's verb: `confirm`, `void`, `close`. */
  action: string;
  /** What it was done to: a table's name. */
  subject: string;
  subjectId?: string | null;
  athleteId?: string | null;
  /** What changed, as counts, states and ids. Never a name, a health text, or a value that someone typed as a note. */
  change?: Record<string, unknown>;
}

/** Notes a write on the audit, in the same transaction. A viewer of null is a job. */
export const writeAudit = (trx: Tx, viewer: Viewer | null, entry: AuditEntry): Promise<void> =>
  insertAudit(trx, viewer, entry);
