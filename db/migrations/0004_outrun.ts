import { sql, type Kysely } from 'kysely';
import { aboutAthletes, aboutProgramme, STAFF } from '#db/policies.ts';

/** Policy versions, judgements with the inputs that made them, outruns with their events and notes. */
export async function up(db: Kysely<unknown>): Promise<void> {
  await sql
    .raw(
      `
create table policy_version (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  version int not null,
  rule_version text not null,
  thresholds jsonb not null,
  made_by uuid references person,
  made_at timestamptz not null default now(),
  unique (academy_id, version)
);

create table judgement (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  athlete_id uuid not null references athlete,
  as_of date not null,
  -- what caused it: a closed day, an import, a settled value, a changed mass or handedness, a policy
  cause text not null,
  testing_day_id uuid references testing_day,
  policy_version_id uuid not null references policy_version,
  level text check (level in ('look', 'act')),
  points int not null,
  -- the athlete's own figures that others are compared with
  raw_gain_pct double precision,
  demand_ratio double precision,
  demand_rig text,
  lead_push_n double precision,
  club_speed_mps double precision,
  -- the programme's figures as they stood: others' gains, others' demand, the regression's rows
  programme jsonb not null,
  history jsonb not null,
  result jsonb not null,
  marks jsonb not null,
  made_at timestamptz not null default clock_timestamp()
);
-- serves: the newest judgement of an athlete
create index judgement_athlete on judgement (athlete_id, made_at desc);

create table outrun (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  athlete_id uuid not null references athlete,
  state text not null default 'raised' check (state in ('raised', 'discussed', 'in hand', 'cleared', 'set aside')),
  -- the last level held
  level text not null check (level in ('look', 'act')),
  level_judgement_id uuid not null references judgement,
  latest_judgement_id uuid not null references judgement,
  may_be_cleared boolean not null default false,
  raised_on date not null,
  level_since date not null,
  route text check (route in ('build', 'hold', 'club set-up', 'ask a clinician')),
  look_again_on date,
  closed_on date,
  close_reason text,
  version int not null default 1,
  check (state not in ('cleared', 'set aside') or closed_on is not null),
  check (state <> 'in hand' or route is not null)
);
-- at most one open outrun for an athlete
create unique index outrun_open on outrun (athlete_id) where state in ('raised', 'discussed', 'in hand');
-- serves: the list of outruns of an academy
create index outrun_academy on outrun (academy_id, state, raised_on desc);

create table outrun_event (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  athlete_id uuid not null references athlete,
  outrun_id uuid not null references outrun,
  kind text not null check (kind in
    ('raised', 'level up', 'level down', 'no level', 'discussed', 'route', 'may be cleared', 'cleared', 'set aside')),
  happened_on date not null,
  level text check (level in ('look', 'act')),
  judgement_id uuid references judgement,
  actor_id uuid references person,
  text text not null default '',
  made_at timestamptz not null default clock_timestamp()
);
-- serves: the events of one outrun, in order
create index outrun_event_outrun on outrun_event (outrun_id, made_at);

create table outrun_note (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  athlete_id uuid not null references athlete,
  outrun_id uuid not null references outrun,
  author_id uuid not null references person,
  body text not null check (length(body) between 1 and 4000),
  made_at timestamptz not null default clock_timestamp()
);
-- serves: the notes of one outrun, in order
create index outrun_note_outrun on outrun_note (outrun_id, made_at);

${aboutProgramme('policy_version', { readers: STAFF, writers: ['director'] })}
${aboutAthletes('judgement', { readers: STAFF, writers: STAFF })}
${aboutAthletes('outrun', { readers: STAFF, writers: STAFF })}
${aboutAthletes('outrun_event', { readers: STAFF, writers: STAFF })}
${aboutAthletes('outrun_note', { readers: STAFF, writers: STAFF })}
revoke update on judgement, outrun_event, outrun_note from marram_app;

-- The programme's figures are compared across squads that one coach does not see: numbers only, no names. Of each
-- other athlete of the academy: the newest judgement's gain and the newest measured demand, not older than 400 days.
create function app.programme_figures(except_athletes uuid[], as_of date)
  returns table (raw_gain_pct double precision, demand_ratio double precision, demand_rig text,
    lead_push_n double precision, club_speed_mps double precision)
  stable language sql security definer set search_path = public, pg_temp
  as $$
    select n.raw_gain_pct, d.demand_ratio, d.demand_rig, n.lead_push_n, n.club_speed_mps
    from athlete a
    left join lateral (
      select j.raw_gain_pct, j.lead_push_n, j.club_speed_mps from judgement j
      where j.athlete_id = a.id and j.as_of <= $2 and j.as_of > $2 - 400
      order by j.as_of desc, j.made_at desc limit 1) n on true
    left join lateral (
      select j.demand_ratio, j.demand_rig from judgement j
      where j.athlete_id = a.id and j.as_of <= $2 and j.as_of > $2 - 400 and j.demand_ratio is not null
      order by j.as_of desc, j.made_at desc limit 1) d on true
    where a.academy_id = app.academy_id() and a.id <> all ($1)
      and (app.acts_as('director', 'strength_coach', 'swing_coach') or pg_has_role(session_user, 'marram_job', 'usage'))
  $$;
revoke all on function app.programme_figures(uuid[], date) from public;
grant execute on function app.programme_figures(uuid[], date) to marram_app, marram_job;
`,
    )
    .execute(db);
}
