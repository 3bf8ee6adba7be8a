import { randomUUID } from 'node:crypto';
import pg from 'pg';
import type { Role } from '#src/access/viewer.ts';

/** Who can be signed in, in each of two academies. */
export interface Person {
  id: string;
  role: Role;
  /** Athletes whose rows this person may reach. */
  scope: string[];
}

export interface Academy {
  id: string;
  athletes: string[];
  squads: [string, string];
  people: Record<'director' | 'strength' | 'swing' | 'guardian' | 'formerGuardian' | 'athlete', Person>;
}

/** Two academies alike, a row of every table about each athlete: what leaks, leaks visibly. */
export async function makeWorld(superuserUrl: string): Promise<{ here: Academy; there: Academy }> {
  const client = new pg.Client({ connectionString: superuserUrl });
  await client.connect();
  try {
    return { here: await makeAcademy(client, 'Here'), there: await makeAcademy(client, 'There') };
  } finally {
    await client.end();
  }
}

async function makeAcademy(client: pg.Client, name: string): Promise<Academy> {
  const id = randomUUID();
  const insert = async (table: string, row: Record<string, unknown>): Promise<string> => {
    const keys = Object.keys(row);
    const { rows } = await client.query<{ id: string }>(
      `insert into ${table} (${keys.join(', ')}) values (${keys.map((_, i) => `$${i + 1}`).join(', ')}) returning ${table}.*`,
      Object.values(row),
    );
    return rows[0]!.id;
  };
  await insert('academy', { id, name });
  const person = async (role: Role, given: string): Promise<string> => {
    const personId = await insert('person', { given_name: given, family_name: name });
    await insert('person_contact', { person_id: personId, email: `${given}@${name}.example`.toLowerCase() });
    await insert('credential', { person_id: personId, password_hash: '$argon2id$none' });
    const membershipId = await insert('membership', { academy_id: id, person_id: personId, role });
    const session = { token_hash: Buffer.from(randomUUID().replaceAll('-', ''), 'utf8'), person_id: personId };
    await insert('session', { ...session, membership_id: membershipId, expires_at: '2099-01-01' });
    return personId;
  };
  const director = await person('director', 'Dinah');
  const strength = await person('strength_coach', 'Stella');
  const swing = await person('swing_coach', 'Swithin');
  const guardian = await person('guardian', 'Gudrun');
  const formerGuardian = await person('guardian', 'Fergus');
  const ownAccount = await person('athlete', 'Ada');

  const first = await insert('squad', { academy_id: id, name: 'First' });
  const second = await insert('squad', { academy_id: id, name: 'Second' });
  await insert('squad_coach', { academy_id: id, squad_id: first, person_id: strength });
  await insert('squad_coach', { academy_id: id, squad_id: second, person_id: swing });
  await insert('term', { academy_id: id, name: 'Term', starts_on: '2026-01-01', ends_on: '2026-04-01' });
  const device = await insert('device', { academy_id: id, name: 'Rig' });
  const test = await insert('test', {
    ...{ academy_id: id, key: 'push', name: 'Push', quantity: 'force', unit: 'N', sided: true, better: 'higher' },
    ...{
      compares_in: 'percent',
      attempts: 3,
      uses: 'mean',
      lowest_si: 0,
      highest_si: 5000,
      noise_source: '',
      protocol: '',
    },
  });
  const battery = await insert('battery', { academy_id: id, name: 'Battery' });
  await insert('battery_test', { academy_id: id, battery_id: battery, test_id: test, position: 1 });
  const policy = await insert('policy_version', { academy_id: id, version: 1, rule_version: '1', thresholds: {} });
  await insert('import_file', {
    academy_id: id,
    kind: 'battery',
    name: 'a.csv',
    sha256: Buffer.from(name),
    rows_read: 1,
  });
  await insert('audit', { academy_id: id, action: 'add', subject: 'athlete' });
  await insert('column_mapping', { academy_id: id, name: 'Ours', kind: 'driver', mapping: {} });
  await insert('outbox', { academy_id: id, kind: 'outrun', person_id: swing, payload: {}, message_key: 'one' });
  for (const person of [director, strength, swing, guardian, formerGuardian, ownAccount]) {
    await insert('notice', {
      academy_id: id,
      person_id: person,
      kind: 'a test',
      text: 'Something happened',
      link: '/',
    });
  }
  const token = () => Buffer.from(randomUUID().replaceAll('-', ''), 'utf8');
  await insert('token', {
    ...{ academy_id: id, kind: 'invite', token_hash: token(), email: `new@${name}.example`.toLowerCase() },
    ...{ role: 'swing_coach', expires_at: '2099-01-01' },
  });
  await insert('token', { kind: 'reset', token_hash: token(), person_id: swing, expires_at: '2099-01-01' });
  await client.query(`insert into attempt_limit (key, points) values ($1, 1)`, [name]);

  const athletes: string[] = [];
  for (const [i, squad] of [first, first, second, second].entries()) {
    const athlete = await insert('athlete', {
      ...{ academy_id: id, squad_id: squad, given_name: `Athlete ${i}`, family_name: name, sex: 'female' },
      ...{ birth_date: '2013-05-05', person_id: i === 0 ? ownAccount : null },
    });
    athletes.push(athlete);
    const about = { academy_id: id, athlete_id: athlete };
    await insert('handedness', { ...about, plays: 'right' });
    await insert('guardian_address', { ...about, email: `parent${i}@${name}.example`.toLowerCase() });
    const day = await client.query<{ id: string }>(
      `insert into testing_day (academy_id, squad_id, battery_id, held_on) values ($1, $2, $3, '2026-02-02')
       on conflict (squad_id, battery_id, held_on) do update set held_on = excluded.held_on returning id`,
      [id, squad, battery],
    );
    const dayId = day.rows[0]!.id;
    await insert('trial', {
      ...{ ...about, id: randomUUID(), testing_day_id: dayId, test_id: test, side: 'left', attempt: 1, value_si: 500 },
      ...{ entered_value: '500', entered_unit: 'N' },
    });
    await insert('curve', {
      ...{ ...about, id: randomUUID(), test_id: test, side: 'left', recorded_on: '2026-02-02', sample_rate_hz: 1000 },
      ...{ samples: Buffer.alloc(4), figures: {}, quality_ok: true, source_hash: Buffer.from(`${name}${i}`) },
    });
    await insert('growth_measure', {
      ...{ ...about, id: randomUUID(), measured_on: '2026-02-02', stature_m: 1.5, entered: {} },
    });
    await insert('restriction', { ...about, allowed: 'walking', set_by: strength });
    const session = await client.query<{ id: string }>(
      `insert into driver_session (academy_id, held_on, place, recorded_by) values ($1, '2026-02-03', $2, $3)
       on conflict (academy_id, held_on, place) do update set held_on = excluded.held_on returning id`,
      [id, `for ${squad}`, swing],
    );
    const sessionId = session.rows[0]!.id;
    await insert('driver_session_athlete', { ...about, driver_session_id: sessionId });
    await insert('shot', {
      ...{ ...about, id: randomUUID(), driver_session_id: sessionId, shot_no: 1, club: 'driver', club_label: 'Driver' },
      ...{ carry_m: 150 },
    });
    const trace = await insert('ground_trace', {
      ...{ ...about, id: randomUUID(), recorded_on: '2026-02-03', swing_no: 1, device_id: device, measure: 'force' },
      ...{ sample_rate_hz: 500, events: {}, figures: {}, source_hash: Buffer.from(`${name}${i}`) },
    });
    await insert('ground_channel', { ...about, ground_trace_id: trace, side: 'left', samples: Buffer.alloc(4) });
    const judgement = await insert('judgement', {
      ...{ ...about, as_of: '2026-02-03', cause: 'a test', policy_version_id: policy, points: 0 },
      ...{ programme: {}, history: {}, result: {}, marks: {} },
    });
    const outrun = await insert('outrun', {
      ...{ ...about, level: 'look', level_judgement_id: judgement, latest_judgement_id: judgement },
      ...{ raised_on: '2026-02-03', level_since: '2026-02-03' },
    });
    await insert('outrun_event', { ...about, outrun_id: outrun, kind: 'raised', happened_on: '2026-02-03' });
    await insert('outrun_tick', { ...about, outrun_id: outrun, statement: 'Warm', ticked_by: strength });
    await insert('retest_request', { ...about, asked_by: swing });
    await insert('notebook_entry', { ...about, id: randomUUID(), author_id: strength, body: 'note' });
    await insert('testing_day_athlete', { ...about, testing_day_id: dayId });
    await insert('outrun_note', { ...about, outrun_id: outrun, author_id: strength, body: 'note' });
  }
  await insert('guardianship', { academy_id: id, athlete_id: athletes[0], person_id: guardian });
  await insert('guardianship', { academy_id: id, athlete_id: athletes[2], person_id: guardian });
  await insert('guardianship', {
    ...{ academy_id: id, athlete_id: athletes[1], person_id: formerGuardian, ended_at: '2026-01-01' },
  });
  const of = (...indexes: number[]) => indexes.map((index) => athletes[index]!);
  return {
    id,
    athletes,
    squads: [first, second],
    people: {
      director: { id: director, role: 'director', scope: of(0, 1, 2, 3) },
      strength: { id: strength, role: 'strength_coach', scope: of(0, 1) },
      swing: { id: swing, role: 'swing_coach', scope: of(2, 3) },
      guardian: { id: guardian, role: 'guardian', scope: of(0, 2) },
      formerGuardian: { id: formerGuardian, role: 'guardian', scope: [] },
      athlete: { id: ownAccount, role: 'athlete', scope: of(0) },
    },
  };
}
