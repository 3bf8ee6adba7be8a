import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import type { Viewer } from '#src/access/viewer.ts';
import { requireToday } from '#src/services/home/requireToday.ts';
import { judgeAthletesWithin } from '#src/services/judging/judgeAthletes.ts';
import { listOutruns } from '#src/services/outruns/listOutruns.ts';
import { requireOutrun } from '#src/services/outruns/requireOutrun.ts';
import { requireRecord } from '#src/services/records/requireRecord.ts';
import { requireDriver, requireGround, requireGrowth, requireStrength } from '#src/services/records/requireSections.ts';
import { listAsked } from '#src/services/settling/listAsked.ts';
import { listSquads } from '#src/services/squads/listSquads.ts';
import { requireSquad } from '#src/services/squads/requireSquad.ts';
import { asViewer } from '#src/db/client.ts';
import { useTestDatabase } from '#tests/config/testDatabase.ts';
import { TestAcademy } from '#tests/integration/judging/academy.ts';

const database = useTestDatabase();
let academy: TestAcademy;
let director: Viewer;
let athleteId: string;
let outrunId: string;

beforeAll(async () => {
  academy = await TestAcademy.make(database().superuserUrl);
  director = await academy.staff('director');
  const days = ['2025-01-18', '2025-05-10', '2025-09-13', '2026-01-17', '2026-05-09'];
  for (let i = 0; i < 6; i += 1) {
    athleteId = await academy.athlete();
    for (const [term, on] of days.entries()) {
      await academy.day(athleteId, on, { push: { left: 600, right: 700 }, jump: { left: 0.12, right: 0.14 } });
      await academy.growth(athleteId, on, 150 + term, 45);
      await academy.drives(athleteId, on, 150 + 12 * term);
    }
  }
  await asViewer(director, (trx) =>
    judgeAthletesWithin(trx, director, { athleteIds: [athleteId], asOf: days[4]!, cause: 'test' }),
  );
  outrunId = (await academy.rows<{ id: string }>('select id from outrun'))[0]!.id;
});
afterAll(() => academy.end());

/** Statements that reach the database while `work` runs, without the transaction's own. */
async function statements(work: () => Promise<unknown>): Promise<string[]> {
  const seen: string[] = [];
  const query = vi.spyOn(pg.Client.prototype, 'query').mockImplementation(function (
    this: pg.Client,
    ...args: unknown[]
  ) {
    const text = typeof args[0] === 'string' ? args[0] : (args[0] as { text?: string }).text;
    if (text && !/^(begin|start|commit|rollback)|set_config/i.test(text.trim())) seen.push(text);
    return original.apply(this, args as never);
  } as never);
  await work();
  query.mockRestore();
  return seen;
}
const original = pg.Client.prototype.query as (...args: never[]) => unknown;

describe('statements a page', () => {
  // TRUST, performance: at most five statements a page, no statement per athlete.
  it.each([
    ['/today', () => requireToday(director)],
    ['/squads', () => listSquads(director)],
    ['/squads/[id]', () => requireSquad(director, academy.squads.first)],
    ['/athletes/[id]', () => requireRecord(director, athleteId)],
    ['/athletes/[id]/strength', () => requireStrength(director, athleteId)],
    ['/athletes/[id]/driver', () => requireDriver(director, athleteId)],
    ['/athletes/[id]/ground', () => requireGround(director, athleteId)],
    ['/athletes/[id]/growth', () => requireGrowth(director, athleteId)],
    ['/outruns', () => listOutruns(director)],
    ['/outruns/[id]', () => requireOutrun(director, outrunId)],
    ['/asked', () => listAsked(director)],
  ] as [string, () => Promise<unknown>][])('%s', async (_, work) => {
    const seen = await statements(work);
    expect(seen.length).toBeGreaterThan(0);
    expect(seen.length, seen.map((text) => text.slice(0, 80)).join('\n')).toBeLessThanOrEqual(5);
  });
});
