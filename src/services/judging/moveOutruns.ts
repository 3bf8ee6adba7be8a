import type { Viewer } from '#src/access/viewer.ts';
import type { Tx } from '#src/db/client.ts';
import {
  insertOutrun,
  insertOutrunEvents,
  listJudgementsInBrief,
  lockOpenOutruns,
  updateOutrun,
  type NewOutrunEvent,
} from '#src/db/queries/judging.ts';
import { mayBeCleared } from '#src/domain/outrun/mayBeCleared.ts';
import { writeAudit } from '#src/services/audit.ts';

interface NewJudgement {
  athleteId: string;
  judgementId: string;
  asOf: string;
  level: 'look' | 'act' | null;
  points: number;
}

/**
 * What a judgement does to the one open outrun of an athlete. A level where none is open raises it. A rise is an event
 * and asks for Discussed again; a fall is an event; without a level it stays open at the last level held, and may be
 * cleared once two testing days running say so. People clear it.
 */
export async function moveOutruns(trx: Tx, viewer: Viewer | null, judged: readonly NewJudgement[]): Promise<void> {
  const ids = judged.map(({ athleteId }) => athleteId);
  const open = new Map((await lockOpenOutruns(trx, ids)).map((outrun) => [outrun.athleteId, outrun]));
  const briefs = await listJudgementsInBrief(trx, ids);
  const events: NewOutrunEvent[] = [];
  for (const { athleteId, judgementId, asOf, level, points } of judged) {
    const outrun = open.get(athleteId);
    const event = (outrunId: string, kind: string): NewOutrunEvent => ({
      ...{ outrunId, athleteId, kind, on: asOf, level, judgementId, actorId: viewer?.personId ?? null },
    });
    if (!outrun) {
      if (level === null) continue;
      const outrunId = await insertOutrun(trx, { athleteId, level, judgementId, on: asOf });
      events.push(event(outrunId, 'raised'));
      await writeAudit(trx, viewer, {
        action: 'raise',
        subject: 'outrun',
        subjectId: outrunId,
        athleteId,
        change: { level, points },
      });
      continue;
    }
    const clear = mayBeCleared(
      briefs
        .filter((brief) => brief.athleteId === athleteId)
        .map((brief) => ({ ...brief, level: brief.level === 'act' || brief.level === 'look' ? brief.level : null })),
    );
    const change = { latest_judgement_id: judgementId, may_be_cleared: clear };
    if (level === null) {
      await updateOutrun(trx, outrun.id, change);
      if (clear && !outrun.mayBeCleared) events.push(event(outrun.id, 'may be cleared'));
      continue;
    }
    const rises = level === 'act' && outrun.level === 'look';
    const falls = level === 'look' && outrun.level === 'act';
    await updateOutrun(trx, outrun.id, {
      ...change,
      level,
      level_judgement_id: judgementId,
      ...(rises || falls ? { level_since: asOf } : {}),
      ...(rises ? { state: 'raised' } : {}),
    });
    if (rises || falls) events.push(event(outrun.id, rises ? 'level up' : 'level down'));
  }
  await insertOutrunEvents(trx, events);
}
