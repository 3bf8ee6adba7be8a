import { sql } from 'kysely';
import type { Tx } from '#src/db/client.ts';

const academyId = sql<string>`app.academy_id()`;

/** Adds a squad. Its id is made before: the row is not visible to the statement that adds it. */
export async function insertSquad(trx: Tx, id: string, name: string): Promise<void> {
  await trx.insertInto('squad').values({ id, academy_id: academyId, name }).execute();
}

/** Renames a squad; undefined if there is none of this id. */
export const renameSquad = (trx: Tx, id: string, name: string) =>
  trx.updateTable('squad').set({ name }).where('id', '=', id).returning('id').executeTakeFirst();

/** The coaches of a squad: those given, nobody else. */
export async function setSquadCoaches(trx: Tx, squadId: string, personIds: readonly string[]): Promise<void> {
  let dropped = trx.deleteFrom('squad_coach').where('squad_id', '=', squadId);
  if (personIds.length > 0) dropped = dropped.where('person_id', 'not in', [...personIds]);
  await dropped.execute();
  if (personIds.length === 0) return;
  await trx
    .insertInto('squad_coach')
    .values(personIds.map((personId) => ({ academy_id: academyId, squad_id: squadId, person_id: personId })))
    .onConflict((conflict) => conflict.doNothing())
    .execute();
}

/** How many of these people coach in the academy now. */
export async function countCoaches(trx: Tx, personIds: readonly string[]): Promise<number> {
  if (personIds.length === 0) return 0;
  const { n } = await trx
    .selectFrom('membership')
    .select(sql<number>`count(distinct person_id)`.as('n'))
    .where('person_id', 'in', [...personIds])
    .where('role', 'in', ['strength_coach', 'swing_coach'])
    .where('ended_at', 'is', null)
    .executeTakeFirstOrThrow();
  return n;
}

/** How many squads of the academy have one of these ids. */
export async function countSquads(trx: Tx, ids: readonly string[]): Promise<number> {
  if (ids.length === 0) return 0;
  const { n } = await trx
    .selectFrom('squad')
    .select(sql<number>`count(*)`.as('n'))
    .where('id', 'in', [...ids])
    .executeTakeFirstOrThrow();
  return n;
}

interface NewAthleteRow {
  id: string;
  givenName: string;
  familyName: string;
  birthDate: string;
  sex: 'female' | 'male';
  plays: 'left' | 'right';
  squadId: string;
}

/** Adds an athlete with what they play. */
export async function insertAthlete(trx: Tx, row: NewAthleteRow, by: string): Promise<void> {
  const { id, givenName, familyName, birthDate, sex, plays, squadId } = row;
  await trx
    .insertInto('athlete')
    .values({
      ...{ id, academy_id: academyId, squad_id: squadId, sex },
      ...{ given_name: givenName, family_name: familyName, birth_date: birthDate },
    })
    .execute();
  await trx
    .insertInto('handedness')
    .values({ academy_id: academyId, athlete_id: id, plays, recorded_by: by })
    .execute();
}

/** Moves an athlete to a squad; undefined if there is none of this id. */
export const moveAthlete = (trx: Tx, athleteId: string, squadId: string) =>
  trx
    .updateTable('athlete')
    .set({ squad_id: squadId })
    .where('id', '=', athleteId)
    .where('left_on', 'is', null)
    .returning('id')
    .executeTakeFirst();

/** Terms of the academy, newest first. */
export const listTerms = (trx: Tx) =>
  trx
    .selectFrom('term')
    .select(['id', 'name', 'starts_on as startsOn', 'ends_on as endsOn'])
    .orderBy('starts_on', 'desc')
    .execute();

interface TermRow {
  name: string;
  startsOn: string;
  endsOn: string;
}

/** Adds a term; its id. */
export async function insertTerm(trx: Tx, { name, startsOn, endsOn }: TermRow): Promise<string> {
  const { id } = await trx
    .insertInto('term')
    .values({ academy_id: academyId, name, starts_on: startsOn, ends_on: endsOn })
    .returning('id')
    .executeTakeFirstOrThrow();
  return id;
}

/** Changes a term; undefined if there is none of this id. */
export const updateTerm = (trx: Tx, id: string, { name, startsOn, endsOn }: TermRow) =>
  trx
    .updateTable('term')
    .set({ name, starts_on: startsOn, ends_on: endsOn })
    .where('id', '=', id)
    .returning('id')
    .executeTakeFirst();
