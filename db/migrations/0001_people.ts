import { sql, type Kysely } from 'kysely';
import { aboutAthletes, aboutProgramme, closed, EVERYONE, STAFF } from '#db/policies.ts';

/** Academies, people, sign-in, squads, terms, athletes, and the functions that every row policy asks. */
export async function up(db: Kysely<unknown>): Promise<void> {
  await sql
    .raw(
      `
create schema app;
grant usage on schema app, public to marram_app, marram_auth, marram_job, marram_backup;

create type role as enum ('director', 'strength_coach', 'swing_coach', 'guardian', 'athlete');
create type side as enum ('left', 'right');
create type sex as enum ('female', 'male');

create function app.academy_id() returns uuid stable language sql
  as $$ select nullif(current_setting('app.academy', true), '')::uuid $$;
create function app.person_id() returns uuid stable language sql
  as $$ select nullif(current_setting('app.person', true), '')::uuid $$;
create function app.role() returns role stable language sql
  as $$ select nullif(current_setting('app.role', true), '')::role $$;

create table academy (
  id uuid primary key default gen_random_uuid(),
  name text not null unique check (length(name) between 1 and 120),
  time_zone text not null default 'Europe/London',
  own_account_age int not null default 13 check (own_account_age between 10 and 18),
  safeguarding_contact text not null default '',
  created_at timestamptz not null default now()
);

create table person (
  id uuid primary key default gen_random_uuid(),
  given_name text not null check (length(given_name) between 1 and 80),
  family_name text not null check (length(family_name) between 1 and 80),
  created_at timestamptz not null default now(),
  disabled_at timestamptz
);

-- Addresses stand apart from names: coaches read the names of people, never how to reach them.
create table person_contact (
  person_id uuid primary key references person,
  email text unique check (email = lower(email) and email ~ '^[^@[:space:]]+@[^@[:space:]]+$'),
  user_name text unique check (user_name ~ '^[a-z0-9][a-z0-9._-]{2,39}$'),
  check (email is not null or user_name is not null)
);

create table credential (
  person_id uuid primary key references person,
  password_hash text not null check (password_hash like '$argon2id$%'),
  changed_at timestamptz not null default now()
);

create table membership (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  person_id uuid not null references person,
  role role not null,
  started_at timestamptz not null default now(),
  ended_at timestamptz,
  unique (academy_id, person_id, role)
);
-- serves: sign-in and each request (which roles has this person now)
create index membership_person on membership (person_id) where ended_at is null;

create table session (
  id uuid primary key default gen_random_uuid(),
  token_hash bytea not null unique check (length(token_hash) = 32),
  person_id uuid not null references person,
  membership_id uuid not null references membership,
  created_at timestamptz not null default now(),
  last_seen_at timestamptz not null default now(),
  expires_at timestamptz not null,
  revoked_at timestamptz
);
-- serves: revoke every session of a person
create index session_person on session (person_id) where revoked_at is null;

-- The shape that rate-limiter-flexible reads and writes.
create table attempt_limit (
  key text primary key,
  points int not null default 0,
  expire bigint
);

create table squad (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  name text not null check (length(name) between 1 and 60),
  unique (academy_id, name)
);

create table squad_coach (
  academy_id uuid not null references academy,
  squad_id uuid not null references squad,
  person_id uuid not null references person,
  primary key (squad_id, person_id)
);
-- serves: app.visible_athletes (squads of a coach)
create index squad_coach_person on squad_coach (person_id, academy_id);

create table term (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  name text not null,
  starts_on date not null,
  ends_on date not null check (ends_on >= starts_on),
  unique (academy_id, starts_on)
);

create table athlete (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  squad_id uuid not null references squad,
  person_id uuid references person,
  given_name text not null check (length(given_name) between 1 and 80),
  family_name text not null check (length(family_name) between 1 and 80),
  birth_date date not null,
  sex sex not null,
  joined_on date,
  left_on date,
  created_at timestamptz not null default now(),
  unique (academy_id, person_id)
);
-- serves: app.visible_athletes and every squad list
create index athlete_squad on athlete (academy_id, squad_id, family_name, given_name);

create table guardianship (
  academy_id uuid not null references academy,
  athlete_id uuid not null references athlete,
  person_id uuid not null references person,
  started_at timestamptz not null default now(),
  ended_at timestamptz,
  primary key (athlete_id, person_id)
);
-- serves: app.visible_athletes (children of a guardian)
create index guardianship_person on guardianship (person_id, academy_id) where ended_at is null;

create table guardian_address (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  athlete_id uuid not null references athlete,
  email text not null check (email = lower(email)),
  invited_at timestamptz,
  unique (athlete_id, email)
);

-- The newest row is what the child plays; every lead and trail figure follows it, old sessions included.
create table handedness (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  athlete_id uuid not null references athlete,
  plays side not null,
  recorded_at timestamptz not null default clock_timestamp(),
  recorded_by uuid references person,
  reason text not null default ''
);
-- serves: the newest handedness of an athlete
create index handedness_athlete on handedness (athlete_id, recorded_at desc);

create table audit (
  id bigint generated always as identity primary key,
  academy_id uuid references academy,
  at timestamptz not null default clock_timestamp(),
  actor_id uuid,
  actor_role role,
  action text not null,
  subject text not null,
  subject_id uuid,
  athlete_id uuid,
  change jsonb
);
-- serves: the director's audit list, newest first
create index audit_academy on audit (academy_id, at desc);

-- Asked by every policy. Definer functions read past row security, and answer only about the viewer's own present
-- membership: a setting without a live membership behind it sees nothing.
create function app.acts_as(variadic roles role[]) returns boolean stable language sql security definer
  set search_path = public, pg_temp
  as $$
    select app.role() = any (roles) and exists (
      select from membership m join person p on p.id = m.person_id
      where m.person_id = app.person_id() and m.academy_id = app.academy_id() and m.role = app.role()
        and m.ended_at is null and p.disabled_at is null)
  $$;

create function app.visible_squads() returns setof uuid stable language sql security definer
  set search_path = public, pg_temp
  as $$
    select s.id from squad s
    where s.academy_id = app.academy_id() and case
      when app.acts_as('director') then true
      when app.acts_as('strength_coach', 'swing_coach') then exists (
        select from squad_coach c where c.squad_id = s.id and c.person_id = app.person_id())
      when app.acts_as('guardian') then exists (
        select from athlete a join guardianship g on g.athlete_id = a.id
        where a.squad_id = s.id and g.person_id = app.person_id() and g.ended_at is null)
      when app.acts_as('athlete') then exists (
        select from athlete a where a.squad_id = s.id and a.person_id = app.person_id())
      else false end
  $$;

create function app.visible_athletes() returns setof uuid stable language sql security definer
  set search_path = public, pg_temp
  as $$
    select a.id from athlete a
    where app.acts_as('director', 'strength_coach', 'swing_coach')
      and a.academy_id = app.academy_id() and a.squad_id in (select app.visible_squads())
    union all
    -- A guardian's access ends on the eighteenth birthday, by the academy's own calendar.
    select a.id from athlete a
    join guardianship g on g.athlete_id = a.id
    join academy ac on ac.id = a.academy_id
    where app.acts_as('guardian') and a.academy_id = app.academy_id()
      and g.person_id = app.person_id() and g.ended_at is null
      and a.birth_date > ((now() at time zone ac.time_zone)::date - interval '18 years')
    union all
    select a.id from athlete a
    where app.acts_as('athlete') and a.academy_id = app.academy_id() and a.person_id = app.person_id()
  $$;

-- People whose name the viewer may read: self, staff of the academy, and for the director everyone in it.
create function app.visible_people() returns setof uuid stable language sql security definer
  set search_path = public, pg_temp
  as $$
    select app.person_id() where app.acts_as('director', 'strength_coach', 'swing_coach', 'guardian', 'athlete')
    union
    select m.person_id from membership m
    where m.academy_id = app.academy_id()
      and app.acts_as('director', 'strength_coach', 'swing_coach', 'guardian', 'athlete')
      and (m.role in ('director', 'strength_coach', 'swing_coach') or app.acts_as('director'))
  $$;

revoke all on function app.acts_as(role[]), app.visible_squads(), app.visible_athletes(), app.visible_people() from public;
grant execute on function app.acts_as(role[]), app.visible_squads(), app.visible_athletes(), app.visible_people() to marram_app;

alter table academy enable row level security;
alter table academy force row level security;
create policy academy_read on academy for select to marram_app
  using (id = (select app.academy_id()) and (select app.acts_as('director', 'strength_coach', 'swing_coach', 'guardian', 'athlete')));
create policy academy_change on academy for update to marram_app
  using (id = (select app.academy_id()) and (select app.acts_as('director')))
  with check (id = (select app.academy_id()) and (select app.acts_as('director')));
create policy academy_auth on academy for select to marram_auth using (true);
create policy academy_job on academy for select to marram_job using (true);
grant select on academy to marram_app, marram_auth, marram_job;
grant update (name, time_zone, own_account_age, safeguarding_contact) on academy to marram_app;

alter table person enable row level security;
alter table person force row level security;
create policy person_read on person for select to marram_app using (id in (select app.visible_people()));
create policy person_auth on person for select to marram_auth using (true);
create policy person_job on person for select to marram_job using (
  exists (select from membership m where m.person_id = person.id and m.academy_id = (select app.academy_id())));
grant select on person to marram_app, marram_auth, marram_job;

alter table person_contact enable row level security;
alter table person_contact force row level security;
create policy person_contact_read on person_contact for select to marram_app
  using (person_id = (select app.person_id()) and (select app.acts_as('director', 'strength_coach', 'swing_coach', 'guardian', 'athlete'))
    or ((select app.acts_as('director')) and person_id in (select app.visible_people())));
create policy person_contact_auth on person_contact for select to marram_auth using (true);
create policy person_contact_job on person_contact for select to marram_job using (
  exists (select from membership m where m.person_id = person_contact.person_id and m.academy_id = (select app.academy_id())));
grant select on person_contact to marram_app, marram_auth, marram_job;

alter table credential enable row level security;
alter table credential force row level security;
create policy credential_auth on credential for all to marram_auth using (true) with check (true);
grant select, insert, update on credential to marram_auth;

alter table session enable row level security;
alter table session force row level security;
create policy session_auth on session for all to marram_auth using (true) with check (true);
grant select, insert, update on session to marram_auth;

alter table attempt_limit enable row level security;
alter table attempt_limit force row level security;
create policy attempt_limit_auth on attempt_limit for all to marram_auth using (true) with check (true);
grant select, insert, update, delete on attempt_limit to marram_auth;

${closed('membership')}
create policy membership_read on membership for select to marram_app
  using (academy_id = (select app.academy_id()) and (
    (select app.acts_as('director'))
    or (person_id = (select app.person_id()) and (select app.acts_as('strength_coach', 'swing_coach', 'guardian', 'athlete')))));
create policy membership_add on membership for insert to marram_app
  with check (academy_id = (select app.academy_id()) and (select app.acts_as('director')));
create policy membership_change on membership for update to marram_app
  using (academy_id = (select app.academy_id()) and (select app.acts_as('director')))
  with check (academy_id = (select app.academy_id()) and (select app.acts_as('director')));
create policy membership_auth on membership for select to marram_auth using (true);
grant select, insert, update on membership to marram_app;
grant select on membership to marram_auth;

${closed('squad')}
create policy squad_read on squad for select to marram_app
  using (academy_id = (select app.academy_id()) and id in (select app.visible_squads()));
create policy squad_add on squad for insert to marram_app
  with check (academy_id = (select app.academy_id()) and (select app.acts_as('director')));
create policy squad_change on squad for update to marram_app
  using (academy_id = (select app.academy_id()) and (select app.acts_as('director')))
  with check (academy_id = (select app.academy_id()) and (select app.acts_as('director')));
grant select, insert, update on squad to marram_app;

${closed('squad_coach')}
create policy squad_coach_read on squad_coach for select to marram_app
  using (academy_id = (select app.academy_id()) and squad_id in (select app.visible_squads()));
create policy squad_coach_add on squad_coach for insert to marram_app
  with check (academy_id = (select app.academy_id()) and (select app.acts_as('director')));
create policy squad_coach_drop on squad_coach for delete to marram_app
  using (academy_id = (select app.academy_id()) and (select app.acts_as('director')));
grant select, insert, delete on squad_coach to marram_app;

${aboutProgramme('term', { readers: EVERYONE, writers: ['director'] })}

${closed('athlete')}
create policy athlete_read on athlete for select to marram_app
  using (academy_id = (select app.academy_id()) and id in (select app.visible_athletes()));
create policy athlete_add on athlete for insert to marram_app
  with check (academy_id = (select app.academy_id()) and (select app.acts_as('director')));
create policy athlete_change on athlete for update to marram_app
  using (academy_id = (select app.academy_id()) and (select app.acts_as('director')) and id in (select app.visible_athletes()))
  with check (academy_id = (select app.academy_id()) and (select app.acts_as('director')));
grant select, insert, update on athlete to marram_app;

${closed('guardianship')}
create policy guardianship_read on guardianship for select to marram_app
  using (academy_id = (select app.academy_id()) and (
    (select app.acts_as('director'))
    or (person_id = (select app.person_id()) and (select app.acts_as('guardian')))));
create policy guardianship_add on guardianship for insert to marram_app
  with check (academy_id = (select app.academy_id()) and (select app.acts_as('director')));
create policy guardianship_change on guardianship for update to marram_app
  using (academy_id = (select app.academy_id()) and (select app.acts_as('director')))
  with check (academy_id = (select app.academy_id()) and (select app.acts_as('director')));
grant select, insert, update on guardianship to marram_app;

${aboutAthletes('guardian_address', { readers: ['director'], writers: ['director'] })}
${aboutAthletes('handedness', { readers: EVERYONE, writers: STAFF })}
revoke update on handedness from marram_app;

alter table audit enable row level security;
alter table audit force row level security;
create policy audit_read on audit for select to marram_app
  using (academy_id = (select app.academy_id()) and (select app.acts_as('director')));
create policy audit_add on audit for insert to marram_app
  with check (academy_id = (select app.academy_id()) and actor_id = (select app.person_id()));
create policy audit_auth on audit for insert to marram_auth with check (true);
create policy audit_job on audit for insert to marram_job with check (academy_id = (select app.academy_id()));
grant select, insert on audit to marram_app;
grant insert on audit to marram_auth, marram_job;
`,
    )
    .execute(db);
}
