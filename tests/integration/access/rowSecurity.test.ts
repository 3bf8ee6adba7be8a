import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { useTestDatabase } from '#tests/config/testDatabase.ts';
import { makeWorld, type Academy, type Person } from '#tests/integration/access/world.ts';

const database = useTestDatabase();
let here: Academy;
let there: Academy;
let app: pg.Client;
let superuser: pg.Client;

beforeAll(async () => {
  ({ here, there } = await makeWorld(database().superuserUrl));
  app = new pg.Client({ connectionString: database().env['DATABASE_URL'] });
  superuser = new pg.Client({ connectionString: database().superuserUrl });
  await Promise.all([app.connect(), superuser.connect()]);
});
afterAll(() => Promise.all([app.end(), superuser.end()]));

interface Settings {
  academy: string;
  person: string;
  role: string;
}

/** Rows that plain SQL without a WHERE gives the application's role, seen through these settings. */
async function rowsAs(settings: Settings | null, table: string): Promise<Record<string, unknown>[]> {
  await app.query('begin');
  try {
    if (settings) {
      await app.query(
        `select set_config('app.academy', $1, true), set_config('app.person', $2, true), set_config('app.role', $3, true)`,
        [settings.academy, settings.person, settings.role],
      );
    }
    return (await app.query<Record<string, unknown>>(`select * from ${table}`)).rows;
  } catch (error) {
    if ((error as { code?: string }).code === '42501') return [];
    throw error;
  } finally {
    await app.query('rollback');
  }
}

const as = (academy: Academy, { id, role }: Person): Settings => ({ academy: academy.id, person: id, role });
const allTables = async () =>
  (
    await superuser.query<{ name: string }>(
      `select relname as name from pg_class where relnamespace = 'public'::regnamespace and relkind = 'r'
       and relname not like 'kysely%' order by 1`,
    )
  ).rows.map(({ name }) => name);

const STAFF = ['director', 'strength', 'swing'] as const;
const EVERYONE = [...STAFF, 'guardian', 'athlete'] as const;
type Who = keyof Academy['people'];

/** Tables about athletes, with who may read the rows of the athletes in their scope. */
const ABOUT_ATHLETES: Readonly<Record<string, readonly Who[]>> = {
  guardian_address: ['director'],
  handedness: EVERYONE,
  trial: EVERYONE,
  curve: EVERYONE,
  growth_measure: EVERYONE,
  restriction: EVERYONE,
  driver_session_athlete: EVERYONE,
  shot: EVERYONE,
  ground_trace: EVERYONE,
  ground_channel: EVERYONE,
  judgement: STAFF,
  outrun: STAFF,
  outrun_event: STAFF,
  outrun_note: STAFF,
  outrun_tick: STAFF,
  retest_request: STAFF,
  notebook_entry: STAFF,
  testing_day_athlete: STAFF,
};

const STRENGTH = ['director', 'strength'] as const;
const SWING = ['director', 'swing'] as const;

/** Who may change rows of these tables, for the athletes in their scope (PRODUCT.md, "Who sees what"). */
const WRITERS: Readonly<Record<string, readonly Who[]>> = {
  guardian_address: ['director'],
  handedness: STAFF,
  trial: STRENGTH,
  curve: STRENGTH,
  growth_measure: [...STRENGTH, 'guardian'],
  restriction: STAFF,
  driver_session_athlete: SWING,
  shot: SWING,
  ground_trace: SWING,
  ground_channel: SWING,
  judgement: STAFF,
  outrun: STAFF,
  outrun_event: STAFF,
  outrun_note: STAFF,
  testing_day_athlete: STRENGTH,
  retest_request: STAFF,
  notebook_entry: STAFF,
  outrun_tick: STAFF,
};
/** What is added to and never changed. */
const UNCHANGING = ['handedness', 'judgement', 'outrun_event', 'outrun_note'];

/** Athletes whose rows an update without a WHERE would change, as the application's role. */
async function changedAs(settings: Settings, table: string): Promise<unknown[]> {
  await app.query('begin');
  try {
    await app.query(
      `select set_config('app.academy', $1, true), set_config('app.person', $2, true), set_config('app.role', $3, true)`,
      [settings.academy, settings.person, settings.role],
    );
    const { rows } = await app.query<{ athlete_id: unknown }>(
      `update ${table} set academy_id = academy_id returning athlete_id`,
    );
    return rows.map(({ athlete_id: id }) => id);
  } catch (error) {
    if ((error as { code?: string }).code === '42501') return [];
    throw error;
  } finally {
    await app.query('rollback');
  }
}

/** Every other table, with how many rows each role reads in this world. */
const OTHERS: Readonly<Record<string, Partial<Record<Who, number>>>> = {
  academy: { director: 1, strength: 1, swing: 1, guardian: 1, formerGuardian: 1, athlete: 1 },
  // The director reads everyone's name, the others the staff's and their own.
  person: { director: 6, strength: 3, swing: 3, guardian: 4, formerGuardian: 4, athlete: 4 },
  person_contact: { director: 6, strength: 1, swing: 1, guardian: 1, formerGuardian: 1, athlete: 1 },
  credential: {},
  session: {},
  attempt_limit: {},
  membership: { director: 6, strength: 1, swing: 1, guardian: 1, formerGuardian: 1, athlete: 1 },
  squad: { director: 2, strength: 1, swing: 1, guardian: 2, athlete: 1 },
  squad_coach: { director: 2, strength: 1, swing: 1, guardian: 2, athlete: 1 },
  term: { director: 1, strength: 1, swing: 1, guardian: 1, formerGuardian: 1, athlete: 1 },
  athlete: { director: 4, strength: 2, swing: 2, guardian: 2, athlete: 1 },
  guardianship: { director: 3, guardian: 2, formerGuardian: 1 },
  audit: { director: 1 },
  device: { director: 1, strength: 1, swing: 1, guardian: 1, formerGuardian: 1, athlete: 1 },
  test: { director: 1, strength: 1, swing: 1, guardian: 1, formerGuardian: 1, athlete: 1 },
  battery: { director: 1, strength: 1, swing: 1, guardian: 1, formerGuardian: 1, athlete: 1 },
  battery_test: { director: 1, strength: 1, swing: 1, guardian: 1, formerGuardian: 1, athlete: 1 },
  testing_day: { director: 2, strength: 1, swing: 1, guardian: 2, athlete: 1 },
  // The swing coach recorded both sessions; the others reach those with an athlete of theirs in it.
  driver_session: { director: 2, strength: 1, swing: 2, guardian: 2, athlete: 1 },
  import_file: { director: 1, strength: 1, swing: 1 },
  policy_version: { director: 1, strength: 1, swing: 1 },
  column_mapping: { director: 1, strength: 1, swing: 1 },
  // Each their own, whoever leads.
  notice: { director: 1, strength: 1, swing: 1, guardian: 1, formerGuardian: 1, athlete: 1 },
  outbox: { director: 1 },
  // The director reads the invitation; nobody reads a reset.
  token: { director: 1 },
};

describe('row security', () => {
  it('knows every table', async () => {
    expect(await allTables()).toEqual([...Object.keys(ABOUT_ATHLETES), ...Object.keys(OTHERS)].sort());
  });

  it('is forced on every table, and every table belongs to an academy except the named ones', async () => {
    const { rows } = await superuser.query<{ name: string; forced: boolean; academy: boolean }>(
      `select relname as name, relrowsecurity and relforcerowsecurity as forced,
         exists (select from pg_attribute where attrelid = pg_class.oid and attname = 'academy_id' and attnotnull) as academy
       from pg_class where relnamespace = 'public'::regnamespace and relkind = 'r' and relname not like 'kysely%' order by 1`,
    );
    expect(rows.filter(({ forced }) => !forced)).toEqual([]);
    const without = rows.filter(({ academy }) => !academy).map(({ name }) => name);
    // The audit also notes what happens before there is an academy; a reset of a password belongs to none.
    expect(without).toEqual([
      'academy',
      'attempt_limit',
      'audit',
      'credential',
      'person',
      'person_contact',
      'session',
      'token',
    ]);
  });

  it('gives nothing without a viewer', async () => {
    for (const table of await allTables()) expect(await rowsAs(null, table), table).toEqual([]);
  });

  it.each(Object.entries(ABOUT_ATHLETES))('gives each role the rows of its athletes: %s', async (table, readers) => {
    for (const [who, person] of Object.entries(here.people)) {
      const rows = await rowsAs(as(here, person), table);
      const expected = readers.includes(who as Who) ? person.scope : [];
      expect([...new Set(rows.map((row) => row['athlete_id']))].sort(), who).toEqual([...expected].sort());
    }
  });

  it.each(Object.entries(OTHERS))('gives each role its rows: %s', async (table, counts) => {
    for (const [who, person] of Object.entries(here.people)) {
      const rows = await rowsAs(as(here, person), table);
      expect(rows.length, who).toBe(counts[who as Who] ?? 0);
      expect(rows.some((row) => row['academy_id'] === there.id)).toBe(false);
    }
  });

  it('gives nothing to settings without a live membership behind them', async () => {
    const { director, strength, guardian } = here.people;
    const forged: Settings[] = [
      { academy: there.id, person: director.id, role: 'director' },
      { academy: here.id, person: guardian.id, role: 'director' },
      { academy: here.id, person: strength.id, role: 'swing_coach' },
      { academy: here.id, person: '00000000-0000-4000-8000-000000000000', role: 'director' },
    ];
    for (const settings of forged) {
      for (const table of await allTables())
        expect(await rowsAs(settings, table), `${table} ${settings.role}`).toEqual([]);
    }
  });

  it('stops a person whose membership ended or who was disabled', async () => {
    const { strength, swing } = there.people;
    await superuser.query('update membership set ended_at = now() where person_id = $1', [strength.id]);
    await superuser.query('update person set disabled_at = now() where id = $1', [swing.id]);
    for (const person of [strength, swing]) {
      for (const table of await allTables()) expect(await rowsAs(as(there, person), table), table).toEqual([]);
    }
  });

  it('ends a guardian’s view on the eighteenth birthday', async () => {
    const { guardian } = here.people;
    const [child] = guardian.scope;
    const bornYearsAgo = (years: number) =>
      superuser.query(
        `update athlete set birth_date = (now() at time zone 'Europe/London')::date - make_interval(years => $1) where id = $2`,
        [years, child],
      );
    const sees = async () => (await rowsAs(as(here, guardian), 'trial')).some((row) => row['athlete_id'] === child);
    await bornYearsAgo(17);
    expect(await sees()).toBe(true);
    await bornYearsAgo(18);
    expect(await sees()).toBe(false);
    await superuser.query(`update athlete set birth_date = '2013-05-05' where id = $1`, [child]);
  });

  it.each(Object.keys(ABOUT_ATHLETES))('lets each role change only what it may: %s', async (table) => {
    for (const [who, person] of Object.entries(here.people)) {
      const writers = WRITERS[table]!;
      const changed = await changedAs(as(here, person), table);
      const own = writers.includes(who as Who) && !UNCHANGING.includes(table) ? person.scope : [];
      // A parent changes only what was measured at home, and nothing in this world was.
      const expected = table === 'growth_measure' && person.role === 'guardian' ? [] : own;
      expect([...new Set(changed)].sort(), who).toEqual([...expected].sort());
    }
  });

  it('refuses rows written for another academy, and for athletes out of scope', async () => {
    const { strength } = here.people;
    const write = async (academy: string, athlete: string) => {
      await app.query('begin');
      try {
        await app.query(
          `select set_config('app.academy', $1, true), set_config('app.person', $2, true), set_config('app.role', $3, true)`,
          [here.id, strength.id, strength.role],
        );
        await app.query(
          `insert into growth_measure (id, academy_id, athlete_id, measured_on, stature_m, entered)
           values (gen_random_uuid(), $1, $2, '2026-05-05', 1.5, '{}')`,
          [academy, athlete],
        );
        return 'written';
      } catch (error) {
        return (error as { code?: string }).code;
      } finally {
        await app.query('rollback');
      }
    };
    expect(await write(here.id, here.athletes[0]!)).toBe('written');
    expect(await write(here.id, here.athletes[2]!)).toBe('42501');
    expect(await write(there.id, there.athletes[0]!)).toBe('42501');
    expect(await write(there.id, here.athletes[0]!)).toBe('42501');
  });

  it('never lets the application change or remove the audit, a judgement, an event or a note', async () => {
    const { director } = here.people;
    for (const table of ['audit', 'judgement', 'outrun_event', 'outrun_note']) {
      for (const statement of [`update ${table} set academy_id = academy_id`, `delete from ${table}`]) {
        await app.query('begin');
        await app.query(
          `select set_config('app.academy', $1, true), set_config('app.person', $2, true), set_config('app.role', $3, true)`,
          [here.id, director.id, director.role],
        );
        await expect(app.query(statement), statement).rejects.toMatchObject({ code: '42501' });
        await app.query('rollback');
      }
    }
  });
});
