import { writeFileSync } from 'node:fs';
import { pathToFileURL } from 'node:url';
import { ACADEMY_NAME, seedAcademy, type SeededAcademy } from '#db/seed/academy.ts';
import { seedDecisions } from '#db/seed/decisions.ts';
import { seedDriverSession } from '#db/seed/driverSession.ts';
import { seedPeople, type SeededPeople } from '#db/seed/people.ts';
import { makeRandom } from '#db/seed/random.ts';
import type { SeedDb } from '#db/seed/seedDb.ts';
import { nameOf, seedTestingDay } from '#db/seed/testingDay.ts';
import { TERMS, TRUTHS } from '#db/seed/truth.ts';
import { ROLE_NAMES, type Viewer } from '#src/access/viewer.ts';
import { asViewer, closeDatabases, ownerDb } from '#src/db/client.ts';
import { judgeAthletesWithin } from '#src/services/judging/judgeAthletes.ts';

const SEED = 20_261_201;
/** The left-hander who was written down as right-handed until after this term. */
const CORRECTED_AFTER = 4;

/** Fills an empty database with the demo, and returns its accounts. */
export async function seedDemo(): Promise<SeededPeople['accounts']> {
  const db: SeedDb = ownerDb();
  const random = makeRandom(SEED);
  const academy = await seedAcademy(db, random);
  const people = await seedPeople(db, random, academy);
  await seedHandedness(db, academy, people);
  const director = directorOf(academy, people);
  for (const [term, { testedOn, droveOn }] of TERMS.entries()) {
    const tested = await seedTestingDay(db, random, academy, people, term);
    await judge(director, tested, testedOn, 'testing day closed');
    const drove = await seedDriverSession(db, random, academy, people, term);
    await judge(director, drove, droveOn, 'driver session');
    if (term === CORRECTED_AFTER) await correctHandedness(db, academy, people);
    await seedDecisions(db, academy, people, term);
  }
  await db
    .insertInto('testing_day')
    .values({
      ...{ academy_id: academy.academyId, squad_id: academy.squads.get('Curlew')!, battery_id: academy.batteryId },
      ...{ held_on: '2026-11-28', recorded_by: people.ids['strength'] },
    })
    .execute();
  await db
    .insertInto('restriction')
    .values({
      academy_id: academy.academyId,
      athlete_id: academy.athletes.get('Tomasz Brandt')!,
      allowed: 'No jumping and no full driver swings until 4 December; putting and short game as usual',
      set_by: people.ids['strength']!,
      set_at: '2026-11-28T09:00:00Z',
    })
    .execute();
  return people.accounts;
}

const judge = (director: Viewer, athleteIds: string[], asOf: string, cause: string) =>
  asViewer(director, (trx) => judgeAthletesWithin(trx, director, { athleteIds, asOf, cause }));

/** Everyone as they play, but for the one written down wrongly at first. */
async function seedHandedness(
  db: SeedDb,
  { academyId, athletes }: SeededAcademy,
  { ids }: SeededPeople,
): Promise<void> {
  const rows = TRUTHS.map((truth) => ({
    ...{ academy_id: academyId, athlete_id: athletes.get(nameOf(truth))!, recorded_by: ids['director'] },
    plays: truth.handednessCorrected ? (truth.plays === 'left' ? ('right' as const) : ('left' as const)) : truth.plays,
    recorded_at: `${TERMS[0].startsOn}T09:00:00Z`,
  }));
  await db.insertInto('handedness').values(rows).execute();
}

async function correctHandedness(
  db: SeedDb,
  { academyId, athletes }: SeededAcademy,
  { ids }: SeededPeople,
): Promise<void> {
  const truth = TRUTHS.find(({ handednessCorrected }) => handednessCorrected)!;
  await db
    .insertInto('handedness')
    .values({
      ...{ academy_id: academyId, athlete_id: athletes.get(nameOf(truth))!, plays: truth.plays },
      ...{ recorded_by: ids['swing'], recorded_at: `${TERMS[CORRECTED_AFTER]!.droveOn}T15:00:00Z` },
      reason: 'Plays left-handed; the first sheet had the wrong box ticked',
    })
    .execute();
}

function directorOf({ academyId }: SeededAcademy, { ids, memberships }: SeededPeople): Viewer {
  return {
    ...{
      personId: ids['director']!,
      academyId,
      role: 'director',
      sessionId: '',
      membershipId: memberships['director']!,
    },
    ...{
      name: 'Isolde Marchetti',
      academyName: ACADEMY_NAME,
      timeZone: 'Europe/London',
      safeguarding: '',
      memberships: [],
    },
  };
}

if (process.argv[1] && import.meta.url === pathToFileURL(process.argv[1]).href) {
  const accounts = (await seedDemo()).map(({ role, ...rest }) => ({ role: ROLE_NAMES[role], ...rest }));
  const file = process.env['MARRAM_DEMO_ACCOUNTS'];
  if (file) writeFileSync(file, `${JSON.stringify(accounts, null, 2)}\n`, { mode: 0o600 });
  await closeDatabases();
}
