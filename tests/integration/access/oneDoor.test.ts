import { sql } from 'kysely';
import { beforeAll, describe, expect, it } from 'vitest';
import type { Viewer } from '#src/access/viewer.ts';
import { appDb, asViewer } from '#src/db/client.ts';
import { useTestDatabase } from '#tests/config/testDatabase.ts';
import { makeWorld, type Academy } from '#tests/integration/access/world.ts';

const database = useTestDatabase();
let worlds: Academy[];
beforeAll(async () => {
  const { here, there } = await makeWorld(database().superuserUrl);
  worlds = [here, there];
});

const viewerOf = (academy: Academy, who: keyof Academy['people']): Viewer => ({
  ...{
    personId: academy.people[who].id,
    role: academy.people[who].role,
    academyId: academy.id,
    membershipId: '',
    sessionId: '',
  },
  ...{ name: '', academyName: '', timeZone: 'Europe/London', safeguarding: '', memberships: [] },
});

describe('the one door', () => {
  it('leaks no viewer from one borrower of a connection to the next: 1 000 interleaved, some failing', async () => {
    const runs = Array.from({ length: 1000 }, async (_, i) => {
      const academy = worlds[i % 2]!;
      const who = (['director', 'strength', 'guardian'] as const)[i % 3]!;
      const seen = asViewer(viewerOf(academy, who), async (trx) => {
        const rows = await trx.selectFrom('athlete').select('id').execute();
        if (i % 7 === 0) await sql`select 1 / 0`.execute(trx);
        if (i % 11 === 0) throw new Error('on purpose');
        return rows.map(({ id }) => id).sort();
      });
      if (i % 7 === 0 || i % 11 === 0) await expect(seen).rejects.toThrow();
      else expect(await seen).toEqual([...academy.people[who].scope].sort());
    });
    await Promise.all(runs);
  });

  it('leaves nothing behind: outside it every table is empty', async () => {
    for (let i = 0; i < 12; i += 1) {
      expect(await appDb().selectFrom('athlete').select('id').execute()).toEqual([]);
      expect(await appDb().selectFrom('trial').select('id').execute()).toEqual([]);
    }
  });
});
