import { sql } from 'kysely';
import { jsonArrayFrom } from 'kysely/helpers/postgres';
import type { Tx } from '#src/db/client.ts';
import { newestHand, plays } from '#src/db/queries/handedness.ts';

/** Names, squad, birth date, sex, what they play, restrictions in force and the open outrun of athletes in scope. */
export function selectAthletes(trx: Tx) {
  return (
    trx
      .selectFrom('athlete')
      .innerJoin('squad', 'squad.id', 'athlete.squad_id')
      .leftJoinLateral(newestHand, (join) => join.onTrue())
      // Families have no row here: row security answers with none.
      .leftJoinLateral(
        (eb) =>
          eb
            .selectFrom('judgement')
            .select(['judgement.marks', 'judgement.as_of'])
            .whereRef('judgement.athlete_id', '=', 'athlete.id')
            .orderBy('judgement.made_at', 'desc')
            .limit(1)
            .as('judged'),
        (join) => join.onTrue(),
      )
      .leftJoin('outrun', (join) =>
        join.onRef('outrun.athlete_id', '=', 'athlete.id').on('outrun.state', 'in', ['raised', 'discussed', 'in hand']),
      )
      .select((eb) => [
        'athlete.id',
        'athlete.given_name as givenName',
        'athlete.family_name as familyName',
        'athlete.birth_date as birthDate',
        'athlete.sex',
        'athlete.person_id as personId',
        'squad.id as squadId',
        'squad.name as squadName',
        plays,
        'outrun.id as outrunId',
        'outrun.level as outrunLevel',
        'outrun.state as outrunState',
        'outrun.raised_on as outrunRaisedOn',
        'outrun.level_since as outrunLevelSince',
        'outrun.route as outrunRoute',
        'outrun.look_again_on as outrunLookAgainOn',
        'outrun.may_be_cleared as outrunMayBeCleared',
        'judged.marks',
        'judged.as_of as judgedAsOf',
        jsonArrayFrom(
          eb
            .selectFrom('restriction')
            .leftJoin('person', 'person.id', 'restriction.set_by')
            .select([
              'restriction.id',
              'restriction.allowed',
              sql<string>`to_char(restriction.set_at, 'YYYY-MM-DD')`.as('setOn'),
              sql<string | null>`person.given_name || ' ' || person.family_name`.as('setBy'),
            ])
            .whereRef('restriction.athlete_id', '=', 'athlete.id')
            .where('restriction.cleared_at', 'is', null)
            .orderBy('restriction.set_at', 'desc'),
        ).as('restrictions'),
        jsonArrayFrom(
          eb
            .selectFrom('term')
            .select(['term.name', 'term.starts_on as startsOn', 'term.ends_on as endsOn'])
            .orderBy('term.starts_on'),
        ).as('terms'),
      ])
      .where('athlete.left_on', 'is', null)
      .orderBy('athlete.family_name')
      .orderBy('athlete.given_name')
  );
}

export type AthleteRow = Awaited<ReturnType<typeof listAthletesOfSquad>>[number];

/** Athletes of a squad in scope, by family name. */
export const listAthletesOfSquad = (trx: Tx, squadId: string) =>
  selectAthletes(trx).where('athlete.squad_id', '=', squadId).execute();

/** One athlete in scope. */
export const findAthlete = (trx: Tx, id: string) => selectAthletes(trx).where('athlete.id', '=', id).executeTakeFirst();

/** Every athlete in scope: of a guardian the children, of an athlete oneself. */
export const listOwnAthletes = (trx: Tx) => selectAthletes(trx).execute();
