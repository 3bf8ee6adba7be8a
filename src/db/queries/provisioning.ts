import type { Insertable, Kysely } from 'kysely';
import type { Role } from '#src/access/viewer.ts';
import { inParts } from '#src/db/queries/inParts.ts';
import type { DB, PolicyVersion, Test } from '#src/db/types.ts';

/** Set-up statements, run as the owner from the command line: the only ones that make academies and people. */
type Owner = Kysely<DB>;

/** The academy of this name, if there is one. */
export const findAcademyByName = (db: Owner, name: string) =>
  db
    .selectFrom('academy')
    .select(['id', 'name', 'time_zone', 'safeguarding_contact'])
    .where('name', '=', name)
    .executeTakeFirst();

/** Adds an academy and gives its id. */
export async function insertAcademy(db: Owner, name: string): Promise<string> {
  return (await db.insertInto('academy').values({ name }).returning('id').executeTakeFirstOrThrow()).id;
}

/** User names that are taken, of those asked for. */
export async function listTakenUserNames(db: Owner, names: readonly string[]): Promise<string[]> {
  const rows = await db
    .selectFrom('person_contact')
    .select('user_name')
    .where('user_name', 'in', [...names])
    .execute();
  return rows.flatMap(({ user_name }) => user_name ?? []);
}

/** Adds a person with a sign-in and a role in an academy; gives the person's id. */
export async function insertMember(
  db: Owner,
  academyId: string,
  member: { givenName: string; familyName: string; userName: string; passwordHash: string; role: Role },
): Promise<string> {
  const { id } = await db
    .insertInto('person')
    .values({ given_name: member.givenName, family_name: member.familyName })
    .returning('id')
    .executeTakeFirstOrThrow();
  await db.insertInto('person_contact').values({ person_id: id, user_name: member.userName }).execute();
  await db.insertInto('credential').values({ person_id: id, password_hash: member.passwordHash }).execute();
  await db.insertInto('membership').values({ academy_id: academyId, person_id: id, role: member.role }).execute();
  return id;
}

/** The first director of an academy who is still one. */
export const findDirector = (db: Owner, academyId: string) =>
  db
    .selectFrom('membership')
    .innerJoin('person', 'person.id', 'membership.person_id')
    .select([
      'membership.id as membershipId',
      'person.id as personId',
      'person.given_name as givenName',
      'person.family_name as familyName',
    ])
    .where('membership.academy_id', '=', academyId)
    .where('membership.role', '=', 'director')
    .where('membership.ended_at', 'is', null)
    .where('person.disabled_at', 'is', null)
    .orderBy('membership.started_at')
    .executeTakeFirst();

/** Coaches of an academy who are still one. */
export const listCoaches = (db: Owner, academyId: string) =>
  db
    .selectFrom('membership')
    .select('person_id as personId')
    .where('academy_id', '=', academyId)
    .where('role', 'in', ['strength_coach', 'swing_coach'])
    .where('ended_at', 'is', null)
    .execute();

/** Adds tests, a battery of some of them, and the first policy. */
export async function insertProgramme(
  db: Owner,
  academyId: string,
  programme: {
    tests: readonly Omit<Insertable<Test>, 'academy_id'>[];
    battery: string;
    batteryKeys: readonly string[];
    policy: Pick<Insertable<PolicyVersion>, 'rule_version' | 'thresholds'>;
  },
): Promise<void> {
  const tests = await db
    .insertInto('test')
    .values(programme.tests.map((test) => ({ ...test, academy_id: academyId })))
    .returning(['id', 'key'])
    .execute();
  const battery = await db
    .insertInto('battery')
    .values({ academy_id: academyId, name: programme.battery })
    .returning('id')
    .executeTakeFirstOrThrow();
  const chosen = tests.filter(({ key }) => programme.batteryKeys.includes(key));
  await db
    .insertInto('battery_test')
    .values(
      chosen.map(({ id }, i) => ({ academy_id: academyId, battery_id: battery.id, test_id: id, position: i + 1 })),
    )
    .execute();
  await db
    .insertInto('policy_version')
    .values({ academy_id: academyId, version: 1, ...programme.policy })
    .execute();
}

/** Adds the squads that the academy does not have yet and gives the id of each name. */
export async function addSquads(db: Owner, academyId: string, names: readonly string[]): Promise<Map<string, string>> {
  if (names.length > 0) {
    await db
      .insertInto('squad')
      .values(names.map((name) => ({ academy_id: academyId, name })))
      .onConflict((conflict) => conflict.columns(['academy_id', 'name']).doNothing())
      .execute();
  }
  const rows = await db.selectFrom('squad').select(['id', 'name']).where('academy_id', '=', academyId).execute();
  return new Map(rows.map(({ id, name }) => [name, id]));
}

/** Gives coaches their squads; those they have they keep. */
export async function addSquadCoaches(
  db: Owner,
  academyId: string,
  squadIds: readonly string[],
  personIds: readonly string[],
) {
  const pairs = squadIds.flatMap((squadId) =>
    personIds.map((personId) => ({ academy_id: academyId, squad_id: squadId, person_id: personId })),
  );
  if (pairs.length === 0) return;
  await db
    .insertInto('squad_coach')
    .values(pairs)
    .onConflict((conflict) => conflict.columns(['squad_id', 'person_id']).doNothing())
    .execute();
}

/** Adds terms; one that begins on a date that has one is left out. */
export async function addTerms(
  db: Owner,
  academyId: string,
  terms: readonly { name: string; startsOn: string; endsOn: string }[],
): Promise<void> {
  if (terms.length === 0) return;
  await db
    .insertInto('term')
    .values(
      terms.map(({ name, startsOn, endsOn }) => ({
        academy_id: academyId,
        name,
        starts_on: startsOn,
        ends_on: endsOn,
      })),
    )
    .onConflict((conflict) => conflict.columns(['academy_id', 'starts_on']).doNothing())
    .execute();
}

/** Whether an academy has any term. */
export const hasTerms = async (db: Owner, academyId: string): Promise<boolean> =>
  (await db.selectFrom('term').select('id').where('academy_id', '=', academyId).limit(1).executeTakeFirst()) !==
  undefined;

/** Names and birth dates of an academy's athletes. */
export const listAthleteNames = (db: Owner, academyId: string) =>
  db
    .selectFrom('athlete')
    .select(['id', 'given_name as givenName', 'family_name as familyName', 'birth_date as birthDate'])
    .where('academy_id', '=', academyId)
    .execute();

/** Adds athletes with what they play, and the addresses of their parents, uninvited. */
export async function insertAthletes(
  db: Owner,
  academyId: string,
  athletes: readonly {
    squadId: string;
    givenName: string;
    familyName: string;
    birthDate: string;
    sex: 'female' | 'male';
    plays: 'left' | 'right' | null;
    guardianEmails: readonly string[];
  }[],
): Promise<void> {
  for (const athlete of athletes) {
    const { id } = await db
      .insertInto('athlete')
      .values({
        academy_id: academyId,
        squad_id: athlete.squadId,
        given_name: athlete.givenName,
        family_name: athlete.familyName,
        birth_date: athlete.birthDate,
        sex: athlete.sex,
      })
      .returning('id')
      .executeTakeFirstOrThrow();
    if (athlete.plays !== null) {
      await db
        .insertInto('handedness')
        .values({ academy_id: academyId, athlete_id: id, plays: athlete.plays, reason: 'from the list of athletes' })
        .execute();
    }
    await inParts(
      athlete.guardianEmails.map((email) => ({ academy_id: academyId, athlete_id: id, email })),
      (part) => db.insertInto('guardian_address').values(part).execute(),
    );
  }
}
