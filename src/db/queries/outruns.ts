import { sql } from 'kysely';
import { jsonArrayFrom } from 'kysely/helpers/postgres';
import type { Tx } from '#src/db/client.ts';

function selectOutruns(trx: Tx) {
  return trx
    .selectFrom('outrun')
    .innerJoin('athlete', 'athlete.id', 'outrun.athlete_id')
    .innerJoin('squad', 'squad.id', 'athlete.squad_id')
    .select([
      'outrun.id',
      'outrun.state',
      'outrun.level',
      'outrun.raised_on as raisedOn',
      'outrun.level_since as levelSince',
      'outrun.route',
      'outrun.look_again_on as lookAgainOn',
      'outrun.may_be_cleared as mayBeCleared',
      'outrun.closed_on as closedOn',
      'outrun.close_reason as closeReason',
      'athlete.id as athleteId',
      sql<string>`athlete.given_name || ' ' || athlete.family_name`.as('athleteName'),
      'squad.name as squadName',
    ]);
}

/** Outruns in scope: open ones first, the newest first within. */
export const listOutruns = (trx: Tx) =>
  selectOutruns(trx)
    .orderBy(sql`outrun.state in ('cleared', 'set aside')`)
    .orderBy('outrun.level_since', 'desc')
    .orderBy('athlete.family_name')
    .execute();

/** One outrun in scope with the judgement that last gave it its level, the newest one, its events and its notes. */
export function findOutrun(trx: Tx, id: string) {
  return selectOutruns(trx)
    .innerJoin('judgement as held', 'held.id', 'outrun.level_judgement_id')
    .innerJoin('judgement as newest', 'newest.id', 'outrun.latest_judgement_id')
    .innerJoin('policy_version', 'policy_version.id', 'held.policy_version_id')
    .select((eb) => [
      'held.as_of as heldAsOf',
      'held.result as heldResult',
      'held.cause as heldCause',
      'newest.as_of as newestAsOf',
      'newest.level as newestLevel',
      'newest.points as newestPoints',
      'policy_version.version as policyVersion',
      'policy_version.rule_version as ruleVersion',
      jsonArrayFrom(
        eb
          .selectFrom('outrun_event')
          .leftJoin('person', 'person.id', 'outrun_event.actor_id')
          .select([
            'outrun_event.kind',
            'outrun_event.happened_on as on',
            'outrun_event.level',
            'outrun_event.text',
            sql<string | null>`person.given_name || ' ' || person.family_name`.as('by'),
          ])
          .whereRef('outrun_event.outrun_id', '=', 'outrun.id')
          .orderBy('outrun_event.happened_on')
          .orderBy('outrun_event.made_at'),
      ).as('events'),
      jsonArrayFrom(
        eb
          .selectFrom('outrun_note')
          .innerJoin('person', 'person.id', 'outrun_note.author_id')
          .select([
            'outrun_note.body',
            sql<string>`to_char(outrun_note.made_at, 'YYYY-MM-DD')`.as('on'),
            sql<string>`person.given_name || ' ' || person.family_name`.as('by'),
          ])
          .whereRef('outrun_note.outrun_id', '=', 'outrun.id')
          .orderBy('outrun_note.made_at'),
      ).as('notes'),
    ])
    .where('outrun.id', '=', id)
    .executeTakeFirst();
}
