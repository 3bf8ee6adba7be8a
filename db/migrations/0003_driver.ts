import { sql, type Kysely } from 'kysely';
import { aboutAthletes, aboutProgramme, closed, EVERYONE, STAFF } from '#db/policies.ts';

const SWING = ['director', 'swing_coach'] as const;

/** Driver sessions with their conditions, shots, ground traces, and the files that were imported. */
export async function up(db: Kysely<unknown>): Promise<void> {
  await sql
    .raw(
      `
create table driver_session (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  held_on date not null,
  place text not null default '',
  temperature_c double precision check (temperature_c between -20 and 55),
  humidity_pct double precision check (humidity_pct between 0 and 100),
  pressure_pa double precision check (pressure_pa between 50000 and 110000),
  altitude_m double precision check (altitude_m between -450 and 5000),
  -- along the target line; positive follows the ball
  wind_mps double precision check (wind_mps between -25 and 25),
  surface text not null default '',
  ball text not null default '',
  recorded_by uuid references person,
  recorded_at timestamptz not null default now(),
  unique (academy_id, held_on, place)
);

create table driver_session_athlete (
  academy_id uuid not null references academy,
  driver_session_id uuid not null references driver_session,
  athlete_id uuid not null references athlete,
  club_length_m double precision,
  club_loft_deg double precision,
  primary key (driver_session_id, athlete_id)
);
-- serves: which sessions has this athlete
create index driver_session_athlete_athlete on driver_session_athlete (athlete_id);

create table shot (
  id uuid primary key,
  academy_id uuid not null references academy,
  driver_session_id uuid not null references driver_session,
  athlete_id uuid not null references athlete,
  shot_no int not null,
  club text not null check (club in ('driver', 'other')),
  club_label text not null,
  club_speed_mps double precision,
  ball_speed_mps double precision,
  launch_deg double precision,
  spin_rpm double precision,
  attack_deg double precision,
  dynamic_loft_deg double precision,
  carry_m double precision not null check (carry_m >= 0 and carry_m < 450),
  offline_m double precision,
  -- at 20 degrees, 101 325 Pa, 50 % humidity, no wind; null without launch or spin
  carry_standard_m double precision,
  state text not null default 'counted' check (state in ('counted', 'excluded', 'void')),
  exclusion_rule text,
  exclusion_reason text,
  settled_by uuid references person,
  settled_at timestamptz,
  version int not null default 1,
  unique (driver_session_id, athlete_id, shot_no),
  check (state <> 'excluded' or exclusion_reason is not null)
);
-- serves: one athlete's drives over time (Record, judging)
create index shot_athlete on shot (athlete_id, driver_session_id) where club = 'driver';

create table ground_trace (
  id uuid primary key,
  academy_id uuid not null references academy,
  athlete_id uuid not null references athlete,
  driver_session_id uuid references driver_session,
  recorded_on date not null,
  swing_no int not null,
  club text not null default 'driver',
  device_id uuid references device,
  measure text not null check (measure in ('force', 'pressure')),
  sample_rate_hz double precision not null check (sample_rate_hz > 0),
  -- seconds from the first sample, the names of METHOD: takeaway, top, leadArmParallel, impact ...
  events jsonb not null,
  -- the figures with the left leg as lead and with the right leg as lead, so that a corrected handedness only reads the other
  figures jsonb not null,
  problems text[] not null default '{}',
  state text not null default 'valid' check (state in ('valid', 'void')),
  source_hash bytea not null,
  recorded_by uuid references person,
  recorded_at timestamptz not null default now(),
  unique (academy_id, source_hash)
);
-- serves: one athlete's traces over time (Record, judging)
create index ground_trace_athlete on ground_trace (athlete_id, recorded_on desc, swing_no);

create table ground_channel (
  academy_id uuid not null references academy,
  athlete_id uuid not null references athlete,
  ground_trace_id uuid not null references ground_trace,
  side side not null,
  -- little-endian 32-bit floats, newtons or the pressure unit of the device
  samples bytea not null,
  primary key (ground_trace_id, side)
);

create table import_file (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  kind text not null,
  name text not null,
  sha256 bytea not null,
  rows_read int not null,
  imported_by uuid references person,
  imported_at timestamptz not null default now(),
  unique (academy_id, sha256)
);

${closed('driver_session')}
create policy driver_session_read on driver_session for select to marram_app
  using (academy_id = (select app.academy_id()) and (
    (select app.acts_as('director'))
    or (recorded_by = (select app.person_id()) and (select app.acts_as('swing_coach')))
    or id in (select s.driver_session_id from driver_session_athlete s)));
create policy driver_session_add on driver_session for insert to marram_app
  with check (academy_id = (select app.academy_id()) and (select app.acts_as('director', 'swing_coach')) and recorded_by = (select app.person_id()));
create policy driver_session_change on driver_session for update to marram_app
  using (academy_id = (select app.academy_id()) and (select app.acts_as('director', 'swing_coach')))
  with check (academy_id = (select app.academy_id()) and (select app.acts_as('director', 'swing_coach')));
grant select, insert, update on driver_session to marram_app;

${aboutAthletes('driver_session_athlete', { readers: EVERYONE, writers: SWING })}
${aboutAthletes('shot', { readers: EVERYONE, writers: SWING })}
${aboutAthletes('ground_trace', { readers: EVERYONE, writers: SWING })}
${aboutAthletes('ground_channel', { readers: EVERYONE, writers: SWING })}
${aboutProgramme('import_file', { readers: STAFF, writers: STAFF })}
`,
    )
    .execute(db);
}
