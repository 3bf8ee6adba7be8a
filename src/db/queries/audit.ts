import { sql } from 'kysely';
import type { Viewer } from '#src/access/viewer.ts';
import type { Tx } from '#src/db/client.ts';

interface Entry {
  action: string;
  subject: string;
  subjectId?: string | null;
  athleteId?: string | null;
  change?: Record<string, unknown>;
}

/** Adds a line to the audit of the academy that the transaction works for. */
export async function insertAudit(trx: Tx, viewer: Viewer | null, entry: Entry): Promise<void> {
  await trx
    .insertInto('audit')
    .values({
      academy_id: sql<string>`app.academy_id()`,
      actor_id: viewer?.personId ?? null,
      actor_role: viewer?.role ?? null,
      action: entry.action,
      subject: entry.subject,
      subject_id: entry.subjectId ?? null,
      athlete_id: entry.athleteId ?? null,
      change: entry.change ? JSON.stringify(entry.change) : null,
    })
    .execute();
}
