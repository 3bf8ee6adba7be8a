import { sql, type Kysely } from 'kysely';
import { aboutAthletes, aboutProgramme, closed, STAFF } from '#db/policies.ts';

const STRENGTH = ['director', 'strength_coach'] as const;

/** The coaches at work: who is expected on a day, notes, notices, requests to retest, mail, tokens, column mappings. */
export async function up(db: Kysely<unknown>): Promise<void> {
  await sql
    .raw(
      `
alter table trial add column note text not null default '' check (length(note) <= 500);
alter table curve add column trial_id uuid references trial;
alter table testing_day add column note text not null default '' check (length(note) <= 2000);

create table testing_day_athlete (
  academy_id uuid not null references academy,
  testing_day_id uuid not null references testing_day,
  athlete_id uuid not null references athlete,
  state text not null default 'expected' check (state in ('expected', 'absent')),
  note text not null default '' check (length(note) <= 500),
  version int not null default 1,
  primary key (testing_day_id, athlete_id)
);

create table retest_request (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  athlete_id uuid not null references athlete,
  asked_by uuid not null references person,
  asked_at timestamptz not null default now(),
  note text not null default '' check (length(note) <= 500),
  done_at timestamptz,
  done_by uuid references person
);
-- at most one open request to retest an athlete
create unique index retest_request_open on retest_request (athlete_id) where done_at is null;

create table notebook_entry (
  id uuid primary key,
  academy_id uuid not null references academy,
  athlete_id uuid not null references athlete,
  author_id uuid not null references person,
  body text not null check (length(body) between 1 and 4000),
  made_at timestamptz not null default clock_timestamp(),
  struck_at timestamptz,
  struck_by uuid references person
);
-- serves: the notebook of one athlete, newest first
create index notebook_entry_athlete on notebook_entry (athlete_id, made_at desc);

create table outrun_tick (
  academy_id uuid not null references academy,
  athlete_id uuid not null references athlete,
  outrun_id uuid not null references outrun,
  statement text not null check (length(statement) between 1 and 300),
  ticked_by uuid not null references person,
  ticked_at timestamptz not null default now(),
  primary key (outrun_id, statement)
);

create table notice (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  person_id uuid not null references person,
  kind text not null,
  text text not null check (length(text) between 1 and 300),
  link text not null check (link like '/%'),
  made_at timestamptz not null default clock_timestamp(),
  read_at timestamptz
);
-- serves: a person's unread notices, newest first
create index notice_person on notice (person_id, made_at desc) where read_at is null;

-- A message is written in the transaction that calls for it; a job sends it, one recipient a message.
create table outbox (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  kind text not null,
  -- a member of the academy, or for an invitation the address that was typed
  person_id uuid references person,
  address text,
  payload jsonb not null,
  -- the same key is the same message: asked for twice, sent once
  message_key text not null,
  state text not null default 'queued' check (state in ('queued', 'sending', 'sent', 'failed', 'unknown')),
  attempts int not null default 0,
  last_answer text,
  -- not tried again before
  not_before timestamptz not null default now(),
  claimed_at timestamptz,
  made_at timestamptz not null default now(),
  sent_at timestamptz,
  unique (academy_id, message_key),
  check ((person_id is null) <> (address is null))
);
-- serves: the job that sends what waits
create index outbox_waiting on outbox (academy_id, made_at) where state in ('queued', 'sending');

-- Invitations and password resets: only the hash is kept; showing the page uses nothing up, posting it does.
create table token (
  id uuid primary key default gen_random_uuid(),
  token_hash bytea not null unique check (length(token_hash) = 32),
  kind text not null check (kind in ('invite', 'reset')),
  academy_id uuid references academy,
  email text check (email = lower(email)),
  role role,
  person_id uuid references person,
  squad_ids uuid[] not null default '{}',
  athlete_ids uuid[] not null default '{}',
  made_by uuid references person,
  made_at timestamptz not null default now(),
  expires_at timestamptz not null,
  used_at timestamptz,
  revoked_at timestamptz,
  check (kind <> 'invite' or (academy_id is not null and email is not null and role is not null)),
  check (kind <> 'reset' or person_id is not null)
);
-- serves: the director's list of invitations that wait
create index token_invites on token (academy_id, made_at desc) where kind = 'invite' and used_at is null;

create table column_mapping (
  id uuid primary key default gen_random_uuid(),
  academy_id uuid not null references academy,
  name text not null check (length(name) between 1 and 80),
  kind text not null check (kind in ('driver', 'ground', 'curve')),
  -- the headings that it fits, and what each column is, in which unit
  mapping jsonb not null,
  made_by uuid references person,
  made_at timestamptz not null default now(),
  unique (academy_id, kind, name)
);

${aboutAthletes('testing_day_athlete', { readers: STAFF, writers: STRENGTH, deletes: true })}
${aboutAthletes('retest_request', { readers: STAFF, writers: STAFF })}
${aboutAthletes('notebook_entry', { readers: STAFF, writers: STAFF })}
${aboutAthletes('outrun_tick', { readers: STAFF, writers: STAFF, deletes: true })}
${aboutProgramme('column_mapping', { readers: STAFF, writers: STAFF })}

${closed('notice')}
create policy notice_read on notice for select to marram_app
  using (academy_id = (select app.academy_id()) and person_id = (select app.person_id())
    and (select app.acts_as('director', 'strength_coach', 'swing_coach', 'guardian', 'athlete')));
create policy notice_change on notice for update to marram_app
  using (academy_id = (select app.academy_id()) and person_id = (select app.person_id())
    and (select app.acts_as('director', 'strength_coach', 'swing_coach', 'guardian', 'athlete')));
create policy notice_add on notice for insert to marram_app
  with check (academy_id = (select app.academy_id()) and (select app.acts_as('director', 'strength_coach', 'swing_coach')));
grant select, insert on notice to marram_app;
grant update (read_at) on notice to marram_app;

${closed('outbox')}
create policy outbox_read on outbox for select to marram_app
  using (academy_id = (select app.academy_id()) and (select app.acts_as('director')));
create policy outbox_add on outbox for insert to marram_app
  with check (academy_id = (select app.academy_id()) and (select app.acts_as('director', 'strength_coach', 'swing_coach')));
grant select, insert on outbox to marram_app;
-- A password reset is asked for before there is a viewer.
create policy outbox_auth on outbox for insert to marram_auth with check (kind = 'reset');
grant insert on outbox to marram_auth;

alter table token enable row level security;
alter table token force row level security;
create policy token_read on token for select to marram_app
  using (kind = 'invite' and academy_id = (select app.academy_id()) and (select app.acts_as('director')));
create policy token_add on token for insert to marram_app
  with check (kind = 'invite' and academy_id = (select app.academy_id()) and (select app.acts_as('director')));
create policy token_revoke on token for update to marram_app
  using (kind = 'invite' and academy_id = (select app.academy_id()) and (select app.acts_as('director')))
  with check (kind = 'invite' and academy_id = (select app.academy_id()));
create policy token_auth on token for all to marram_auth using (true) with check (true);
grant select, insert on token to marram_app;
grant update (revoked_at) on token to marram_app;
grant select, insert, update on token to marram_auth;

-- Accepting an invitation makes the person, the contact, the membership and the links; there is no viewer yet.
create policy person_auth_add on person for insert to marram_auth with check (true);
create policy person_contact_auth_add on person_contact for insert to marram_auth with check (true);
create policy membership_auth_add on membership for insert to marram_auth with check (true);
create policy squad_coach_auth_add on squad_coach for insert to marram_auth with check (true);
create policy guardianship_auth_add on guardianship for insert to marram_auth with check (true);
grant insert on person, person_contact, membership, squad_coach, guardianship to marram_auth;
-- Someone who left and is invited again takes up the same membership and the same link.
create policy membership_auth_restart on membership for update to marram_auth using (true) with check (ended_at is null);
create policy guardianship_auth on guardianship for select to marram_auth using (true);
create policy guardianship_auth_restart on guardianship for update to marram_auth using (true) with check (ended_at is null);
grant update (ended_at) on membership, guardianship to marram_auth;
grant select on guardianship to marram_auth;
-- An athlete gets a sign-in of their own once.
create policy athlete_auth on athlete for select to marram_auth using (true);
create policy athlete_auth_sign_in on athlete for update to marram_auth
  using (person_id is null) with check (person_id is not null);
grant select (id, academy_id, person_id, given_name, family_name) on athlete to marram_auth;
grant update (person_id) on athlete to marram_auth;

create or replace function app.enqueue(task text, payload jsonb, job_key text) returns void language plpgsql security definer
  set search_path = pg_catalog, pg_temp
  as $$
  begin
    if task not in ('rejudgeOthers', 'sendMail') then
      raise exception 'enqueue requires a listed task, got %', task;
    end if;
    perform graphile_worker.add_job(task, payload::json, job_key => job_key, job_key_mode => 'replace');
  end
  $$;
grant execute on function app.enqueue(text, jsonb, text) to marram_auth;
`,
    )
    .execute(db);
}
