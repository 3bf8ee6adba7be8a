CREATE SCHEMA app;

CREATE SCHEMA public;

COMMENT ON SCHEMA public IS 'standard public schema';

CREATE TYPE public.role AS ENUM (
    'director',
    'strength_coach',
    'swing_coach',
    'guardian',
    'athlete'
);

CREATE TYPE public.sex AS ENUM (
    'female',
    'male'
);

CREATE TYPE public.side AS ENUM (
    'left',
    'right'
);

CREATE TYPE public.trial_state AS ENUM (
    'valid',
    'asked',
    'void'
);

CREATE FUNCTION app.academy_id() RETURNS uuid
    LANGUAGE sql STABLE
    AS $$ select nullif(current_setting('app.academy', true), '')::uuid $$;

CREATE FUNCTION app.acts_as(VARIADIC roles public.role[]) RETURNS boolean
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public', 'pg_temp'
    AS $$
    select app.role() = any (roles) and exists (
      select from membership m join person p on p.id = m.person_id
      where m.person_id = app.person_id() and m.academy_id = app.academy_id() and m.role = app.role()
        and m.ended_at is null and p.disabled_at is null)
  $$;

CREATE FUNCTION app.enqueue(task text, payload jsonb, job_key text) RETURNS void
    LANGUAGE plpgsql SECURITY DEFINER
    SET search_path TO 'pg_catalog', 'pg_temp'
    AS $$
  begin
    if task not in ('rejudgeOthers', 'sendMail') then
      raise exception 'enqueue requires a listed task, got %', task;
    end if;
    perform graphile_worker.add_job(task, payload::json, job_key => job_key, job_key_mode => 'replace');
  end
  $$;

CREATE FUNCTION app.person_id() RETURNS uuid
    LANGUAGE sql STABLE
    AS $$ select nullif(current_setting('app.person', true), '')::uuid $$;

CREATE FUNCTION app.programme_figures(except_athletes uuid[], as_of date) RETURNS TABLE(raw_gain_pct double precision, demand_ratio double precision, demand_rig text, lead_push_n double precision, club_speed_mps double precision)
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public', 'pg_temp'
    AS $_$
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
  $_$;

CREATE FUNCTION app.role() RETURNS public.role
    LANGUAGE sql STABLE
    AS $$ select nullif(current_setting('app.role', true), '')::role $$;

CREATE FUNCTION app.visible_athletes() RETURNS SETOF uuid
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public', 'pg_temp'
    AS $$
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

CREATE FUNCTION app.visible_people() RETURNS SETOF uuid
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public', 'pg_temp'
    AS $$
    select app.person_id() where app.acts_as('director', 'strength_coach', 'swing_coach', 'guardian', 'athlete')
    union
    select m.person_id from membership m
    where m.academy_id = app.academy_id()
      and app.acts_as('director', 'strength_coach', 'swing_coach', 'guardian', 'athlete')
      and (m.role in ('director', 'strength_coach', 'swing_coach') or app.acts_as('director'))
  $$;

CREATE FUNCTION app.visible_squads() RETURNS SETOF uuid
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public', 'pg_temp'
    AS $$
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

CREATE TABLE public.academy (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    name text NOT NULL,
    time_zone text DEFAULT 'Europe/London'::text NOT NULL,
    own_account_age integer DEFAULT 13 NOT NULL,
    safeguarding_contact text DEFAULT ''::text NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT academy_name_check CHECK (((length(name) >= 1) AND (length(name) <= 120))),
    CONSTRAINT academy_own_account_age_check CHECK (((own_account_age >= 10) AND (own_account_age <= 18)))
);

ALTER TABLE ONLY public.academy FORCE ROW LEVEL SECURITY;

CREATE TABLE public.athlete (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    squad_id uuid NOT NULL,
    person_id uuid,
    given_name text NOT NULL,
    family_name text NOT NULL,
    birth_date date NOT NULL,
    sex public.sex NOT NULL,
    joined_on date,
    left_on date,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT athlete_family_name_check CHECK (((length(family_name) >= 1) AND (length(family_name) <= 80))),
    CONSTRAINT athlete_given_name_check CHECK (((length(given_name) >= 1) AND (length(given_name) <= 80)))
);

ALTER TABLE ONLY public.athlete FORCE ROW LEVEL SECURITY;

CREATE TABLE public.attempt_limit (
    key text NOT NULL,
    points integer DEFAULT 0 NOT NULL,
    expire bigint
);

ALTER TABLE ONLY public.attempt_limit FORCE ROW LEVEL SECURITY;

CREATE TABLE public.audit (
    id bigint NOT NULL,
    academy_id uuid,
    at timestamp with time zone DEFAULT clock_timestamp() NOT NULL,
    actor_id uuid,
    actor_role public.role,
    action text NOT NULL,
    subject text NOT NULL,
    subject_id uuid,
    athlete_id uuid,
    change jsonb
);

ALTER TABLE ONLY public.audit FORCE ROW LEVEL SECURITY;

ALTER TABLE public.audit ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.audit_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.battery (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    name text NOT NULL
);

ALTER TABLE ONLY public.battery FORCE ROW LEVEL SECURITY;

CREATE TABLE public.battery_test (
    academy_id uuid NOT NULL,
    battery_id uuid NOT NULL,
    test_id uuid NOT NULL,
    "position" integer NOT NULL
);

ALTER TABLE ONLY public.battery_test FORCE ROW LEVEL SECURITY;

CREATE TABLE public.column_mapping (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    name text NOT NULL,
    kind text NOT NULL,
    mapping jsonb NOT NULL,
    made_by uuid,
    made_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT column_mapping_kind_check CHECK ((kind = ANY (ARRAY['driver'::text, 'ground'::text, 'curve'::text]))),
    CONSTRAINT column_mapping_name_check CHECK (((length(name) >= 1) AND (length(name) <= 80)))
);

ALTER TABLE ONLY public.column_mapping FORCE ROW LEVEL SECURITY;

CREATE TABLE public.credential (
    person_id uuid NOT NULL,
    password_hash text NOT NULL,
    changed_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT credential_password_hash_check CHECK ((password_hash ~~ '$argon2id$%'::text))
);

ALTER TABLE ONLY public.credential FORCE ROW LEVEL SECURITY;

CREATE TABLE public.curve (
    id uuid NOT NULL,
    academy_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    testing_day_id uuid,
    test_id uuid NOT NULL,
    side public.side NOT NULL,
    recorded_on date NOT NULL,
    device_id uuid,
    sample_rate_hz double precision NOT NULL,
    samples bytea NOT NULL,
    figures jsonb NOT NULL,
    quality_ok boolean NOT NULL,
    problems text[] DEFAULT '{}'::text[] NOT NULL,
    source_hash bytea NOT NULL,
    recorded_by uuid,
    recorded_at timestamp with time zone DEFAULT now() NOT NULL,
    trial_id uuid,
    CONSTRAINT curve_sample_rate_hz_check CHECK ((sample_rate_hz > (0)::double precision))
);

ALTER TABLE ONLY public.curve FORCE ROW LEVEL SECURITY;

CREATE TABLE public.device (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    name text NOT NULL
);

ALTER TABLE ONLY public.device FORCE ROW LEVEL SECURITY;

CREATE TABLE public.driver_session (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    held_on date NOT NULL,
    place text DEFAULT ''::text NOT NULL,
    temperature_c double precision,
    humidity_pct double precision,
    pressure_pa double precision,
    altitude_m double precision,
    wind_mps double precision,
    surface text DEFAULT ''::text NOT NULL,
    ball text DEFAULT ''::text NOT NULL,
    recorded_by uuid,
    recorded_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT driver_session_altitude_m_check CHECK (((altitude_m >= ('-450'::integer)::double precision) AND (altitude_m <= (5000)::double precision))),
    CONSTRAINT driver_session_humidity_pct_check CHECK (((humidity_pct >= (0)::double precision) AND (humidity_pct <= (100)::double precision))),
    CONSTRAINT driver_session_pressure_pa_check CHECK (((pressure_pa >= (50000)::double precision) AND (pressure_pa <= (110000)::double precision))),
    CONSTRAINT driver_session_temperature_c_check CHECK (((temperature_c >= ('-20'::integer)::double precision) AND (temperature_c <= (55)::double precision))),
    CONSTRAINT driver_session_wind_mps_check CHECK (((wind_mps >= ('-25'::integer)::double precision) AND (wind_mps <= (25)::double precision)))
);

ALTER TABLE ONLY public.driver_session FORCE ROW LEVEL SECURITY;

CREATE TABLE public.driver_session_athlete (
    academy_id uuid NOT NULL,
    driver_session_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    club_length_m double precision,
    club_loft_deg double precision
);

ALTER TABLE ONLY public.driver_session_athlete FORCE ROW LEVEL SECURITY;

CREATE TABLE public.ground_channel (
    academy_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    ground_trace_id uuid NOT NULL,
    side public.side NOT NULL,
    samples bytea NOT NULL
);

ALTER TABLE ONLY public.ground_channel FORCE ROW LEVEL SECURITY;

CREATE TABLE public.ground_trace (
    id uuid NOT NULL,
    academy_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    driver_session_id uuid,
    recorded_on date NOT NULL,
    swing_no integer NOT NULL,
    club text DEFAULT 'driver'::text NOT NULL,
    device_id uuid,
    measure text NOT NULL,
    sample_rate_hz double precision NOT NULL,
    events jsonb NOT NULL,
    figures jsonb NOT NULL,
    problems text[] DEFAULT '{}'::text[] NOT NULL,
    state text DEFAULT 'valid'::text NOT NULL,
    source_hash bytea NOT NULL,
    recorded_by uuid,
    recorded_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT ground_trace_measure_check CHECK ((measure = ANY (ARRAY['force'::text, 'pressure'::text]))),
    CONSTRAINT ground_trace_sample_rate_hz_check CHECK ((sample_rate_hz > (0)::double precision)),
    CONSTRAINT ground_trace_state_check CHECK ((state = ANY (ARRAY['valid'::text, 'void'::text])))
);

ALTER TABLE ONLY public.ground_trace FORCE ROW LEVEL SECURITY;

CREATE TABLE public.growth_measure (
    id uuid NOT NULL,
    academy_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    measured_on date NOT NULL,
    place text DEFAULT 'academy'::text NOT NULL,
    stature_m double precision,
    sitting_height_m double precision,
    mass_kg double precision,
    entered jsonb NOT NULL,
    state public.trial_state DEFAULT 'valid'::public.trial_state NOT NULL,
    asked_reason text,
    void_reason text,
    settled_by uuid,
    settled_at timestamp with time zone,
    version integer DEFAULT 1 NOT NULL,
    recorded_by uuid,
    recorded_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT growth_measure_check CHECK ((COALESCE(stature_m, sitting_height_m, mass_kg) IS NOT NULL)),
    CONSTRAINT growth_measure_check1 CHECK (((state <> 'asked'::public.trial_state) OR (asked_reason IS NOT NULL))),
    CONSTRAINT growth_measure_check2 CHECK (((state <> 'void'::public.trial_state) OR (void_reason IS NOT NULL))),
    CONSTRAINT growth_measure_mass_kg_check CHECK (((mass_kg >= (12)::double precision) AND (mass_kg <= (180)::double precision))),
    CONSTRAINT growth_measure_place_check CHECK ((place = ANY (ARRAY['academy'::text, 'home'::text]))),
    CONSTRAINT growth_measure_sitting_height_m_check CHECK (((sitting_height_m >= (0.4)::double precision) AND (sitting_height_m <= (1.3)::double precision))),
    CONSTRAINT growth_measure_stature_m_check CHECK (((stature_m >= (0.8)::double precision) AND (stature_m <= (2.3)::double precision)))
);

ALTER TABLE ONLY public.growth_measure FORCE ROW LEVEL SECURITY;

CREATE TABLE public.guardian_address (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    email text NOT NULL,
    invited_at timestamp with time zone,
    CONSTRAINT guardian_address_email_check CHECK ((email = lower(email)))
);

ALTER TABLE ONLY public.guardian_address FORCE ROW LEVEL SECURITY;

CREATE TABLE public.guardianship (
    academy_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    person_id uuid NOT NULL,
    started_at timestamp with time zone DEFAULT now() NOT NULL,
    ended_at timestamp with time zone
);

ALTER TABLE ONLY public.guardianship FORCE ROW LEVEL SECURITY;

CREATE TABLE public.handedness (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    plays public.side NOT NULL,
    recorded_at timestamp with time zone DEFAULT clock_timestamp() NOT NULL,
    recorded_by uuid,
    reason text DEFAULT ''::text NOT NULL
);

ALTER TABLE ONLY public.handedness FORCE ROW LEVEL SECURITY;

CREATE TABLE public.import_file (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    kind text NOT NULL,
    name text NOT NULL,
    sha256 bytea NOT NULL,
    rows_read integer NOT NULL,
    imported_by uuid,
    imported_at timestamp with time zone DEFAULT now() NOT NULL
);

ALTER TABLE ONLY public.import_file FORCE ROW LEVEL SECURITY;

CREATE TABLE public.judgement (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    as_of date NOT NULL,
    cause text NOT NULL,
    testing_day_id uuid,
    policy_version_id uuid NOT NULL,
    level text,
    points integer NOT NULL,
    raw_gain_pct double precision,
    demand_ratio double precision,
    demand_rig text,
    lead_push_n double precision,
    club_speed_mps double precision,
    programme jsonb NOT NULL,
    history jsonb NOT NULL,
    result jsonb NOT NULL,
    marks jsonb NOT NULL,
    made_at timestamp with time zone DEFAULT clock_timestamp() NOT NULL,
    CONSTRAINT judgement_level_check CHECK ((level = ANY (ARRAY['look'::text, 'act'::text])))
);

ALTER TABLE ONLY public.judgement FORCE ROW LEVEL SECURITY;

CREATE TABLE public.membership (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    person_id uuid NOT NULL,
    role public.role NOT NULL,
    started_at timestamp with time zone DEFAULT now() NOT NULL,
    ended_at timestamp with time zone
);

ALTER TABLE ONLY public.membership FORCE ROW LEVEL SECURITY;

CREATE TABLE public.notebook_entry (
    id uuid NOT NULL,
    academy_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    author_id uuid NOT NULL,
    body text NOT NULL,
    made_at timestamp with time zone DEFAULT clock_timestamp() NOT NULL,
    struck_at timestamp with time zone,
    struck_by uuid,
    CONSTRAINT notebook_entry_body_check CHECK (((length(body) >= 1) AND (length(body) <= 4000)))
);

ALTER TABLE ONLY public.notebook_entry FORCE ROW LEVEL SECURITY;

CREATE TABLE public.notice (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    person_id uuid NOT NULL,
    kind text NOT NULL,
    text text NOT NULL,
    link text NOT NULL,
    made_at timestamp with time zone DEFAULT clock_timestamp() NOT NULL,
    read_at timestamp with time zone,
    CONSTRAINT notice_link_check CHECK ((link ~~ '/%'::text)),
    CONSTRAINT notice_text_check CHECK (((length(text) >= 1) AND (length(text) <= 300)))
);

ALTER TABLE ONLY public.notice FORCE ROW LEVEL SECURITY;

CREATE TABLE public.outbox (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    kind text NOT NULL,
    person_id uuid,
    address text,
    payload jsonb NOT NULL,
    message_key text NOT NULL,
    state text DEFAULT 'queued'::text NOT NULL,
    attempts integer DEFAULT 0 NOT NULL,
    last_answer text,
    not_before timestamp with time zone DEFAULT now() NOT NULL,
    claimed_at timestamp with time zone,
    made_at timestamp with time zone DEFAULT now() NOT NULL,
    sent_at timestamp with time zone,
    CONSTRAINT outbox_check CHECK (((person_id IS NULL) <> (address IS NULL))),
    CONSTRAINT outbox_state_check CHECK ((state = ANY (ARRAY['queued'::text, 'sending'::text, 'sent'::text, 'failed'::text, 'unknown'::text])))
);

ALTER TABLE ONLY public.outbox FORCE ROW LEVEL SECURITY;

CREATE TABLE public.outrun (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    state text DEFAULT 'raised'::text NOT NULL,
    level text NOT NULL,
    level_judgement_id uuid NOT NULL,
    latest_judgement_id uuid NOT NULL,
    may_be_cleared boolean DEFAULT false NOT NULL,
    raised_on date NOT NULL,
    level_since date NOT NULL,
    route text,
    look_again_on date,
    closed_on date,
    close_reason text,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT outrun_check CHECK (((state <> ALL (ARRAY['cleared'::text, 'set aside'::text])) OR (closed_on IS NOT NULL))),
    CONSTRAINT outrun_check1 CHECK (((state <> 'in hand'::text) OR (route IS NOT NULL))),
    CONSTRAINT outrun_level_check CHECK ((level = ANY (ARRAY['look'::text, 'act'::text]))),
    CONSTRAINT outrun_route_check CHECK ((route = ANY (ARRAY['build'::text, 'hold'::text, 'club set-up'::text, 'ask a clinician'::text]))),
    CONSTRAINT outrun_state_check CHECK ((state = ANY (ARRAY['raised'::text, 'discussed'::text, 'in hand'::text, 'cleared'::text, 'set aside'::text])))
);

ALTER TABLE ONLY public.outrun FORCE ROW LEVEL SECURITY;

CREATE TABLE public.outrun_event (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    outrun_id uuid NOT NULL,
    kind text NOT NULL,
    happened_on date NOT NULL,
    level text,
    judgement_id uuid,
    actor_id uuid,
    text text DEFAULT ''::text NOT NULL,
    made_at timestamp with time zone DEFAULT clock_timestamp() NOT NULL,
    CONSTRAINT outrun_event_kind_check CHECK ((kind = ANY (ARRAY['raised'::text, 'level up'::text, 'level down'::text, 'no level'::text, 'discussed'::text, 'route'::text, 'may be cleared'::text, 'cleared'::text, 'set aside'::text]))),
    CONSTRAINT outrun_event_level_check CHECK ((level = ANY (ARRAY['look'::text, 'act'::text])))
);

ALTER TABLE ONLY public.outrun_event FORCE ROW LEVEL SECURITY;

CREATE TABLE public.outrun_note (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    outrun_id uuid NOT NULL,
    author_id uuid NOT NULL,
    body text NOT NULL,
    made_at timestamp with time zone DEFAULT clock_timestamp() NOT NULL,
    CONSTRAINT outrun_note_body_check CHECK (((length(body) >= 1) AND (length(body) <= 4000)))
);

ALTER TABLE ONLY public.outrun_note FORCE ROW LEVEL SECURITY;

CREATE TABLE public.outrun_tick (
    academy_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    outrun_id uuid NOT NULL,
    statement text NOT NULL,
    ticked_by uuid NOT NULL,
    ticked_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT outrun_tick_statement_check CHECK (((length(statement) >= 1) AND (length(statement) <= 300)))
);

ALTER TABLE ONLY public.outrun_tick FORCE ROW LEVEL SECURITY;

CREATE TABLE public.person (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    given_name text NOT NULL,
    family_name text NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    disabled_at timestamp with time zone,
    CONSTRAINT person_family_name_check CHECK (((length(family_name) >= 1) AND (length(family_name) <= 80))),
    CONSTRAINT person_given_name_check CHECK (((length(given_name) >= 1) AND (length(given_name) <= 80)))
);

ALTER TABLE ONLY public.person FORCE ROW LEVEL SECURITY;

CREATE TABLE public.person_contact (
    person_id uuid NOT NULL,
    email text,
    user_name text,
    CONSTRAINT person_contact_check CHECK (((email IS NOT NULL) OR (user_name IS NOT NULL))),
    CONSTRAINT person_contact_email_check CHECK (((email = lower(email)) AND (email ~ '^[^@[:space:]]+@[^@[:space:]]+$'::text))),
    CONSTRAINT person_contact_user_name_check CHECK ((user_name ~ '^[a-z0-9][a-z0-9._-]{2,39}$'::text))
);

ALTER TABLE ONLY public.person_contact FORCE ROW LEVEL SECURITY;

CREATE TABLE public.policy_version (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    version integer NOT NULL,
    rule_version text NOT NULL,
    thresholds jsonb NOT NULL,
    made_by uuid,
    made_at timestamp with time zone DEFAULT now() NOT NULL
);

ALTER TABLE ONLY public.policy_version FORCE ROW LEVEL SECURITY;

CREATE TABLE public.restriction (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    allowed text NOT NULL,
    set_by uuid NOT NULL,
    set_at timestamp with time zone DEFAULT now() NOT NULL,
    cleared_by uuid,
    cleared_at timestamp with time zone,
    CONSTRAINT restriction_allowed_check CHECK (((length(allowed) >= 1) AND (length(allowed) <= 500)))
);

ALTER TABLE ONLY public.restriction FORCE ROW LEVEL SECURITY;

CREATE TABLE public.retest_request (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    asked_by uuid NOT NULL,
    asked_at timestamp with time zone DEFAULT now() NOT NULL,
    note text DEFAULT ''::text NOT NULL,
    done_at timestamp with time zone,
    done_by uuid,
    CONSTRAINT retest_request_note_check CHECK ((length(note) <= 500))
);

ALTER TABLE ONLY public.retest_request FORCE ROW LEVEL SECURITY;

CREATE TABLE public.session (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    token_hash bytea NOT NULL,
    person_id uuid NOT NULL,
    membership_id uuid NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    last_seen_at timestamp with time zone DEFAULT now() NOT NULL,
    expires_at timestamp with time zone NOT NULL,
    revoked_at timestamp with time zone,
    CONSTRAINT session_token_hash_check CHECK ((length(token_hash) = 32))
);

ALTER TABLE ONLY public.session FORCE ROW LEVEL SECURITY;

CREATE TABLE public.shot (
    id uuid NOT NULL,
    academy_id uuid NOT NULL,
    driver_session_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    shot_no integer NOT NULL,
    club text NOT NULL,
    club_label text NOT NULL,
    club_speed_mps double precision,
    ball_speed_mps double precision,
    launch_deg double precision,
    spin_rpm double precision,
    attack_deg double precision,
    dynamic_loft_deg double precision,
    carry_m double precision NOT NULL,
    offline_m double precision,
    carry_standard_m double precision,
    state text DEFAULT 'counted'::text NOT NULL,
    exclusion_rule text,
    exclusion_reason text,
    settled_by uuid,
    settled_at timestamp with time zone,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT shot_carry_m_check CHECK (((carry_m >= (0)::double precision) AND (carry_m < (450)::double precision))),
    CONSTRAINT shot_check CHECK (((state <> 'excluded'::text) OR (exclusion_reason IS NOT NULL))),
    CONSTRAINT shot_club_check CHECK ((club = ANY (ARRAY['driver'::text, 'other'::text]))),
    CONSTRAINT shot_state_check CHECK ((state = ANY (ARRAY['counted'::text, 'excluded'::text, 'void'::text])))
);

ALTER TABLE ONLY public.shot FORCE ROW LEVEL SECURITY;

CREATE TABLE public.squad (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    name text NOT NULL,
    CONSTRAINT squad_name_check CHECK (((length(name) >= 1) AND (length(name) <= 60)))
);

ALTER TABLE ONLY public.squad FORCE ROW LEVEL SECURITY;

CREATE TABLE public.squad_coach (
    academy_id uuid NOT NULL,
    squad_id uuid NOT NULL,
    person_id uuid NOT NULL
);

ALTER TABLE ONLY public.squad_coach FORCE ROW LEVEL SECURITY;

CREATE TABLE public.term (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    name text NOT NULL,
    starts_on date NOT NULL,
    ends_on date NOT NULL,
    CONSTRAINT term_check CHECK ((ends_on >= starts_on))
);

ALTER TABLE ONLY public.term FORCE ROW LEVEL SECURITY;

CREATE TABLE public.test (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    key text NOT NULL,
    name text NOT NULL,
    quantity text NOT NULL,
    unit text NOT NULL,
    sided boolean NOT NULL,
    better text NOT NULL,
    compares_in text NOT NULL,
    attempts integer NOT NULL,
    uses text NOT NULL,
    rest_s integer DEFAULT 60 NOT NULL,
    lowest_si double precision NOT NULL,
    highest_si double precision NOT NULL,
    cv_pct double precision,
    noise_source text NOT NULL,
    protocol text NOT NULL,
    capacity text,
    first_medians_si double precision[],
    CONSTRAINT test_attempts_check CHECK (((attempts >= 1) AND (attempts <= 9))),
    CONSTRAINT test_better_check CHECK ((better = ANY (ARRAY['higher'::text, 'lower'::text]))),
    CONSTRAINT test_capacity_check CHECK ((capacity = ANY (ARRAY['push'::text, 'jump'::text, 'hop'::text]))),
    CONSTRAINT test_check CHECK ((highest_si > lowest_si)),
    CONSTRAINT test_compares_in_check CHECK ((compares_in = ANY (ARRAY['percent'::text, 'degrees'::text, 'none'::text]))),
    CONSTRAINT test_cv_pct_check CHECK ((cv_pct > (0)::double precision)),
    CONSTRAINT test_first_medians_si_check CHECK ((array_length(first_medians_si, 1) = 4)),
    CONSTRAINT test_quantity_check CHECK ((quantity = ANY (ARRAY['force'::text, 'length'::text, 'angle'::text, 'time'::text, 'count'::text, 'mass'::text, 'torque'::text]))),
    CONSTRAINT test_uses_check CHECK ((uses = ANY (ARRAY['mean'::text, 'best'::text])))
);

ALTER TABLE ONLY public.test FORCE ROW LEVEL SECURITY;

CREATE TABLE public.testing_day (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    academy_id uuid NOT NULL,
    squad_id uuid NOT NULL,
    battery_id uuid NOT NULL,
    held_on date NOT NULL,
    state text DEFAULT 'open'::text NOT NULL,
    closed_at timestamp with time zone,
    closed_by uuid,
    recorded_by uuid,
    note text DEFAULT ''::text NOT NULL,
    CONSTRAINT testing_day_note_check CHECK ((length(note) <= 2000)),
    CONSTRAINT testing_day_state_check CHECK ((state = ANY (ARRAY['open'::text, 'closed'::text])))
);

ALTER TABLE ONLY public.testing_day FORCE ROW LEVEL SECURITY;

CREATE TABLE public.testing_day_athlete (
    academy_id uuid NOT NULL,
    testing_day_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    state text DEFAULT 'expected'::text NOT NULL,
    note text DEFAULT ''::text NOT NULL,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT testing_day_athlete_note_check CHECK ((length(note) <= 500)),
    CONSTRAINT testing_day_athlete_state_check CHECK ((state = ANY (ARRAY['expected'::text, 'absent'::text])))
);

ALTER TABLE ONLY public.testing_day_athlete FORCE ROW LEVEL SECURITY;

CREATE TABLE public.token (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    token_hash bytea NOT NULL,
    kind text NOT NULL,
    academy_id uuid,
    email text,
    role public.role,
    person_id uuid,
    squad_ids uuid[] DEFAULT '{}'::uuid[] NOT NULL,
    athlete_ids uuid[] DEFAULT '{}'::uuid[] NOT NULL,
    made_by uuid,
    made_at timestamp with time zone DEFAULT now() NOT NULL,
    expires_at timestamp with time zone NOT NULL,
    used_at timestamp with time zone,
    revoked_at timestamp with time zone,
    CONSTRAINT token_check CHECK (((kind <> 'invite'::text) OR ((academy_id IS NOT NULL) AND (email IS NOT NULL) AND (role IS NOT NULL)))),
    CONSTRAINT token_check1 CHECK (((kind <> 'reset'::text) OR (person_id IS NOT NULL))),
    CONSTRAINT token_email_check CHECK ((email = lower(email))),
    CONSTRAINT token_kind_check CHECK ((kind = ANY (ARRAY['invite'::text, 'reset'::text]))),
    CONSTRAINT token_token_hash_check CHECK ((length(token_hash) = 32))
);

ALTER TABLE ONLY public.token FORCE ROW LEVEL SECURITY;

CREATE TABLE public.trial (
    id uuid NOT NULL,
    academy_id uuid NOT NULL,
    testing_day_id uuid NOT NULL,
    athlete_id uuid NOT NULL,
    test_id uuid NOT NULL,
    side public.side,
    attempt integer NOT NULL,
    value_si double precision NOT NULL,
    entered_value text NOT NULL,
    entered_unit text NOT NULL,
    state public.trial_state DEFAULT 'valid'::public.trial_state NOT NULL,
    asked_reason text,
    void_reason text,
    settled_by uuid,
    settled_at timestamp with time zone,
    version integer DEFAULT 1 NOT NULL,
    recorded_by uuid,
    recorded_at timestamp with time zone DEFAULT now() NOT NULL,
    origin text,
    note text DEFAULT ''::text NOT NULL,
    CONSTRAINT trial_attempt_check CHECK (((attempt >= 1) AND (attempt <= 9))),
    CONSTRAINT trial_check CHECK (((state <> 'asked'::public.trial_state) OR (asked_reason IS NOT NULL))),
    CONSTRAINT trial_check1 CHECK (((state <> 'void'::public.trial_state) OR (void_reason IS NOT NULL))),
    CONSTRAINT trial_note_check CHECK ((length(note) <= 500)),
    CONSTRAINT trial_value_si_check CHECK (((value_si >= (0)::double precision) AND (value_si < ('1000000'::numeric)::double precision)))
);

ALTER TABLE ONLY public.trial FORCE ROW LEVEL SECURITY;

ALTER TABLE ONLY public.academy
    ADD CONSTRAINT academy_name_key UNIQUE (name);

ALTER TABLE ONLY public.academy
    ADD CONSTRAINT academy_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.athlete
    ADD CONSTRAINT athlete_academy_id_person_id_key UNIQUE (academy_id, person_id);

ALTER TABLE ONLY public.athlete
    ADD CONSTRAINT athlete_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.attempt_limit
    ADD CONSTRAINT attempt_limit_pkey PRIMARY KEY (key);

ALTER TABLE ONLY public.audit
    ADD CONSTRAINT audit_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.battery
    ADD CONSTRAINT battery_academy_id_name_key UNIQUE (academy_id, name);

ALTER TABLE ONLY public.battery
    ADD CONSTRAINT battery_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.battery_test
    ADD CONSTRAINT battery_test_pkey PRIMARY KEY (battery_id, test_id);

ALTER TABLE ONLY public.column_mapping
    ADD CONSTRAINT column_mapping_academy_id_kind_name_key UNIQUE (academy_id, kind, name);

ALTER TABLE ONLY public.column_mapping
    ADD CONSTRAINT column_mapping_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.credential
    ADD CONSTRAINT credential_pkey PRIMARY KEY (person_id);

ALTER TABLE ONLY public.curve
    ADD CONSTRAINT curve_academy_id_source_hash_key UNIQUE (academy_id, source_hash);

ALTER TABLE ONLY public.curve
    ADD CONSTRAINT curve_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.device
    ADD CONSTRAINT device_academy_id_name_key UNIQUE (academy_id, name);

ALTER TABLE ONLY public.device
    ADD CONSTRAINT device_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.driver_session
    ADD CONSTRAINT driver_session_academy_id_held_on_place_key UNIQUE (academy_id, held_on, place);

ALTER TABLE ONLY public.driver_session_athlete
    ADD CONSTRAINT driver_session_athlete_pkey PRIMARY KEY (driver_session_id, athlete_id);

ALTER TABLE ONLY public.driver_session
    ADD CONSTRAINT driver_session_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.ground_channel
    ADD CONSTRAINT ground_channel_pkey PRIMARY KEY (ground_trace_id, side);

ALTER TABLE ONLY public.ground_trace
    ADD CONSTRAINT ground_trace_academy_id_source_hash_key UNIQUE (academy_id, source_hash);

ALTER TABLE ONLY public.ground_trace
    ADD CONSTRAINT ground_trace_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.growth_measure
    ADD CONSTRAINT growth_measure_athlete_id_measured_on_place_key UNIQUE (athlete_id, measured_on, place);

ALTER TABLE ONLY public.growth_measure
    ADD CONSTRAINT growth_measure_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.guardian_address
    ADD CONSTRAINT guardian_address_athlete_id_email_key UNIQUE (athlete_id, email);

ALTER TABLE ONLY public.guardian_address
    ADD CONSTRAINT guardian_address_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.guardianship
    ADD CONSTRAINT guardianship_pkey PRIMARY KEY (athlete_id, person_id);

ALTER TABLE ONLY public.handedness
    ADD CONSTRAINT handedness_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.import_file
    ADD CONSTRAINT import_file_academy_id_sha256_key UNIQUE (academy_id, sha256);

ALTER TABLE ONLY public.import_file
    ADD CONSTRAINT import_file_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.judgement
    ADD CONSTRAINT judgement_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.membership
    ADD CONSTRAINT membership_academy_id_person_id_role_key UNIQUE (academy_id, person_id, role);

ALTER TABLE ONLY public.membership
    ADD CONSTRAINT membership_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.notebook_entry
    ADD CONSTRAINT notebook_entry_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.notice
    ADD CONSTRAINT notice_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.outbox
    ADD CONSTRAINT outbox_academy_id_message_key_key UNIQUE (academy_id, message_key);

ALTER TABLE ONLY public.outbox
    ADD CONSTRAINT outbox_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.outrun_event
    ADD CONSTRAINT outrun_event_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.outrun_note
    ADD CONSTRAINT outrun_note_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.outrun
    ADD CONSTRAINT outrun_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.outrun_tick
    ADD CONSTRAINT outrun_tick_pkey PRIMARY KEY (outrun_id, statement);

ALTER TABLE ONLY public.person_contact
    ADD CONSTRAINT person_contact_email_key UNIQUE (email);

ALTER TABLE ONLY public.person_contact
    ADD CONSTRAINT person_contact_pkey PRIMARY KEY (person_id);

ALTER TABLE ONLY public.person_contact
    ADD CONSTRAINT person_contact_user_name_key UNIQUE (user_name);

ALTER TABLE ONLY public.person
    ADD CONSTRAINT person_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.policy_version
    ADD CONSTRAINT policy_version_academy_id_version_key UNIQUE (academy_id, version);

ALTER TABLE ONLY public.policy_version
    ADD CONSTRAINT policy_version_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.restriction
    ADD CONSTRAINT restriction_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.retest_request
    ADD CONSTRAINT retest_request_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.session
    ADD CONSTRAINT session_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.session
    ADD CONSTRAINT session_token_hash_key UNIQUE (token_hash);

ALTER TABLE ONLY public.shot
    ADD CONSTRAINT shot_driver_session_id_athlete_id_shot_no_key UNIQUE (driver_session_id, athlete_id, shot_no);

ALTER TABLE ONLY public.shot
    ADD CONSTRAINT shot_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.squad
    ADD CONSTRAINT squad_academy_id_name_key UNIQUE (academy_id, name);

ALTER TABLE ONLY public.squad_coach
    ADD CONSTRAINT squad_coach_pkey PRIMARY KEY (squad_id, person_id);

ALTER TABLE ONLY public.squad
    ADD CONSTRAINT squad_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.term
    ADD CONSTRAINT term_academy_id_starts_on_key UNIQUE (academy_id, starts_on);

ALTER TABLE ONLY public.term
    ADD CONSTRAINT term_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.test
    ADD CONSTRAINT test_academy_id_key_key UNIQUE (academy_id, key);

ALTER TABLE ONLY public.test
    ADD CONSTRAINT test_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.testing_day_athlete
    ADD CONSTRAINT testing_day_athlete_pkey PRIMARY KEY (testing_day_id, athlete_id);

ALTER TABLE ONLY public.testing_day
    ADD CONSTRAINT testing_day_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.testing_day
    ADD CONSTRAINT testing_day_squad_id_battery_id_held_on_key UNIQUE (squad_id, battery_id, held_on);

ALTER TABLE ONLY public.token
    ADD CONSTRAINT token_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.token
    ADD CONSTRAINT token_token_hash_key UNIQUE (token_hash);

ALTER TABLE ONLY public.trial
    ADD CONSTRAINT trial_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.trial
    ADD CONSTRAINT trial_testing_day_id_athlete_id_test_id_side_attempt_key UNIQUE NULLS NOT DISTINCT (testing_day_id, athlete_id, test_id, side, attempt);

CREATE INDEX athlete_squad ON public.athlete USING btree (academy_id, squad_id, family_name, given_name);

CREATE INDEX audit_academy ON public.audit USING btree (academy_id, at DESC);

CREATE INDEX curve_athlete ON public.curve USING btree (athlete_id, recorded_on DESC);

CREATE INDEX driver_session_athlete_athlete ON public.driver_session_athlete USING btree (athlete_id);

CREATE INDEX ground_trace_athlete ON public.ground_trace USING btree (athlete_id, recorded_on DESC, swing_no);

CREATE INDEX guardianship_person ON public.guardianship USING btree (person_id, academy_id) WHERE (ended_at IS NULL);

CREATE INDEX handedness_athlete ON public.handedness USING btree (athlete_id, recorded_at DESC);

CREATE INDEX judgement_athlete ON public.judgement USING btree (athlete_id, made_at DESC);

CREATE INDEX membership_person ON public.membership USING btree (person_id) WHERE (ended_at IS NULL);

CREATE INDEX notebook_entry_athlete ON public.notebook_entry USING btree (athlete_id, made_at DESC);

CREATE INDEX notice_person ON public.notice USING btree (person_id, made_at DESC) WHERE (read_at IS NULL);

CREATE INDEX outbox_waiting ON public.outbox USING btree (academy_id, made_at) WHERE (state = ANY (ARRAY['queued'::text, 'sending'::text]));

CREATE INDEX outrun_academy ON public.outrun USING btree (academy_id, state, raised_on DESC);

CREATE INDEX outrun_event_outrun ON public.outrun_event USING btree (outrun_id, made_at);

CREATE INDEX outrun_note_outrun ON public.outrun_note USING btree (outrun_id, made_at);

CREATE UNIQUE INDEX outrun_open ON public.outrun USING btree (athlete_id) WHERE (state = ANY (ARRAY['raised'::text, 'discussed'::text, 'in hand'::text]));

CREATE INDEX restriction_athlete ON public.restriction USING btree (athlete_id) WHERE (cleared_at IS NULL);

CREATE UNIQUE INDEX retest_request_open ON public.retest_request USING btree (athlete_id) WHERE (done_at IS NULL);

CREATE INDEX session_person ON public.session USING btree (person_id) WHERE (revoked_at IS NULL);

CREATE INDEX shot_athlete ON public.shot USING btree (athlete_id, driver_session_id) WHERE (club = 'driver'::text);

CREATE INDEX squad_coach_person ON public.squad_coach USING btree (person_id, academy_id);

CREATE INDEX testing_day_held ON public.testing_day USING btree (academy_id, held_on DESC);

CREATE INDEX token_invites ON public.token USING btree (academy_id, made_at DESC) WHERE ((kind = 'invite'::text) AND (used_at IS NULL));

CREATE INDEX trial_asked ON public.trial USING btree (academy_id, athlete_id) WHERE (state = 'asked'::public.trial_state);

CREATE INDEX trial_athlete ON public.trial USING btree (athlete_id, test_id, testing_day_id);

ALTER TABLE ONLY public.athlete
    ADD CONSTRAINT athlete_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.athlete
    ADD CONSTRAINT athlete_person_id_fkey FOREIGN KEY (person_id) REFERENCES public.person(id);

ALTER TABLE ONLY public.athlete
    ADD CONSTRAINT athlete_squad_id_fkey FOREIGN KEY (squad_id) REFERENCES public.squad(id);

ALTER TABLE ONLY public.audit
    ADD CONSTRAINT audit_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.battery
    ADD CONSTRAINT battery_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.battery_test
    ADD CONSTRAINT battery_test_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.battery_test
    ADD CONSTRAINT battery_test_battery_id_fkey FOREIGN KEY (battery_id) REFERENCES public.battery(id);

ALTER TABLE ONLY public.battery_test
    ADD CONSTRAINT battery_test_test_id_fkey FOREIGN KEY (test_id) REFERENCES public.test(id);

ALTER TABLE ONLY public.column_mapping
    ADD CONSTRAINT column_mapping_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.column_mapping
    ADD CONSTRAINT column_mapping_made_by_fkey FOREIGN KEY (made_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.credential
    ADD CONSTRAINT credential_person_id_fkey FOREIGN KEY (person_id) REFERENCES public.person(id);

ALTER TABLE ONLY public.curve
    ADD CONSTRAINT curve_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.curve
    ADD CONSTRAINT curve_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.curve
    ADD CONSTRAINT curve_device_id_fkey FOREIGN KEY (device_id) REFERENCES public.device(id);

ALTER TABLE ONLY public.curve
    ADD CONSTRAINT curve_recorded_by_fkey FOREIGN KEY (recorded_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.curve
    ADD CONSTRAINT curve_test_id_fkey FOREIGN KEY (test_id) REFERENCES public.test(id);

ALTER TABLE ONLY public.curve
    ADD CONSTRAINT curve_testing_day_id_fkey FOREIGN KEY (testing_day_id) REFERENCES public.testing_day(id);

ALTER TABLE ONLY public.curve
    ADD CONSTRAINT curve_trial_id_fkey FOREIGN KEY (trial_id) REFERENCES public.trial(id);

ALTER TABLE ONLY public.device
    ADD CONSTRAINT device_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.driver_session
    ADD CONSTRAINT driver_session_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.driver_session_athlete
    ADD CONSTRAINT driver_session_athlete_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.driver_session_athlete
    ADD CONSTRAINT driver_session_athlete_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.driver_session_athlete
    ADD CONSTRAINT driver_session_athlete_driver_session_id_fkey FOREIGN KEY (driver_session_id) REFERENCES public.driver_session(id);

ALTER TABLE ONLY public.driver_session
    ADD CONSTRAINT driver_session_recorded_by_fkey FOREIGN KEY (recorded_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.ground_channel
    ADD CONSTRAINT ground_channel_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.ground_channel
    ADD CONSTRAINT ground_channel_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.ground_channel
    ADD CONSTRAINT ground_channel_ground_trace_id_fkey FOREIGN KEY (ground_trace_id) REFERENCES public.ground_trace(id);

ALTER TABLE ONLY public.ground_trace
    ADD CONSTRAINT ground_trace_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.ground_trace
    ADD CONSTRAINT ground_trace_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.ground_trace
    ADD CONSTRAINT ground_trace_device_id_fkey FOREIGN KEY (device_id) REFERENCES public.device(id);

ALTER TABLE ONLY public.ground_trace
    ADD CONSTRAINT ground_trace_driver_session_id_fkey FOREIGN KEY (driver_session_id) REFERENCES public.driver_session(id);

ALTER TABLE ONLY public.ground_trace
    ADD CONSTRAINT ground_trace_recorded_by_fkey FOREIGN KEY (recorded_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.growth_measure
    ADD CONSTRAINT growth_measure_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.growth_measure
    ADD CONSTRAINT growth_measure_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.growth_measure
    ADD CONSTRAINT growth_measure_recorded_by_fkey FOREIGN KEY (recorded_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.growth_measure
    ADD CONSTRAINT growth_measure_settled_by_fkey FOREIGN KEY (settled_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.guardian_address
    ADD CONSTRAINT guardian_address_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.guardian_address
    ADD CONSTRAINT guardian_address_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.guardianship
    ADD CONSTRAINT guardianship_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.guardianship
    ADD CONSTRAINT guardianship_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.guardianship
    ADD CONSTRAINT guardianship_person_id_fkey FOREIGN KEY (person_id) REFERENCES public.person(id);

ALTER TABLE ONLY public.handedness
    ADD CONSTRAINT handedness_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.handedness
    ADD CONSTRAINT handedness_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.handedness
    ADD CONSTRAINT handedness_recorded_by_fkey FOREIGN KEY (recorded_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.import_file
    ADD CONSTRAINT import_file_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.import_file
    ADD CONSTRAINT import_file_imported_by_fkey FOREIGN KEY (imported_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.judgement
    ADD CONSTRAINT judgement_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.judgement
    ADD CONSTRAINT judgement_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.judgement
    ADD CONSTRAINT judgement_policy_version_id_fkey FOREIGN KEY (policy_version_id) REFERENCES public.policy_version(id);

ALTER TABLE ONLY public.judgement
    ADD CONSTRAINT judgement_testing_day_id_fkey FOREIGN KEY (testing_day_id) REFERENCES public.testing_day(id);

ALTER TABLE ONLY public.membership
    ADD CONSTRAINT membership_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.membership
    ADD CONSTRAINT membership_person_id_fkey FOREIGN KEY (person_id) REFERENCES public.person(id);

ALTER TABLE ONLY public.notebook_entry
    ADD CONSTRAINT notebook_entry_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.notebook_entry
    ADD CONSTRAINT notebook_entry_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.notebook_entry
    ADD CONSTRAINT notebook_entry_author_id_fkey FOREIGN KEY (author_id) REFERENCES public.person(id);

ALTER TABLE ONLY public.notebook_entry
    ADD CONSTRAINT notebook_entry_struck_by_fkey FOREIGN KEY (struck_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.notice
    ADD CONSTRAINT notice_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.notice
    ADD CONSTRAINT notice_person_id_fkey FOREIGN KEY (person_id) REFERENCES public.person(id);

ALTER TABLE ONLY public.outbox
    ADD CONSTRAINT outbox_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.outbox
    ADD CONSTRAINT outbox_person_id_fkey FOREIGN KEY (person_id) REFERENCES public.person(id);

ALTER TABLE ONLY public.outrun
    ADD CONSTRAINT outrun_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.outrun
    ADD CONSTRAINT outrun_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.outrun_event
    ADD CONSTRAINT outrun_event_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.outrun_event
    ADD CONSTRAINT outrun_event_actor_id_fkey FOREIGN KEY (actor_id) REFERENCES public.person(id);

ALTER TABLE ONLY public.outrun_event
    ADD CONSTRAINT outrun_event_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.outrun_event
    ADD CONSTRAINT outrun_event_judgement_id_fkey FOREIGN KEY (judgement_id) REFERENCES public.judgement(id);

ALTER TABLE ONLY public.outrun_event
    ADD CONSTRAINT outrun_event_outrun_id_fkey FOREIGN KEY (outrun_id) REFERENCES public.outrun(id);

ALTER TABLE ONLY public.outrun
    ADD CONSTRAINT outrun_latest_judgement_id_fkey FOREIGN KEY (latest_judgement_id) REFERENCES public.judgement(id);

ALTER TABLE ONLY public.outrun
    ADD CONSTRAINT outrun_level_judgement_id_fkey FOREIGN KEY (level_judgement_id) REFERENCES public.judgement(id);

ALTER TABLE ONLY public.outrun_note
    ADD CONSTRAINT outrun_note_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.outrun_note
    ADD CONSTRAINT outrun_note_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.outrun_note
    ADD CONSTRAINT outrun_note_author_id_fkey FOREIGN KEY (author_id) REFERENCES public.person(id);

ALTER TABLE ONLY public.outrun_note
    ADD CONSTRAINT outrun_note_outrun_id_fkey FOREIGN KEY (outrun_id) REFERENCES public.outrun(id);

ALTER TABLE ONLY public.outrun_tick
    ADD CONSTRAINT outrun_tick_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.outrun_tick
    ADD CONSTRAINT outrun_tick_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.outrun_tick
    ADD CONSTRAINT outrun_tick_outrun_id_fkey FOREIGN KEY (outrun_id) REFERENCES public.outrun(id);

ALTER TABLE ONLY public.outrun_tick
    ADD CONSTRAINT outrun_tick_ticked_by_fkey FOREIGN KEY (ticked_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.person_contact
    ADD CONSTRAINT person_contact_person_id_fkey FOREIGN KEY (person_id) REFERENCES public.person(id);

ALTER TABLE ONLY public.policy_version
    ADD CONSTRAINT policy_version_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.policy_version
    ADD CONSTRAINT policy_version_made_by_fkey FOREIGN KEY (made_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.restriction
    ADD CONSTRAINT restriction_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.restriction
    ADD CONSTRAINT restriction_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.restriction
    ADD CONSTRAINT restriction_cleared_by_fkey FOREIGN KEY (cleared_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.restriction
    ADD CONSTRAINT restriction_set_by_fkey FOREIGN KEY (set_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.retest_request
    ADD CONSTRAINT retest_request_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.retest_request
    ADD CONSTRAINT retest_request_asked_by_fkey FOREIGN KEY (asked_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.retest_request
    ADD CONSTRAINT retest_request_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.retest_request
    ADD CONSTRAINT retest_request_done_by_fkey FOREIGN KEY (done_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.session
    ADD CONSTRAINT session_membership_id_fkey FOREIGN KEY (membership_id) REFERENCES public.membership(id);

ALTER TABLE ONLY public.session
    ADD CONSTRAINT session_person_id_fkey FOREIGN KEY (person_id) REFERENCES public.person(id);

ALTER TABLE ONLY public.shot
    ADD CONSTRAINT shot_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.shot
    ADD CONSTRAINT shot_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.shot
    ADD CONSTRAINT shot_driver_session_id_fkey FOREIGN KEY (driver_session_id) REFERENCES public.driver_session(id);

ALTER TABLE ONLY public.shot
    ADD CONSTRAINT shot_settled_by_fkey FOREIGN KEY (settled_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.squad
    ADD CONSTRAINT squad_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.squad_coach
    ADD CONSTRAINT squad_coach_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.squad_coach
    ADD CONSTRAINT squad_coach_person_id_fkey FOREIGN KEY (person_id) REFERENCES public.person(id);

ALTER TABLE ONLY public.squad_coach
    ADD CONSTRAINT squad_coach_squad_id_fkey FOREIGN KEY (squad_id) REFERENCES public.squad(id);

ALTER TABLE ONLY public.term
    ADD CONSTRAINT term_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.test
    ADD CONSTRAINT test_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.testing_day
    ADD CONSTRAINT testing_day_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.testing_day_athlete
    ADD CONSTRAINT testing_day_athlete_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.testing_day_athlete
    ADD CONSTRAINT testing_day_athlete_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.testing_day_athlete
    ADD CONSTRAINT testing_day_athlete_testing_day_id_fkey FOREIGN KEY (testing_day_id) REFERENCES public.testing_day(id);

ALTER TABLE ONLY public.testing_day
    ADD CONSTRAINT testing_day_battery_id_fkey FOREIGN KEY (battery_id) REFERENCES public.battery(id);

ALTER TABLE ONLY public.testing_day
    ADD CONSTRAINT testing_day_closed_by_fkey FOREIGN KEY (closed_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.testing_day
    ADD CONSTRAINT testing_day_recorded_by_fkey FOREIGN KEY (recorded_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.testing_day
    ADD CONSTRAINT testing_day_squad_id_fkey FOREIGN KEY (squad_id) REFERENCES public.squad(id);

ALTER TABLE ONLY public.token
    ADD CONSTRAINT token_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.token
    ADD CONSTRAINT token_made_by_fkey FOREIGN KEY (made_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.token
    ADD CONSTRAINT token_person_id_fkey FOREIGN KEY (person_id) REFERENCES public.person(id);

ALTER TABLE ONLY public.trial
    ADD CONSTRAINT trial_academy_id_fkey FOREIGN KEY (academy_id) REFERENCES public.academy(id);

ALTER TABLE ONLY public.trial
    ADD CONSTRAINT trial_athlete_id_fkey FOREIGN KEY (athlete_id) REFERENCES public.athlete(id);

ALTER TABLE ONLY public.trial
    ADD CONSTRAINT trial_recorded_by_fkey FOREIGN KEY (recorded_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.trial
    ADD CONSTRAINT trial_settled_by_fkey FOREIGN KEY (settled_by) REFERENCES public.person(id);

ALTER TABLE ONLY public.trial
    ADD CONSTRAINT trial_test_id_fkey FOREIGN KEY (test_id) REFERENCES public.test(id);

ALTER TABLE ONLY public.trial
    ADD CONSTRAINT trial_testing_day_id_fkey FOREIGN KEY (testing_day_id) REFERENCES public.testing_day(id);

ALTER TABLE public.academy ENABLE ROW LEVEL SECURITY;

CREATE POLICY academy_auth ON public.academy FOR SELECT TO marram_auth USING (true);

CREATE POLICY academy_change ON public.academy FOR UPDATE TO marram_app USING (((id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as))) WITH CHECK (((id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY academy_job ON public.academy FOR SELECT TO marram_job USING (true);

CREATE POLICY academy_read ON public.academy FOR SELECT TO marram_app USING (((id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as)));

ALTER TABLE public.athlete ENABLE ROW LEVEL SECURITY;

CREATE POLICY athlete_add ON public.athlete FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY athlete_auth ON public.athlete FOR SELECT TO marram_auth USING (true);

CREATE POLICY athlete_auth_sign_in ON public.athlete FOR UPDATE TO marram_auth USING ((person_id IS NULL)) WITH CHECK ((person_id IS NOT NULL));

CREATE POLICY athlete_change ON public.athlete FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as) AND (id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY athlete_job ON public.athlete TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY athlete_read ON public.athlete FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND (id IN ( SELECT app.visible_athletes() AS visible_athletes))));

ALTER TABLE public.attempt_limit ENABLE ROW LEVEL SECURITY;

CREATE POLICY attempt_limit_auth ON public.attempt_limit TO marram_auth USING (true) WITH CHECK (true);

ALTER TABLE public.audit ENABLE ROW LEVEL SECURITY;

CREATE POLICY audit_add ON public.audit FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND (actor_id = ( SELECT app.person_id() AS person_id))));

CREATE POLICY audit_auth ON public.audit FOR INSERT TO marram_auth WITH CHECK (true);

CREATE POLICY audit_job ON public.audit FOR INSERT TO marram_job WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY audit_read ON public.audit FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

ALTER TABLE public.battery ENABLE ROW LEVEL SECURITY;

CREATE POLICY battery_add ON public.battery FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY battery_change ON public.battery FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY battery_job ON public.battery TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY battery_read ON public.battery FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as)));

ALTER TABLE public.battery_test ENABLE ROW LEVEL SECURITY;

CREATE POLICY battery_test_add ON public.battery_test FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY battery_test_change ON public.battery_test FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY battery_test_job ON public.battery_test TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY battery_test_read ON public.battery_test FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as)));

ALTER TABLE public.column_mapping ENABLE ROW LEVEL SECURITY;

CREATE POLICY column_mapping_add ON public.column_mapping FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as)));

CREATE POLICY column_mapping_change ON public.column_mapping FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as)));

CREATE POLICY column_mapping_job ON public.column_mapping TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY column_mapping_read ON public.column_mapping FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as)));

ALTER TABLE public.credential ENABLE ROW LEVEL SECURITY;

CREATE POLICY credential_auth ON public.credential TO marram_auth USING (true) WITH CHECK (true);

ALTER TABLE public.curve ENABLE ROW LEVEL SECURITY;

CREATE POLICY curve_add ON public.curve FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY curve_change ON public.curve FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY curve_job ON public.curve TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY curve_read ON public.curve FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

ALTER TABLE public.device ENABLE ROW LEVEL SECURITY;

CREATE POLICY device_add ON public.device FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as)));

CREATE POLICY device_change ON public.device FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as)));

CREATE POLICY device_job ON public.device TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY device_read ON public.device FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as)));

ALTER TABLE public.driver_session ENABLE ROW LEVEL SECURITY;

CREATE POLICY driver_session_add ON public.driver_session FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (recorded_by = ( SELECT app.person_id() AS person_id))));

ALTER TABLE public.driver_session_athlete ENABLE ROW LEVEL SECURITY;

CREATE POLICY driver_session_athlete_add ON public.driver_session_athlete FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY driver_session_athlete_change ON public.driver_session_athlete FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY driver_session_athlete_job ON public.driver_session_athlete TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY driver_session_athlete_read ON public.driver_session_athlete FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY driver_session_change ON public.driver_session FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'swing_coach'::public.role]) AS acts_as))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'swing_coach'::public.role]) AS acts_as)));

CREATE POLICY driver_session_job ON public.driver_session TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY driver_session_read ON public.driver_session FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND (( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as) OR ((recorded_by = ( SELECT app.person_id() AS person_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['swing_coach'::public.role]) AS acts_as)) OR (id IN ( SELECT s.driver_session_id
   FROM public.driver_session_athlete s)))));

ALTER TABLE public.ground_channel ENABLE ROW LEVEL SECURITY;

CREATE POLICY ground_channel_add ON public.ground_channel FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY ground_channel_change ON public.ground_channel FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY ground_channel_job ON public.ground_channel TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY ground_channel_read ON public.ground_channel FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

ALTER TABLE public.ground_trace ENABLE ROW LEVEL SECURITY;

CREATE POLICY ground_trace_add ON public.ground_trace FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY ground_trace_change ON public.ground_trace FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY ground_trace_job ON public.ground_trace TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY ground_trace_read ON public.ground_trace FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

ALTER TABLE public.growth_measure ENABLE ROW LEVEL SECURITY;

CREATE POLICY growth_measure_add ON public.growth_measure FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'guardian'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY growth_measure_change ON public.growth_measure FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'guardian'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'guardian'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY growth_measure_home ON public.growth_measure AS RESTRICTIVE FOR INSERT TO marram_app WITH CHECK (((place = 'home'::text) OR (NOT ( SELECT app.acts_as(VARIADIC ARRAY['guardian'::public.role]) AS acts_as))));

CREATE POLICY growth_measure_home_change ON public.growth_measure AS RESTRICTIVE FOR UPDATE TO marram_app USING (((place = 'home'::text) OR (NOT ( SELECT app.acts_as(VARIADIC ARRAY['guardian'::public.role]) AS acts_as))));

CREATE POLICY growth_measure_job ON public.growth_measure TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY growth_measure_read ON public.growth_measure FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

ALTER TABLE public.guardian_address ENABLE ROW LEVEL SECURITY;

CREATE POLICY guardian_address_add ON public.guardian_address FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY guardian_address_change ON public.guardian_address FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY guardian_address_job ON public.guardian_address TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY guardian_address_read ON public.guardian_address FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

ALTER TABLE public.guardianship ENABLE ROW LEVEL SECURITY;

CREATE POLICY guardianship_add ON public.guardianship FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY guardianship_auth ON public.guardianship FOR SELECT TO marram_auth USING (true);

CREATE POLICY guardianship_auth_add ON public.guardianship FOR INSERT TO marram_auth WITH CHECK (true);

CREATE POLICY guardianship_auth_restart ON public.guardianship FOR UPDATE TO marram_auth USING (true) WITH CHECK ((ended_at IS NULL));

CREATE POLICY guardianship_change ON public.guardianship FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY guardianship_job ON public.guardianship TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY guardianship_read ON public.guardianship FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND (( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as) OR ((person_id = ( SELECT app.person_id() AS person_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['guardian'::public.role]) AS acts_as)))));

ALTER TABLE public.handedness ENABLE ROW LEVEL SECURITY;

CREATE POLICY handedness_add ON public.handedness FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY handedness_change ON public.handedness FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY handedness_job ON public.handedness TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY handedness_read ON public.handedness FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

ALTER TABLE public.import_file ENABLE ROW LEVEL SECURITY;

CREATE POLICY import_file_add ON public.import_file FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as)));

CREATE POLICY import_file_change ON public.import_file FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as)));

CREATE POLICY import_file_job ON public.import_file TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY import_file_read ON public.import_file FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as)));

ALTER TABLE public.judgement ENABLE ROW LEVEL SECURITY;

CREATE POLICY judgement_add ON public.judgement FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY judgement_change ON public.judgement FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY judgement_job ON public.judgement TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY judgement_read ON public.judgement FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

ALTER TABLE public.membership ENABLE ROW LEVEL SECURITY;

CREATE POLICY membership_add ON public.membership FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY membership_auth ON public.membership FOR SELECT TO marram_auth USING (true);

CREATE POLICY membership_auth_add ON public.membership FOR INSERT TO marram_auth WITH CHECK (true);

CREATE POLICY membership_auth_restart ON public.membership FOR UPDATE TO marram_auth USING (true) WITH CHECK ((ended_at IS NULL));

CREATE POLICY membership_change ON public.membership FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY membership_job ON public.membership TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY membership_read ON public.membership FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND (( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as) OR ((person_id = ( SELECT app.person_id() AS person_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as)))));

ALTER TABLE public.notebook_entry ENABLE ROW LEVEL SECURITY;

CREATE POLICY notebook_entry_add ON public.notebook_entry FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY notebook_entry_change ON public.notebook_entry FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY notebook_entry_job ON public.notebook_entry TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY notebook_entry_read ON public.notebook_entry FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

ALTER TABLE public.notice ENABLE ROW LEVEL SECURITY;

CREATE POLICY notice_add ON public.notice FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as)));

CREATE POLICY notice_change ON public.notice FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND (person_id = ( SELECT app.person_id() AS person_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as)));

CREATE POLICY notice_job ON public.notice TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY notice_read ON public.notice FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND (person_id = ( SELECT app.person_id() AS person_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as)));

ALTER TABLE public.outbox ENABLE ROW LEVEL SECURITY;

CREATE POLICY outbox_add ON public.outbox FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as)));

CREATE POLICY outbox_auth ON public.outbox FOR INSERT TO marram_auth WITH CHECK ((kind = 'reset'::text));

CREATE POLICY outbox_job ON public.outbox TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY outbox_read ON public.outbox FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

ALTER TABLE public.outrun ENABLE ROW LEVEL SECURITY;

CREATE POLICY outrun_add ON public.outrun FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY outrun_change ON public.outrun FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

ALTER TABLE public.outrun_event ENABLE ROW LEVEL SECURITY;

CREATE POLICY outrun_event_add ON public.outrun_event FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY outrun_event_change ON public.outrun_event FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY outrun_event_job ON public.outrun_event TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY outrun_event_read ON public.outrun_event FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY outrun_job ON public.outrun TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

ALTER TABLE public.outrun_note ENABLE ROW LEVEL SECURITY;

CREATE POLICY outrun_note_add ON public.outrun_note FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY outrun_note_change ON public.outrun_note FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY outrun_note_job ON public.outrun_note TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY outrun_note_read ON public.outrun_note FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY outrun_read ON public.outrun FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

ALTER TABLE public.outrun_tick ENABLE ROW LEVEL SECURITY;

CREATE POLICY outrun_tick_add ON public.outrun_tick FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY outrun_tick_change ON public.outrun_tick FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY outrun_tick_drop ON public.outrun_tick FOR DELETE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY outrun_tick_job ON public.outrun_tick TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY outrun_tick_read ON public.outrun_tick FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

ALTER TABLE public.person ENABLE ROW LEVEL SECURITY;

CREATE POLICY person_auth ON public.person FOR SELECT TO marram_auth USING (true);

CREATE POLICY person_auth_add ON public.person FOR INSERT TO marram_auth WITH CHECK (true);

ALTER TABLE public.person_contact ENABLE ROW LEVEL SECURITY;

CREATE POLICY person_contact_auth ON public.person_contact FOR SELECT TO marram_auth USING (true);

CREATE POLICY person_contact_auth_add ON public.person_contact FOR INSERT TO marram_auth WITH CHECK (true);

CREATE POLICY person_contact_job ON public.person_contact FOR SELECT TO marram_job USING ((EXISTS ( SELECT
   FROM public.membership m
  WHERE ((m.person_id = person_contact.person_id) AND (m.academy_id = ( SELECT app.academy_id() AS academy_id))))));

CREATE POLICY person_contact_read ON public.person_contact FOR SELECT TO marram_app USING ((((person_id = ( SELECT app.person_id() AS person_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as)) OR (( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as) AND (person_id IN ( SELECT app.visible_people() AS visible_people)))));

CREATE POLICY person_job ON public.person FOR SELECT TO marram_job USING ((EXISTS ( SELECT
   FROM public.membership m
  WHERE ((m.person_id = person.id) AND (m.academy_id = ( SELECT app.academy_id() AS academy_id))))));

CREATE POLICY person_read ON public.person FOR SELECT TO marram_app USING ((id IN ( SELECT app.visible_people() AS visible_people)));

ALTER TABLE public.policy_version ENABLE ROW LEVEL SECURITY;

CREATE POLICY policy_version_add ON public.policy_version FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY policy_version_change ON public.policy_version FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY policy_version_job ON public.policy_version TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY policy_version_read ON public.policy_version FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as)));

ALTER TABLE public.restriction ENABLE ROW LEVEL SECURITY;

CREATE POLICY restriction_add ON public.restriction FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY restriction_change ON public.restriction FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY restriction_job ON public.restriction TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY restriction_read ON public.restriction FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

ALTER TABLE public.retest_request ENABLE ROW LEVEL SECURITY;

CREATE POLICY retest_request_add ON public.retest_request FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY retest_request_change ON public.retest_request FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY retest_request_job ON public.retest_request TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY retest_request_read ON public.retest_request FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

ALTER TABLE public.session ENABLE ROW LEVEL SECURITY;

CREATE POLICY session_auth ON public.session TO marram_auth USING (true) WITH CHECK (true);

ALTER TABLE public.shot ENABLE ROW LEVEL SECURITY;

CREATE POLICY shot_add ON public.shot FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY shot_change ON public.shot FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY shot_job ON public.shot TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY shot_read ON public.shot FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

ALTER TABLE public.squad ENABLE ROW LEVEL SECURITY;

CREATE POLICY squad_add ON public.squad FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY squad_change ON public.squad FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

ALTER TABLE public.squad_coach ENABLE ROW LEVEL SECURITY;

CREATE POLICY squad_coach_add ON public.squad_coach FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY squad_coach_auth_add ON public.squad_coach FOR INSERT TO marram_auth WITH CHECK (true);

CREATE POLICY squad_coach_drop ON public.squad_coach FOR DELETE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY squad_coach_job ON public.squad_coach TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY squad_coach_read ON public.squad_coach FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND (squad_id IN ( SELECT app.visible_squads() AS visible_squads))));

CREATE POLICY squad_job ON public.squad TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY squad_read ON public.squad FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND (id IN ( SELECT app.visible_squads() AS visible_squads))));

ALTER TABLE public.term ENABLE ROW LEVEL SECURITY;

CREATE POLICY term_add ON public.term FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY term_change ON public.term FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY term_job ON public.term TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY term_read ON public.term FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as)));

ALTER TABLE public.test ENABLE ROW LEVEL SECURITY;

CREATE POLICY test_add ON public.test FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY test_change ON public.test FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY test_job ON public.test TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY test_read ON public.test FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as)));

ALTER TABLE public.testing_day ENABLE ROW LEVEL SECURITY;

CREATE POLICY testing_day_add ON public.testing_day FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role]) AS acts_as) AND (squad_id IN ( SELECT app.visible_squads() AS visible_squads))));

ALTER TABLE public.testing_day_athlete ENABLE ROW LEVEL SECURITY;

CREATE POLICY testing_day_athlete_add ON public.testing_day_athlete FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY testing_day_athlete_change ON public.testing_day_athlete FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY testing_day_athlete_drop ON public.testing_day_athlete FOR DELETE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY testing_day_athlete_job ON public.testing_day_athlete TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY testing_day_athlete_read ON public.testing_day_athlete FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY testing_day_change ON public.testing_day FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role]) AS acts_as) AND (squad_id IN ( SELECT app.visible_squads() AS visible_squads)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role]) AS acts_as) AND (squad_id IN ( SELECT app.visible_squads() AS visible_squads))));

CREATE POLICY testing_day_job ON public.testing_day TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY testing_day_read ON public.testing_day FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND (squad_id IN ( SELECT app.visible_squads() AS visible_squads))));

ALTER TABLE public.token ENABLE ROW LEVEL SECURITY;

CREATE POLICY token_add ON public.token FOR INSERT TO marram_app WITH CHECK (((kind = 'invite'::text) AND (academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY token_auth ON public.token TO marram_auth USING (true) WITH CHECK (true);

CREATE POLICY token_read ON public.token FOR SELECT TO marram_app USING (((kind = 'invite'::text) AND (academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as)));

CREATE POLICY token_revoke ON public.token FOR UPDATE TO marram_app USING (((kind = 'invite'::text) AND (academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role]) AS acts_as))) WITH CHECK (((kind = 'invite'::text) AND (academy_id = ( SELECT app.academy_id() AS academy_id))));

ALTER TABLE public.trial ENABLE ROW LEVEL SECURITY;

CREATE POLICY trial_add ON public.trial FOR INSERT TO marram_app WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY trial_change ON public.trial FOR UPDATE TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes)))) WITH CHECK (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

CREATE POLICY trial_job ON public.trial TO marram_job USING ((academy_id = ( SELECT app.academy_id() AS academy_id))) WITH CHECK ((academy_id = ( SELECT app.academy_id() AS academy_id)));

CREATE POLICY trial_read ON public.trial FOR SELECT TO marram_app USING (((academy_id = ( SELECT app.academy_id() AS academy_id)) AND ( SELECT app.acts_as(VARIADIC ARRAY['director'::public.role, 'strength_coach'::public.role, 'swing_coach'::public.role, 'guardian'::public.role, 'athlete'::public.role]) AS acts_as) AND (athlete_id IN ( SELECT app.visible_athletes() AS visible_athletes))));

GRANT USAGE ON SCHEMA app TO marram_app;
GRANT USAGE ON SCHEMA app TO marram_auth;
GRANT USAGE ON SCHEMA app TO marram_job;
GRANT USAGE ON SCHEMA app TO marram_backup;

REVOKE USAGE ON SCHEMA public FROM PUBLIC;
GRANT ALL ON SCHEMA public TO marram_owner;
GRANT USAGE ON SCHEMA public TO marram_app;
GRANT USAGE ON SCHEMA public TO marram_auth;
GRANT USAGE ON SCHEMA public TO marram_job;
GRANT USAGE ON SCHEMA public TO marram_backup;

REVOKE ALL ON FUNCTION app.acts_as(VARIADIC roles public.role[]) FROM PUBLIC;
GRANT ALL ON FUNCTION app.acts_as(VARIADIC roles public.role[]) TO marram_app;

REVOKE ALL ON FUNCTION app.enqueue(task text, payload jsonb, job_key text) FROM PUBLIC;
GRANT ALL ON FUNCTION app.enqueue(task text, payload jsonb, job_key text) TO marram_app;
GRANT ALL ON FUNCTION app.enqueue(task text, payload jsonb, job_key text) TO marram_job;
GRANT ALL ON FUNCTION app.enqueue(task text, payload jsonb, job_key text) TO marram_auth;

REVOKE ALL ON FUNCTION app.programme_figures(except_athletes uuid[], as_of date) FROM PUBLIC;
GRANT ALL ON FUNCTION app.programme_figures(except_athletes uuid[], as_of date) TO marram_app;
GRANT ALL ON FUNCTION app.programme_figures(except_athletes uuid[], as_of date) TO marram_job;

REVOKE ALL ON FUNCTION app.visible_athletes() FROM PUBLIC;
GRANT ALL ON FUNCTION app.visible_athletes() TO marram_app;

REVOKE ALL ON FUNCTION app.visible_people() FROM PUBLIC;
GRANT ALL ON FUNCTION app.visible_people() TO marram_app;

REVOKE ALL ON FUNCTION app.visible_squads() FROM PUBLIC;
GRANT ALL ON FUNCTION app.visible_squads() TO marram_app;

GRANT SELECT ON TABLE public.academy TO marram_app;
GRANT SELECT ON TABLE public.academy TO marram_auth;
GRANT SELECT ON TABLE public.academy TO marram_job;
GRANT SELECT ON TABLE public.academy TO marram_backup;

GRANT UPDATE(name) ON TABLE public.academy TO marram_app;

GRANT UPDATE(time_zone) ON TABLE public.academy TO marram_app;

GRANT UPDATE(own_account_age) ON TABLE public.academy TO marram_app;

GRANT UPDATE(safeguarding_contact) ON TABLE public.academy TO marram_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.athlete TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.athlete TO marram_app;
GRANT SELECT ON TABLE public.athlete TO marram_backup;

GRANT SELECT(id) ON TABLE public.athlete TO marram_auth;

GRANT SELECT(academy_id) ON TABLE public.athlete TO marram_auth;

GRANT SELECT(person_id),UPDATE(person_id) ON TABLE public.athlete TO marram_auth;

GRANT SELECT(given_name) ON TABLE public.athlete TO marram_auth;

GRANT SELECT(family_name) ON TABLE public.athlete TO marram_auth;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.attempt_limit TO marram_auth;
GRANT SELECT ON TABLE public.attempt_limit TO marram_backup;

GRANT SELECT,INSERT ON TABLE public.audit TO marram_app;
GRANT INSERT ON TABLE public.audit TO marram_auth;
GRANT INSERT ON TABLE public.audit TO marram_job;
GRANT SELECT ON TABLE public.audit TO marram_backup;

GRANT SELECT ON SEQUENCE public.audit_id_seq TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.battery TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.battery TO marram_app;
GRANT SELECT ON TABLE public.battery TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.battery_test TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.battery_test TO marram_app;
GRANT SELECT ON TABLE public.battery_test TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.column_mapping TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.column_mapping TO marram_app;
GRANT SELECT ON TABLE public.column_mapping TO marram_backup;

GRANT SELECT,INSERT,UPDATE ON TABLE public.credential TO marram_auth;
GRANT SELECT ON TABLE public.credential TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.curve TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.curve TO marram_app;
GRANT SELECT ON TABLE public.curve TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.device TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.device TO marram_app;
GRANT SELECT ON TABLE public.device TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.driver_session TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.driver_session TO marram_app;
GRANT SELECT ON TABLE public.driver_session TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.driver_session_athlete TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.driver_session_athlete TO marram_app;
GRANT SELECT ON TABLE public.driver_session_athlete TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.ground_channel TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.ground_channel TO marram_app;
GRANT SELECT ON TABLE public.ground_channel TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.ground_trace TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.ground_trace TO marram_app;
GRANT SELECT ON TABLE public.ground_trace TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.growth_measure TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.growth_measure TO marram_app;
GRANT SELECT ON TABLE public.growth_measure TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.guardian_address TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.guardian_address TO marram_app;
GRANT SELECT ON TABLE public.guardian_address TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.guardianship TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.guardianship TO marram_app;
GRANT SELECT,INSERT ON TABLE public.guardianship TO marram_auth;
GRANT SELECT ON TABLE public.guardianship TO marram_backup;

GRANT UPDATE(ended_at) ON TABLE public.guardianship TO marram_auth;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.handedness TO marram_job;
GRANT SELECT,INSERT ON TABLE public.handedness TO marram_app;
GRANT SELECT ON TABLE public.handedness TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.import_file TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.import_file TO marram_app;
GRANT SELECT ON TABLE public.import_file TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.judgement TO marram_job;
GRANT SELECT,INSERT ON TABLE public.judgement TO marram_app;
GRANT SELECT ON TABLE public.judgement TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.membership TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.membership TO marram_app;
GRANT SELECT,INSERT ON TABLE public.membership TO marram_auth;
GRANT SELECT ON TABLE public.membership TO marram_backup;

GRANT UPDATE(ended_at) ON TABLE public.membership TO marram_auth;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.notebook_entry TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.notebook_entry TO marram_app;
GRANT SELECT ON TABLE public.notebook_entry TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.notice TO marram_job;
GRANT SELECT,INSERT ON TABLE public.notice TO marram_app;
GRANT SELECT ON TABLE public.notice TO marram_backup;

GRANT UPDATE(read_at) ON TABLE public.notice TO marram_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.outbox TO marram_job;
GRANT SELECT,INSERT ON TABLE public.outbox TO marram_app;
GRANT INSERT ON TABLE public.outbox TO marram_auth;
GRANT SELECT ON TABLE public.outbox TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.outrun TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.outrun TO marram_app;
GRANT SELECT ON TABLE public.outrun TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.outrun_event TO marram_job;
GRANT SELECT,INSERT ON TABLE public.outrun_event TO marram_app;
GRANT SELECT ON TABLE public.outrun_event TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.outrun_note TO marram_job;
GRANT SELECT,INSERT ON TABLE public.outrun_note TO marram_app;
GRANT SELECT ON TABLE public.outrun_note TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.outrun_tick TO marram_job;
GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.outrun_tick TO marram_app;
GRANT SELECT ON TABLE public.outrun_tick TO marram_backup;

GRANT SELECT ON TABLE public.person TO marram_app;
GRANT SELECT,INSERT ON TABLE public.person TO marram_auth;
GRANT SELECT ON TABLE public.person TO marram_job;
GRANT SELECT ON TABLE public.person TO marram_backup;

GRANT SELECT ON TABLE public.person_contact TO marram_app;
GRANT SELECT,INSERT ON TABLE public.person_contact TO marram_auth;
GRANT SELECT ON TABLE public.person_contact TO marram_job;
GRANT SELECT ON TABLE public.person_contact TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.policy_version TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.policy_version TO marram_app;
GRANT SELECT ON TABLE public.policy_version TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.restriction TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.restriction TO marram_app;
GRANT SELECT ON TABLE public.restriction TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.retest_request TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.retest_request TO marram_app;
GRANT SELECT ON TABLE public.retest_request TO marram_backup;

GRANT SELECT,INSERT,UPDATE ON TABLE public.session TO marram_auth;
GRANT SELECT ON TABLE public.session TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.shot TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.shot TO marram_app;
GRANT SELECT ON TABLE public.shot TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.squad TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.squad TO marram_app;
GRANT SELECT ON TABLE public.squad TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.squad_coach TO marram_job;
GRANT SELECT,INSERT,DELETE ON TABLE public.squad_coach TO marram_app;
GRANT INSERT ON TABLE public.squad_coach TO marram_auth;
GRANT SELECT ON TABLE public.squad_coach TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.term TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.term TO marram_app;
GRANT SELECT ON TABLE public.term TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.test TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.test TO marram_app;
GRANT SELECT ON TABLE public.test TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.testing_day TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.testing_day TO marram_app;
GRANT SELECT ON TABLE public.testing_day TO marram_backup;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.testing_day_athlete TO marram_job;
GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.testing_day_athlete TO marram_app;
GRANT SELECT ON TABLE public.testing_day_athlete TO marram_backup;

GRANT SELECT,INSERT ON TABLE public.token TO marram_app;
GRANT SELECT,INSERT,UPDATE ON TABLE public.token TO marram_auth;
GRANT SELECT ON TABLE public.token TO marram_backup;

GRANT UPDATE(revoked_at) ON TABLE public.token TO marram_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.trial TO marram_job;
GRANT SELECT,INSERT,UPDATE ON TABLE public.trial TO marram_app;
GRANT SELECT ON TABLE public.trial TO marram_backup;
