import type { Random } from '#db/seed/random.ts';
import type { SeedDb } from '#db/seed/seedDb.ts';
import { TERMS, TRUTHS } from '#db/seed/truth.ts';
import { CATALOGUE } from '#src/domain/catalogue/catalogue.ts';
import { DEFAULT_POLICY } from '#src/domain/outrun/policy.ts';
import { testRow } from '#src/services/programme/testRow.ts';
import { RULE_VERSION } from '#src/domain/outrun/ruleVersion.ts';

export interface SeededAcademy {
  academyId: string;
  squads: Map<string, string>;
  /** By full name. */
  athletes: Map<string, string>;
  /** By key of the catalogue. */
  tests: Map<string, string>;
  batteryId: string;
  rigId: string;
}

export const ACADEMY_NAME = 'Saltmarsh Links Junior Academy';
const BATTERY = ['push', 'jump', 'hop', 'anterior-reach'];

/** The academy with its squads, terms, tests, battery, policy and athletes. */
export async function seedAcademy(db: SeedDb, random: Random): Promise<SeededAcademy> {
  const academyId = random.uuid();
  const safeguarding = 'Tell Isolde Marchetti, director and safeguarding lead.';
  const academy = { id: academyId, name: ACADEMY_NAME, safeguarding_contact: safeguarding };
  await db.insertInto('academy').values(academy).execute();
  const own = { academy_id: academyId };

  const squads = new Map(['Curlew', 'Dunlin'].map((name) => [name, random.uuid()]));
  await db
    .insertInto('squad')
    .values([...squads].map(([name, id]) => ({ ...own, id, name })))
    .execute();
  const terms = TERMS.map(({ name, startsOn, endsOn }) => ({ ...own, name, starts_on: startsOn, ends_on: endsOn }));
  await db.insertInto('term').values(terms).execute();

  const tests = new Map(CATALOGUE.map(({ key }) => [key, random.uuid()]));
  const rows = CATALOGUE.map((test) => ({ ...own, id: tests.get(test.key)!, ...testRow(test) }));
  await db.insertInto('test').values(rows).execute();
  const batteryId = random.uuid();
  await db
    .insertInto('battery')
    .values({ ...own, id: batteryId, name: 'Legs, each side' })
    .execute();
  const links = BATTERY.map((key, position) => ({ ...own, battery_id: batteryId, test_id: tests.get(key)!, position }));
  await db.insertInto('battery_test').values(links).execute();
  const rigId = random.uuid();
  await db
    .insertInto('device')
    .values({ ...own, id: rigId, name: 'Two plates, bay 3' })
    .execute();
  await db
    .insertInto('policy_version')
    .values({ ...own, version: 1, rule_version: RULE_VERSION, thresholds: JSON.stringify(DEFAULT_POLICY) })
    .execute();

  const athletes = new Map(TRUTHS.map((truth) => [`${truth.givenName} ${truth.familyName}`, random.uuid()]));
  await db
    .insertInto('athlete')
    .values(
      TRUTHS.map((truth) => ({
        ...own,
        id: athletes.get(`${truth.givenName} ${truth.familyName}`)!,
        squad_id: squads.get(truth.squad)!,
        given_name: truth.givenName,
        family_name: truth.familyName,
        birth_date: truth.birthDate,
        sex: truth.sex,
        joined_on: TERMS[0].startsOn,
      })),
    )
    .execute();
  return { academyId, squads, athletes, tests, batteryId, rigId };
}
