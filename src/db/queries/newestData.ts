import { sql } from 'kysely';
import type { Tx } from '#src/db/client.ts';

/** The date of the newest data about any of these athletes, YYYY-MM-DD, or null where there is none. */
export async function findNewestData(trx: Tx, athleteIds: readonly string[]): Promise<string | null> {
  const ids = sql`any (${[...athleteIds]}::uuid[])`;
  const { rows } = await sql<{ newest: string | null }>`
    select max(day)::text as newest from (
      select d.held_on as day from trial t join testing_day d on d.id = t.testing_day_id
        where t.athlete_id = ${ids} and d.state = 'closed'
      union all select measured_on from growth_measure where athlete_id = ${ids}
      union all select recorded_on from curve where athlete_id = ${ids}
      union all select recorded_on from ground_trace where athlete_id = ${ids}
      union all
      select s.held_on from shot h join driver_session s on s.id = h.driver_session_id where h.athlete_id = ${ids}
    ) as data`.execute(trx);
  return rows[0]?.newest ?? null;
}
