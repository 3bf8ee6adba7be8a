import { sql, type Insertable } from 'kysely';
import type { Tx } from '#src/db/client.ts';
import { inParts } from '#src/db/queries/inParts.ts';
import type { Trial } from '#src/db/types.ts';

/** What decides whether a trial is new, and what a value is compared with. */
export interface StoredTrial {
  id: string;
  testingDayId: string;
  athleteId: string;
  testId: string;
  side: 'left' | 'right' | null;
  attempt: number;
  valueSi: number;
  state: 'valid' | 'asked' | 'void';
  askedReason: string | null;
  voidReason: string | null;
}

/** Every trial of these days. */
export function listTrialsOfDays(trx: Tx, dayIds: readonly string[]): Promise<StoredTrial[]> {
  return trx
    .selectFrom('trial')
    .select([
      'id',
      'testing_day_id as testingDayId',
      'athlete_id as athleteId',
      'test_id as testId',
      'side',
      'attempt',
      'value_si as valueSi',
      'state',
      'asked_reason as askedReason',
      'void_reason as voidReason',
    ])
    .where('testing_day_id', 'in', [...dayIds])
    .execute();
}

/** Medians of the valid trials of earlier days, by athlete, test and side, in SI. */
export function listEarlierMedians(trx: Tx, athleteIds: readonly string[], before: string) {
  return trx
    .selectFrom('trial')
    .innerJoin('testing_day', 'testing_day.id', 'trial.testing_day_id')
    .select([
      'trial.athlete_id as athleteId',
      'trial.test_id as testId',
      'trial.side',
      sql<number>`percentile_cont(0.5) within group (order by trial.value_si)`.as('medianSi'),
    ])
    .where('trial.athlete_id', 'in', [...athleteIds])
    .where('trial.state', '=', 'valid')
    .where('testing_day.held_on', '<', before)
    .groupBy(['trial.athlete_id', 'trial.test_id', 'trial.side'])
    .execute();
}

/** Adds trials. */
export const insertTrials = (trx: Tx, rows: readonly Insertable<Trial>[]): Promise<void> =>
  inParts(rows, (part) => trx.insertInto('trial').values(part).execute());
