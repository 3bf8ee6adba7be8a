import { sql, type Kysely } from 'kysely';
import { aboutAthletes, aboutProgramme, closed, EVERYONE, STAFF } from '#db/policies.ts';

const STRENGTH = ['director', 'strength_coach'] as const;

/** Tests, batteries, testing days, trials, force curves, growth measures, restrictions. */
export async function up(db: Kysely<unknown>): Promise<void> {
  await sql
    .raw(
      `
create type trial_state as enum ('valid', 'asked', 'void');

create table device (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  name text not null,
  unique (academy_id, name)
);

create table test (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  key text not null,
  name text not null,
  quantity text not null check (quantity in ('force', 'length', 'angle', 'time', 'count', 'mass', 'torque')),
  unit text not null,
  sided boolean not null,
  better text not null check (better in ('higher', 'lower')),
  compares_in text not null check (compares_in in ('percent', 'degrees', 'none')),
  attempts int not null check (attempts between 1 and 9),
  uses text not null check (uses in ('mean', 'best')),
  rest_s int not null default 60,
  lowest_si double precision not null,
  highest_si double precision not null check (highest_si > lowest_si),
  cv_pct double precision check (cv_pct > 0),
  noise_source text not null,
  protocol text not null,
  capacity text check (capacity in ('push', 'jump', 'hop')),
  -- medians in SI under 11, 11-12, 13-14, 15-17 years, for the first time an athlete meets the test
  first_medians_si double precision[] check (array_length(first_medians_si, 1) = 4),
  unique (academy_id, key)
);

create table battery (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  name text not null,
  unique (academy_id, name)
);

create table battery_test (
  academy_id uuid not null references academy,
  battery_id uuid not null references battery,
  test_id uuid not null references test,
  position int not null,
  primary key (battery_id, test_id)
);

create table testing_day (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  squad_id uuid not null references squad,
  battery_id uuid not null references battery,
  held_on date not null,
  state text not null default 'open' check (state in ('open', 'closed')),
  closed_at timestamptz,
  closed_by uuid references person,
  recorded_by uuid references person,
  unique (squad_id, battery_id, held_on)
);
-- serves: the list of testing days, newest first
create index testing_day_held on testing_day (academy_id, held_on desc);

create table trial (
  id uuid primary key,
  academy_id uuid not null references academy,
  testing_day_id uuid not null references testing_day,
  athlete_id uuid not null references athlete,
  test_id uuid not null references test,
  side side,
  attempt int not null check (attempt between 1 and 9),
  value_si double precision not null check (value_si >= 0 and value_si < 1e6),
  entered_value text not null,
  entered_unit text not null,
  state trial_state not null default 'valid',
  asked_reason text,
  void_reason text,
  settled_by uuid references person,
  settled_at timestamptz,
  version int not null default 1,
  recorded_by uuid references person,
  recorded_at timestamptz not null default now(),
  origin text,
  unique nulls not distinct (testing_day_id, athlete_id, test_id, side, attempt),
  check (state <> 'asked' or asked_reason is not null),
  check (state <> 'void' or void_reason is not null)
);
-- serves: one athlete's trials by test over time (Record, judging, history of a cell)
create index trial_athlete on trial (athlete_id, test_id, testing_day_id);
-- serves: the list of values that wait for a yes or no
create index trial_asked on trial (academy_id, athlete_id) where state = 'asked';

create table curve (
  id uuid primary key,
  academy_id uuid not null references academy,
  athlete_id uuid not null references athlete,
  testing_day_id uuid references testing_day,
  test_id uuid not null references test,
  side side not null,
  recorded_on date not null,
  device_id uuid references device,
  sample_rate_hz double precision not null check (sample_rate_hz > 0),
  -- little-endian 32-bit floats, newtons
  samples bytea not null,
  figures jsonb not null,
  quality_ok boolean not null,
  problems text[] not null default '{}',
  source_hash bytea not null,
  recorded_by uuid references person,
  recorded_at timestamptz not null default now(),
  unique (academy_id, source_hash)
);
-- serves: the curves of one athlete, newest first
create index curve_athlete on curve (athlete_id, recorded_on desc);

create table growth_measure (
  id uuid primary key,
  academy_id uuid not null references academy,
  athlete_id uuid not null references athlete,
  measured_on date not null,
  place text not null default 'academy' check (place in ('academy', 'home')),
  stature_m double precision check (stature_m between 0.8 and 2.3),
  sitting_height_m double precision check (sitting_height_m between 0.4 and 1.3),
  mass_kg double precision check (mass_kg between 12 and 180),
  entered jsonb not null,
  state trial_state not null default 'valid',
  asked_reason text,
  void_reason text,
  settled_by uuid references person,
  settled_at timestamptz,
  version int not null default 1,
  recorded_by uuid references person,
  recorded_at timestamptz not null default now(),
  unique (athlete_id, measured_on, place),
  check (coalesce(stature_m, sitting_height_m, mass_kg) is not null),
  check (state <> 'asked' or asked_reason is not null),
  check (state <> 'void' or void_reason is not null)
);

create table restriction (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  athlete_id uuid not null references athlete,
  -- what the child may and may not do; never why
  allowed text not null check (length(allowed) between 1 and 500),
  set_by uuid not null references person,
  set_at timestamptz not null default now(),
  cleared_by uuid references person,
  cleared_at timestamptz
);
-- serves: the restriction in force of an athlete
create index restriction_athlete on restriction (athlete_id) where cleared_at is null;

${aboutProgramme('device', { readers: EVERYONE, writers: STAFF })}
${aboutProgramme('test', { readers: EVERYONE, writers: ['director'] })}
${aboutProgramme('battery', { readers: EVERYONE, writers: ['director'] })}
${aboutProgramme('battery_test', { readers: EVERYONE, writers: ['director'] })}

${closed('testing_day')}
create policy testing_day_read on testing_day for select to marram_app
  using (academy_id = (select app.academy_id()) and squad_id in (select app.visible_squads()));
create policy testing_day_add on testing_day for insert to marram_app
  with check (academy_id = (select app.academy_id()) and (select app.acts_as('director', 'strength_coach')) and squad_id in (select app.visible_squads()));
create policy testing_day_change on testing_day for update to marram_app
  using (academy_id = (select app.academy_id()) and (select app.acts_as('director', 'strength_coach')) and squad_id in (select app.visible_squads()))
  with check (academy_id = (select app.academy_id()) and (select app.acts_as('director', 'strength_coach')) and squad_id in (select app.visible_squads()));
grant select, insert, update on testing_day to marram_app;

${aboutAthletes('trial', { readers: EVERYONE, writers: STRENGTH })}
${aboutAthletes('curve', { readers: EVERYONE, writers: STRENGTH })}
${aboutAthletes('growth_measure', { readers: EVERYONE, writers: [...STRENGTH, 'guardian'] })}
-- A parent adds a height at home, marked so, and nothing else.
create policy growth_measure_home on growth_measure as restrictive for insert to marram_app
  with check (place = 'home' or not (select app.acts_as('guardian')));
create policy growth_measure_home_change on growth_measure as restrictive for update to marram_app
  using (place = 'home' or not (select app.acts_as('guardian')));
${aboutAthletes('restriction', { readers: EVERYONE, writers: STAFF })}
`,
    )
    .execute(db);
}
