import { sql } from 'kysely';
import type { Tx } from '#src/db/client.ts';

/** One athlete's valid trials of one test on one closed testing day, both sides, in SI. */
export interface TestSession {
  athleteId: string;
  testingDayId: string;
  heldOn: string;
  testKey: string;
  testName: string;
  unit: string;
  quantity: string;
  better: 'higher' | 'lower';
  comparesIn: 'percent' | 'degrees' | 'none';
  /** Catalogue's within-day coefficient of variation of one leg, %; null where none is published or agreed. */
  cvPct: number | null;
  noiseSource: string;
  capacity: 'push' | 'jump' | 'hop' | null;
  left: number[];
  right: number[];
  asked: number;
}

/**
 * Valid trials by athlete, test and closed day, oldest day first. Asked and void trials are left out; asked ones are
 * counted.
 */
export function listTestSessions(trx: Tx, athleteIds: readonly string[]): Promise<TestSession[]> {
  const values = (side: 'left' | 'right') =>
    sql<
      number[]
    >`coalesce(array_agg(trial.value_si order by trial.attempt) filter (where trial.state = 'valid' and trial.side = ${side}), '{}')`;
  return (
    trx
      .selectFrom('trial')
      .innerJoin('testing_day', 'testing_day.id', 'trial.testing_day_id')
      .innerJoin('test', 'test.id', 'trial.test_id')
      .select([
        'trial.athlete_id as athleteId',
        'testing_day.id as testingDayId',
        'testing_day.held_on as heldOn',
        'test.key as testKey',
        'test.name as testName',
        'test.unit',
        'test.quantity',
        sql<TestSession['better']>`test.better`.as('better'),
        sql<TestSession['comparesIn']>`test.compares_in`.as('comparesIn'),
        'test.cv_pct as cvPct',
        'test.noise_source as noiseSource',
        sql<TestSession['capacity']>`test.capacity`.as('capacity'),
        values('left').as('left'),
        values('right').as('right'),
        sql<number>`count(*) filter (where trial.state = 'asked')`.as('asked'),
      ])
      .where('trial.athlete_id', 'in', [...athleteIds])
      .where('testing_day.state', '=', 'closed')
      .where('test.sided', '=', true)
      .groupBy(['trial.athlete_id', 'testing_day.id', 'test.id'])
      .orderBy('testing_day.held_on')
      // Push, jump and hop first, as the coaches name them; then the others.
      .orderBy(sql`array_position(array['push', 'jump', 'hop'], test.capacity)`)
      .orderBy('test.name')
      .execute()
  );
}
