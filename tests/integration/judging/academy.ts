import { randomUUID } from 'node:crypto';
import pg from 'pg';
import type { Role, Viewer } from '#src/access/viewer.ts';
import { CATALOGUE } from '#src/domain/catalogue/catalogue.ts';
import { DEFAULT_POLICY } from '#src/domain/outrun/policy.ts';

type Side = 'left' | 'right';
type Legs = Partial<Record<'push' | 'jump' | 'hop', Record<Side, number>>>;

/** A small academy that a test fills by hand, past row security. */
export class TestAcademy {
  readonly id = randomUUID();
  readonly squads = { first: randomUUID(), second: randomUUID() };
  private readonly battery = randomUUID();
  private readonly tests = new Map<string, string>();

  private constructor(private readonly client: pg.Client) {}

  static async make(superuserUrl: string): Promise<TestAcademy> {
    const client = new pg.Client({ connectionString: superuserUrl });
    await client.connect();
    const academy = new TestAcademy(client);
    await academy.insert('academy', { id: academy.id, name: `Academy ${academy.id}` });
    for (const [name, id] of Object.entries(academy.squads))
      await academy.insert('squad', { ...academy.own, id, name });
    await academy.insert('battery', { ...academy.own, id: academy.battery, name: 'Legs' });
    for (const test of CATALOGUE.filter(({ capacity }) => capacity !== null)) {
      const id = randomUUID();
      academy.tests.set(test.key, id);
      await academy.insert('test', {
        ...{
          ...academy.own,
          id,
          key: test.key,
          name: test.name,
          quantity: test.quantity,
          unit: test.unit,
          sided: true,
        },
        ...{ better: 'higher', compares_in: 'percent', attempts: 3, uses: 'mean', lowest_si: 0, highest_si: 4000 },
        ...{ cv_pct: test.cvPct, noise_source: test.noiseSource, protocol: test.protocol, capacity: test.capacity },
      });
    }
    await academy.insert('policy_version', {
      ...academy.own,
      version: 1,
      rule_version: '1',
      thresholds: DEFAULT_POLICY,
    });
    return academy;
  }

  get own() {
    return { academy_id: this.id };
  }

  end = () => this.client.end();

  async insert(table: string, row: Record<string, unknown>): Promise<void> {
    const keys = Object.keys(row);
    const places = keys.map((_, i) => `$${i + 1}`).join(', ');
    await this.client.query(`insert into ${table} (${keys.join(', ')}) values (${places})`, Object.values(row));
  }

  async rows<T extends pg.QueryResultRow>(sql: string, values: unknown[] = []): Promise<T[]> {
    return (await this.client.query<T>(sql, values)).rows;
  }

  /** A member of staff with a squad; the director with none. */
  async staff(role: Role, squad?: keyof TestAcademy['squads']): Promise<Viewer> {
    const personId = randomUUID();
    const membershipId = randomUUID();
    await this.insert('person', { id: personId, given_name: 'Some', family_name: role });
    await this.insert('membership', { ...this.own, id: membershipId, person_id: personId, role });
    if (squad) await this.insert('squad_coach', { ...this.own, squad_id: this.squads[squad], person_id: personId });
    return {
      ...{ personId, membershipId, role, academyId: this.id, sessionId: '', name: `Some ${role}`, academyName: '' },
      ...{ timeZone: 'Europe/London', safeguarding: '', memberships: [] },
    };
  }

  async athlete(squad: keyof TestAcademy['squads'] = 'first', plays: Side = 'right'): Promise<string> {
    const id = randomUUID();
    await this.insert('athlete', {
      ...{ ...this.own, id, squad_id: this.squads[squad], given_name: 'An', family_name: 'Athlete', sex: 'female' },
      birth_date: '2013-01-01',
    });
    await this.insert('handedness', { ...this.own, athlete_id: id, plays });
    return id;
  }

  /** A testing day with three equal trials of each leg and test; returns the day and the trials' ids. */
  async day(
    athleteId: string,
    on: string,
    legs: Legs,
    { squad = 'first', state = 'closed' }: { squad?: keyof TestAcademy['squads']; state?: 'open' | 'closed' } = {},
  ): Promise<{ dayId: string; trials: { id: string; test: string; side: Side }[] }> {
    const { rows } = await this.client.query<{ id: string }>(
      `insert into testing_day (academy_id, squad_id, battery_id, held_on, state) values ($1, $2, $3, $4, $5)
       on conflict (squad_id, battery_id, held_on) do update set held_on = excluded.held_on returning id`,
      [this.id, this.squads[squad], this.battery, on, state],
    );
    const dayId = rows[0]!.id;
    const trials: { id: string; test: string; side: Side }[] = [];
    for (const [test, sides] of Object.entries(legs)) {
      for (const side of ['left', 'right'] as const) {
        for (const attempt of [1, 2, 3]) {
          const id = randomUUID();
          trials.push({ id, test, side });
          await this.insert('trial', {
            ...{ ...this.own, id, testing_day_id: dayId, athlete_id: athleteId, test_id: this.tests.get(test) },
            ...{ side, attempt, value_si: sides[side], entered_value: String(sides[side]), entered_unit: 'SI' },
          });
        }
      }
    }
    return { dayId, trials };
  }

  async growth(athleteId: string, on: string, statureCm: number, massKg: number): Promise<void> {
    await this.insert('growth_measure', {
      ...{
        ...this.own,
        id: randomUUID(),
        athlete_id: athleteId,
        measured_on: on,
        stature_m: statureCm / 100,
        mass_kg: massKg,
      },
      entered: {},
    });
  }

  /** A driver session with drives around this standard carry. */
  async drives(athleteId: string, on: string, carryM: number): Promise<void> {
    const sessionId = randomUUID();
    await this.insert('driver_session', { ...this.own, id: sessionId, held_on: on, place: athleteId, wind_mps: 0 });
    await this.insert('driver_session_athlete', { ...this.own, driver_session_id: sessionId, athlete_id: athleteId });
    for (const [i, off] of [-2, -1, 0, 1, 2].entries()) {
      await this.insert('shot', {
        ...{ ...this.own, id: randomUUID(), driver_session_id: sessionId, athlete_id: athleteId, shot_no: i + 1 },
        ...{
          club: 'driver',
          club_label: 'Driver',
          club_speed_mps: 35,
          carry_m: carryM + off,
          carry_standard_m: carryM + off,
        },
      });
    }
  }
}
