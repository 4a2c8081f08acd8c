CREATE FUNCTION public.access_token_create(hash text, token_purpose text, subject uuid, expires timestamp with time zone) RETURNS void
    LANGUAGE sql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ insert into access_tokens (token_hash, organisation_id, purpose, subject_id, expires_at)
            values (hash, app_organisation(), token_purpose, subject, expires) $$;

CREATE FUNCTION public.access_token_find(hash text) RETURNS TABLE(organisation_id uuid, purpose text, subject_id uuid, expires_at timestamp with time zone, used_at timestamp with time zone)
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ select t.organisation_id, t.purpose, t.subject_id, t.expires_at, t.used_at from access_tokens t where t.token_hash = hash $$;

CREATE FUNCTION public.access_token_use(hash text) RETURNS boolean
    LANGUAGE sql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ with used as (update access_tokens set used_at = now()
                           where token_hash = hash and used_at is null and expires_at > now() returning 1)
            select exists (select 1 from used) $$;

CREATE FUNCTION public.account_by_email(wanted text) RETURNS TABLE(id uuid, name text, password_hash text, session_version integer, disabled boolean)
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ select a.id, a.name, a.password_hash, a.session_version, a.disabled_at is not null
              from accounts a where a.email = lower(wanted) $$;

CREATE FUNCTION public.account_create(new_id uuid, new_email text, new_name text, hash text) RETURNS uuid
    LANGUAGE sql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ insert into accounts (id, email, name, password_hash) values (new_id, lower(new_email), new_name, hash)
            on conflict (email) do nothing returning id $$;

CREATE FUNCTION public.account_end_sessions(account uuid) RETURNS void
    LANGUAGE sql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ update accounts set session_version = session_version + 1 where id = account $$;

CREATE FUNCTION public.account_memberships(account uuid) RETURNS TABLE(organisation_id uuid, organisation_name text, roles text[])
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ select m.organisation_id, o.name, m.roles
              from memberships m join organisations o using (organisation_id)
             where m.account_id = account and m.disabled_at is null order by m.created_at $$;

CREATE FUNCTION public.account_session(account uuid, organisation uuid) RETURNS TABLE(account_name text, email text, session_version integer, account_disabled boolean, membership_id uuid, member_name text, function_title text, roles text[], customer_id uuid, member_disabled boolean, organisation_name text, organisation_code text, time_zone text, set_up_done boolean)
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ select a.name, a.email, a.session_version, a.disabled_at is not null,
                   m.id, m.name, m.function_title, m.roles, m.customer_id, m.disabled_at is not null,
                   o.name, o.code, o.time_zone, o.set_up_done
              from accounts a
              join memberships m on m.account_id = a.id and m.organisation_id = organisation
              join organisations o on o.organisation_id = m.organisation_id
             where a.id = account $$;

CREATE FUNCTION public.account_set_password(account uuid, hash text) RETURNS void
    LANGUAGE sql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ update accounts set password_hash = hash, session_version = session_version + 1 where id = account $$;

CREATE FUNCTION public.app_account() RETURNS uuid
    LANGUAGE sql STABLE
    AS $$ select current_setting('app.account')::uuid $$;

CREATE FUNCTION public.app_customer() RETURNS uuid
    LANGUAGE sql STABLE
    AS $$ select case current_setting('app.customer') when 'staff' then null else current_setting('app.customer')::uuid end $$;

CREATE FUNCTION public.app_is_staff() RETURNS boolean
    LANGUAGE sql STABLE
    AS $$ select case current_setting('app.customer') when 'staff' then true else current_setting('app.customer')::uuid is null end $$;

CREATE FUNCTION public.app_organisation() RETURNS uuid
    LANGUAGE sql STABLE
    AS $$ select current_setting('app.organisation')::uuid $$;

CREATE FUNCTION public.enqueue(task text, payload jsonb, job_key text) RETURNS void
    LANGUAGE plpgsql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$
      begin
        if (payload ->> 'organisationId')::uuid <> app_organisation() then
          raise exception 'work is queued for the own organisation only';
        end if;
        perform graphile_worker.add_job(task, payload := payload::json, job_key := job_key, max_attempts := 12);
      end $$;

CREATE FUNCTION public.first_organisation_create(organisation uuid, organisation_name text, organisation_code text, zone text) RETURNS boolean
    LANGUAGE plpgsql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$
      begin
        lock table organisations in exclusive mode;
        if exists (select 1 from organisations) then return false; end if;
        insert into organisations (organisation_id, name, code, time_zone) values (organisation, organisation_name, organisation_code, zone);
        return true;
      end $$;

CREATE FUNCTION public.first_organisation_needed() RETURNS boolean
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ select not exists (select 1 from organisations) $$;

CREATE FUNCTION public.reports_are_frozen() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
    begin
      if new.model::text <> old.model::text or new.model_sha256 <> old.model_sha256 or new.number <> old.number
         or new.revision <> old.revision or new.job_id <> old.job_id or new.issued_at <> old.issued_at
         or new.issued_by is distinct from old.issued_by then
        raise exception 'an issued report does not change' using errcode = 'WM001';
      end if;
      if (old.pdf_file_id is not null and new.pdf_file_id is distinct from old.pdf_file_id)
         or (old.signed_pdf_file_id is not null and new.signed_pdf_file_id is distinct from old.signed_pdf_file_id) then
        raise exception 'the document of a report does not change' using errcode = 'WM001';
      end if;
      if old.state in ('signed', 'signed-with-remarks', 'refused') and new.state not in (old.state, 'superseded') then
        raise exception 'a signed report keeps its outcome' using errcode = 'WM001';
      end if;
      if not app_is_staff() and (new.pdf_file_id is distinct from old.pdf_file_id
         or new.signed_pdf_file_id is distinct from old.signed_pdf_file_id or new.supersedes is distinct from old.supersedes) then
        raise exception 'only the outcome is the signer''s to set' using errcode = 'WM001';
      end if;
      return new;
    end $$;

CREATE FUNCTION public.throttle_clear(bucket text) RETURNS void
    LANGUAGE sql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ delete from throttles where key = bucket $$;

CREATE FUNCTION public.throttle_take(bucket text, capacity double precision, refill_per_second double precision) RETURNS double precision
    LANGUAGE plpgsql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$
      declare left_over double precision;
      begin
        insert into throttles (key, allowance) values (bucket, capacity) on conflict (key) do nothing;
        select least(capacity, allowance + extract(epoch from now() - updated_at) * refill_per_second)
          into left_over from throttles where key = bucket for update;
        if left_over < 1 then return (1 - left_over) / refill_per_second; end if;
        update throttles set allowance = left_over - 1, updated_at = now() where key = bucket;
        return 0;
      end $$;

CREATE FUNCTION public.tolerance_values_are_kept() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
    begin
      if old.second_account_id is not null
         or to_jsonb(new) - array['second_account_id', 'second_account_name', 'second_at']
            is distinct from to_jsonb(old) - array['second_account_id', 'second_account_name', 'second_at'] then
        raise exception 'a value that was written down does not change' using errcode = 'WM001';
      end if;
      return new;
    end $$;

CREATE TABLE public.access_tokens (
    token_hash text NOT NULL,
    organisation_id uuid NOT NULL,
    purpose text NOT NULL,
    subject_id uuid NOT NULL,
    expires_at timestamp with time zone NOT NULL,
    used_at timestamp with time zone,
    CONSTRAINT access_tokens_purpose_check CHECK ((purpose = ANY (ARRAY['invitation'::text, 'signing'::text])))
);

CREATE TABLE public.accounts (
    id uuid NOT NULL,
    email text NOT NULL,
    name text NOT NULL,
    password_hash text,
    session_version integer DEFAULT 1 NOT NULL,
    disabled_at timestamp with time zone,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT accounts_email_check CHECK ((email = lower(email)))
);

CREATE TABLE public.audit_events (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    sequence bigint NOT NULL,
    action text NOT NULL,
    subject_type text NOT NULL,
    subject_id uuid NOT NULL,
    account_id uuid,
    account_name text,
    detail jsonb DEFAULT '{}'::jsonb NOT NULL,
    happened_at timestamp with time zone DEFAULT now() NOT NULL
);

ALTER TABLE ONLY public.audit_events FORCE ROW LEVEL SECURITY;

ALTER TABLE public.audit_events ALTER COLUMN sequence ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.audit_events_sequence_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.calibrations (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    instrument_id uuid NOT NULL,
    certificate text NOT NULL,
    laboratory text,
    calibrated_on date NOT NULL,
    due_on date NOT NULL,
    expanded_uncertainty numeric,
    uncertainty_unit text,
    coverage_factor numeric,
    file_id uuid,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT calibrations_check CHECK ((due_on >= calibrated_on)),
    CONSTRAINT calibrations_expanded_uncertainty_check CHECK ((expanded_uncertainty > (0)::numeric))
);

ALTER TABLE ONLY public.calibrations FORCE ROW LEVEL SECURITY;

CREATE TABLE public.customers (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    name text NOT NULL,
    address_lines text[] DEFAULT '{}'::text[] NOT NULL,
    contact text,
    email text,
    version integer DEFAULT 1 NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL
);

ALTER TABLE ONLY public.customers FORCE ROW LEVEL SECURITY;

CREATE TABLE public.files (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    key text NOT NULL,
    kind text NOT NULL,
    name text NOT NULL,
    content_type text NOT NULL,
    byte_length bigint NOT NULL,
    sha256 text NOT NULL,
    created_by uuid,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT files_kind_check CHECK ((kind = ANY (ARRAY['report'::text, 'certificate'::text, 'nameplate'::text, 'photo'::text])))
);

ALTER TABLE ONLY public.files FORCE ROW LEVEL SECURITY;

CREATE TABLE public.idempotency_keys (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    key text NOT NULL,
    account_id uuid NOT NULL,
    request_hash text NOT NULL,
    status integer NOT NULL,
    answer jsonb,
    created_at timestamp with time zone DEFAULT now() NOT NULL
);

ALTER TABLE ONLY public.idempotency_keys FORCE ROW LEVEL SECURITY;

CREATE TABLE public.instruments (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    number text NOT NULL,
    name text NOT NULL,
    kind text NOT NULL,
    resolution numeric,
    resolution_unit text,
    retired_at timestamp with time zone,
    version integer DEFAULT 1 NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT instruments_resolution_check CHECK ((resolution > (0)::numeric))
);

ALTER TABLE ONLY public.instruments FORCE ROW LEVEL SECURITY;

CREATE TABLE public.invitations (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    email text NOT NULL,
    name text NOT NULL,
    roles text[] NOT NULL,
    customer_id uuid,
    invited_by uuid NOT NULL,
    expires_at timestamp with time zone NOT NULL,
    accepted_at timestamp with time zone,
    revoked_at timestamp with time zone,
    created_at timestamp with time zone DEFAULT now() NOT NULL
);

ALTER TABLE ONLY public.invitations FORCE ROW LEVEL SECURITY;

CREATE TABLE public.job_exclusions (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    job_id uuid NOT NULL,
    key text NOT NULL,
    title text NOT NULL,
    reason text NOT NULL,
    text text,
    CONSTRAINT job_exclusions_reason_check CHECK ((reason = ANY (ARRAY['not-applicable'::text, 'not-agreed'::text, 'not-possible'::text, 'not-touched'::text])))
);

ALTER TABLE ONLY public.job_exclusions FORCE ROW LEVEL SECURITY;

CREATE TABLE public.job_people (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    job_id uuid NOT NULL,
    membership_id uuid,
    name text NOT NULL,
    role text NOT NULL,
    CONSTRAINT job_people_role_check CHECK ((role = ANY (ARRAY['inspector'::text, 'reviewer'::text, 'customer'::text])))
);

ALTER TABLE ONLY public.job_people FORCE ROW LEVEL SECURITY;

CREATE TABLE public.job_temperatures (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    job_id uuid NOT NULL,
    measured_at timestamp with time zone NOT NULL,
    air numeric,
    air_text text,
    machine numeric,
    machine_text text,
    CONSTRAINT job_temperatures_check CHECK (((air IS NOT NULL) OR (machine IS NOT NULL)))
);

ALTER TABLE ONLY public.job_temperatures FORCE ROW LEVEL SECURITY;

CREATE TABLE public.jobs (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    reference text NOT NULL,
    machine_id uuid NOT NULL,
    customer_id uuid NOT NULL,
    purpose text NOT NULL,
    scope text,
    customer_order text,
    customer_engineer text,
    decision_rule text DEFAULT 'simple'::text NOT NULL,
    codes jsonb NOT NULL,
    starts_on date NOT NULL,
    ends_on date,
    place text,
    hours text,
    conditions jsonb DEFAULT '{}'::jsonb NOT NULL,
    make_up jsonb NOT NULL,
    plan_made_at timestamp with time zone,
    state text DEFAULT 'open'::text NOT NULL,
    version integer DEFAULT 1 NOT NULL,
    created_by uuid,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    component_conditions jsonb DEFAULT '{}'::jsonb NOT NULL,
    refuse_unconfirmed boolean DEFAULT false NOT NULL,
    CONSTRAINT jobs_check CHECK (((ends_on IS NULL) OR (ends_on >= starts_on))),
    CONSTRAINT jobs_decision_rule_check CHECK ((decision_rule = ANY (ARRAY['simple'::text, 'guarded'::text]))),
    CONSTRAINT jobs_purpose_check CHECK ((purpose = ANY (ARRAY['new-machine'::text, 'overhaul'::text, 'collision'::text, 'move'::text, 'periodic'::text]))),
    CONSTRAINT jobs_state_check CHECK ((state = ANY (ARRAY['open'::text, 'in-check'::text, 'issued'::text, 'closed'::text])))
);

ALTER TABLE ONLY public.jobs FORCE ROW LEVEL SECURITY;

CREATE TABLE public.machine_owners (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    machine_id uuid NOT NULL,
    customer_id uuid NOT NULL,
    from_date date NOT NULL,
    until_date date,
    sees_history boolean DEFAULT false NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT machine_owners_check CHECK (((until_date IS NULL) OR (until_date > from_date)))
);

ALTER TABLE ONLY public.machine_owners FORCE ROW LEVEL SECURITY;

CREATE TABLE public.machines (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    manufacturer text NOT NULL,
    model text NOT NULL,
    serial_number text NOT NULL,
    serial_folded text NOT NULL,
    year integer,
    control text,
    site text,
    kind text NOT NULL,
    make_up jsonb NOT NULL,
    version integer DEFAULT 1 NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    nameplate_file_id uuid,
    CONSTRAINT machines_year_check CHECK (((year >= 1900) AND (year <= 2200)))
);

ALTER TABLE ONLY public.machines FORCE ROW LEVEL SECURITY;

CREATE TABLE public.memberships (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    account_id uuid NOT NULL,
    name text NOT NULL,
    email text NOT NULL,
    function_title text,
    roles text[] NOT NULL,
    customer_id uuid,
    disabled_at timestamp with time zone,
    version integer DEFAULT 1 NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT memberships_check CHECK (((customer_id IS NOT NULL) = (roles @> ARRAY['customer'::text]))),
    CONSTRAINT memberships_roles_check CHECK (((cardinality(roles) > 0) AND (roles <@ ARRAY['administrator'::text, 'reviewer'::text, 'inspector'::text, 'customer'::text]))),
    CONSTRAINT memberships_roles_check1 CHECK (((NOT (roles @> ARRAY['customer'::text])) OR (cardinality(roles) = 1)))
);

ALTER TABLE ONLY public.memberships FORCE ROW LEVEL SECURITY;

CREATE TABLE public.organisations (
    organisation_id uuid NOT NULL,
    name text NOT NULL,
    code text NOT NULL,
    address_lines text[] DEFAULT '{}'::text[] NOT NULL,
    contact text,
    time_zone text DEFAULT 'UTC'::text NOT NULL,
    paper text DEFAULT 'A4'::text NOT NULL,
    set_up_done boolean DEFAULT false NOT NULL,
    version integer DEFAULT 1 NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    codes jsonb,
    four_eyes boolean DEFAULT false NOT NULL,
    refuse_unconfirmed boolean DEFAULT false NOT NULL,
    CONSTRAINT organisations_paper_check CHECK ((paper = ANY (ARRAY['A4'::text, 'Letter'::text])))
);

ALTER TABLE ONLY public.organisations FORCE ROW LEVEL SECURITY;

CREATE TABLE public.outbox (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    recipient text NOT NULL,
    subject text NOT NULL,
    text_body text NOT NULL,
    html_body text NOT NULL,
    message_id text NOT NULL,
    state text DEFAULT 'waiting'::text NOT NULL,
    attempts integer DEFAULT 0 NOT NULL,
    last_error_id text,
    sent_at timestamp with time zone,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT outbox_state_check CHECK ((state = ANY (ARRAY['waiting'::text, 'sent'::text, 'failed'::text])))
);

ALTER TABLE ONLY public.outbox FORCE ROW LEVEL SECURITY;

CREATE TABLE public.own_definitions (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    sequence bigint NOT NULL,
    definition_id text NOT NULL,
    version integer NOT NULL,
    withdrawn boolean DEFAULT false NOT NULL,
    definition jsonb,
    composed jsonb,
    account_id uuid NOT NULL,
    account_name text NOT NULL,
    recorded_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT own_definitions_check CHECK (((withdrawn = (definition IS NULL)) AND (withdrawn = (composed IS NULL)))),
    CONSTRAINT own_definitions_definition_id_check CHECK ((definition_id ~ '^[A-Z][A-Z0-9-]{1,19}$'::text)),
    CONSTRAINT own_definitions_version_check CHECK ((version > 0))
);

ALTER TABLE ONLY public.own_definitions FORCE ROW LEVEL SECURITY;

ALTER TABLE public.own_definitions ALTER COLUMN sequence ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.own_definitions_sequence_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.pass_instruments (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    pass_id uuid NOT NULL,
    instrument_id uuid NOT NULL,
    override_reason text,
    override_by text
);

ALTER TABLE ONLY public.pass_instruments FORCE ROW LEVEL SECURITY;

CREATE TABLE public.pass_results (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    pass_id uuid NOT NULL,
    state text NOT NULL,
    deviation_um numeric NOT NULL,
    tolerance_um numeric,
    limit_um numeric,
    margin_um numeric,
    verdict text NOT NULL,
    displayed_um text NOT NULL,
    displayed_mm text NOT NULL,
    outcome jsonb NOT NULL,
    rule_set text NOT NULL,
    computed_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT pass_results_state_check CHECK ((state = ANY (ARRAY['partial'::text, 'complete'::text]))),
    CONSTRAINT pass_results_verdict_check CHECK ((verdict = ANY (ARRAY['within-tolerance'::text, 'out-of-tolerance'::text, 'undecided'::text, 'for-information'::text])))
);

ALTER TABLE ONLY public.pass_results FORCE ROW LEVEL SECURITY;

CREATE TABLE public.passes (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    sheet_id uuid NOT NULL,
    kind text NOT NULL,
    number integer NOT NULL,
    linked_to uuid,
    taken_at timestamp with time zone,
    taken_by text,
    temperature numeric,
    temperature_text text,
    version integer DEFAULT 1 NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT passes_check CHECK (((linked_to IS NULL) OR (kind = 'as-left'::text))),
    CONSTRAINT passes_kind_check CHECK ((kind = ANY (ARRAY['as-found'::text, 'adjusting'::text, 'as-left'::text])))
);

ALTER TABLE ONLY public.passes FORCE ROW LEVEL SECURITY;

CREATE TABLE public.plan_templates (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    manufacturer text NOT NULL,
    model text NOT NULL,
    name text NOT NULL,
    choices jsonb NOT NULL,
    from_job_id uuid,
    account_name text NOT NULL,
    version integer DEFAULT 1 NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT plan_templates_name_check CHECK ((name <> ''::text))
);

ALTER TABLE ONLY public.plan_templates FORCE ROW LEVEL SECURITY;

CREATE TABLE public.reading_operations (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    sequence bigint NOT NULL,
    sheet_id uuid NOT NULL,
    pass_id uuid NOT NULL,
    pointer text NOT NULL,
    base_version integer NOT NULL,
    text text NOT NULL,
    unit text,
    source text NOT NULL,
    device_time timestamp with time zone NOT NULL,
    reason text,
    outcome text NOT NULL,
    version integer,
    problem text,
    account_id uuid NOT NULL,
    account_name text NOT NULL,
    received_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT reading_operations_outcome_check CHECK ((outcome = ANY (ARRAY['applied'::text, 'conflict'::text, 'rejected'::text])))
);

ALTER TABLE ONLY public.reading_operations FORCE ROW LEVEL SECURITY;

ALTER TABLE public.reading_operations ALTER COLUMN sequence ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.reading_operations_sequence_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.readings (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    pass_id uuid NOT NULL,
    pointer text NOT NULL,
    text text NOT NULL,
    value numeric,
    unit text,
    source text NOT NULL,
    version integer NOT NULL,
    device_time timestamp with time zone,
    updated_at timestamp with time zone DEFAULT now() NOT NULL,
    resolution numeric,
    CONSTRAINT readings_resolution_check CHECK ((resolution > (0)::numeric)),
    CONSTRAINT readings_source_check CHECK ((source = ANY (ARRAY['typed'::text, 'keypad'::text, 'paste'::text, 'device'::text, 'planned'::text])))
);

ALTER TABLE ONLY public.readings FORCE ROW LEVEL SECURITY;

CREATE TABLE public.remarks (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    job_id uuid NOT NULL,
    report_id uuid,
    sheet_id uuid,
    number integer NOT NULL,
    text text NOT NULL,
    owner text,
    due_on date,
    closed_at timestamp with time zone,
    closed_by text,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT remarks_text_check CHECK ((text <> ''::text))
);

ALTER TABLE ONLY public.remarks FORCE ROW LEVEL SECURITY;

CREATE TABLE public.report_counters (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    year integer NOT NULL,
    last integer NOT NULL
);

ALTER TABLE ONLY public.report_counters FORCE ROW LEVEL SECURITY;

CREATE TABLE public.reports (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    job_id uuid NOT NULL,
    number text NOT NULL,
    revision integer DEFAULT 1 NOT NULL,
    state text NOT NULL,
    model json NOT NULL,
    model_sha256 text NOT NULL,
    pdf_state text DEFAULT 'waiting'::text NOT NULL,
    pdf_file_id uuid,
    signed_pdf_file_id uuid,
    pdf_error_id text,
    issued_by uuid,
    issued_at timestamp with time zone NOT NULL,
    signed_at timestamp with time zone,
    supersedes uuid,
    version integer DEFAULT 1 NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT reports_pdf_state_check CHECK ((pdf_state = ANY (ARRAY['waiting'::text, 'ready'::text, 'failed'::text]))),
    CONSTRAINT reports_state_check CHECK ((state = ANY (ARRAY['checked'::text, 'issued'::text, 'signed'::text, 'signed-with-remarks'::text, 'refused'::text, 'superseded'::text])))
);

ALTER TABLE ONLY public.reports FORCE ROW LEVEL SECURITY;

CREATE TABLE public.sheet_photos (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    sheet_id uuid NOT NULL,
    item text,
    caption text DEFAULT ''::text NOT NULL,
    file_id uuid NOT NULL,
    width_px integer NOT NULL,
    height_px integer NOT NULL,
    added_by text NOT NULL,
    added_at timestamp with time zone DEFAULT now() NOT NULL,
    removed_by text,
    removed_at timestamp with time zone,
    CONSTRAINT sheet_photos_check CHECK (((removed_by IS NULL) = (removed_at IS NULL))),
    CONSTRAINT sheet_photos_height_px_check CHECK ((height_px > 0)),
    CONSTRAINT sheet_photos_width_px_check CHECK ((width_px > 0))
);

ALTER TABLE ONLY public.sheet_photos FORCE ROW LEVEL SECURITY;

CREATE TABLE public.sheets (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    job_id uuid NOT NULL,
    "position" integer NOT NULL,
    key text NOT NULL,
    definition jsonb NOT NULL,
    title text NOT NULL,
    component jsonb NOT NULL,
    depends_on jsonb NOT NULL,
    tolerance jsonb,
    direction text NOT NULL,
    set_up jsonb DEFAULT '{}'::jsonb NOT NULL,
    left_out_reason text,
    left_out_text text,
    left_out_by text,
    left_out_at timestamp with time zone,
    remark text,
    version integer DEFAULT 1 NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    own_definition jsonb,
    set_up_together text,
    minutes integer,
    working_step integer,
    rule_set text DEFAULT 'witnessmark-1'::text NOT NULL,
    CONSTRAINT sheets_left_out_reason_check CHECK ((left_out_reason = ANY (ARRAY['not-applicable'::text, 'not-agreed'::text, 'not-possible'::text, 'not-touched'::text]))),
    CONSTRAINT sheets_minutes_check CHECK ((minutes > 0))
);

ALTER TABLE ONLY public.sheets FORCE ROW LEVEL SECURITY;

CREATE TABLE public.signatures (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    report_id uuid NOT NULL,
    role text NOT NULL,
    outcome text NOT NULL,
    name text NOT NULL,
    function_title text,
    company text,
    place text,
    typed text,
    strokes jsonb,
    reason text,
    intent_text text NOT NULL,
    intent_language text NOT NULL,
    model_sha256 text NOT NULL,
    method text NOT NULL,
    witness text,
    account_id uuid,
    ip text NOT NULL,
    user_agent text NOT NULL,
    device_time_zone text,
    signed_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT signatures_check CHECK (((outcome <> 'refuse'::text) OR (reason <> ''::text))),
    CONSTRAINT signatures_method_check CHECK ((method = ANY (ARRAY['on-tablet'::text, 'signed-in'::text, 'signing-link'::text]))),
    CONSTRAINT signatures_name_check CHECK ((name <> ''::text)),
    CONSTRAINT signatures_outcome_check CHECK ((outcome = ANY (ARRAY['measured'::text, 'checked'::text, 'accept'::text, 'accept-with-remarks'::text, 'refuse'::text]))),
    CONSTRAINT signatures_role_check CHECK ((role = ANY (ARRAY['inspector'::text, 'reviewer'::text, 'customer'::text])))
);

ALTER TABLE ONLY public.signatures FORCE ROW LEVEL SECURITY;

CREATE TABLE public.throttles (
    key text NOT NULL,
    allowance double precision NOT NULL,
    updated_at timestamp with time zone DEFAULT now() NOT NULL
);

CREATE TABLE public.tolerance_values (
    organisation_id uuid NOT NULL,
    id uuid NOT NULL,
    sequence bigint NOT NULL,
    code text NOT NULL,
    edition text NOT NULL,
    definition_id text NOT NULL,
    version integer NOT NULL,
    cell text NOT NULL,
    state text NOT NULL,
    figure numeric,
    unit text NOT NULL,
    of_edition text NOT NULL,
    clause text NOT NULL,
    remark text,
    account_id uuid NOT NULL,
    account_name text NOT NULL,
    recorded_at timestamp with time zone DEFAULT now() NOT NULL,
    needs_second boolean NOT NULL,
    second_account_id uuid,
    second_account_name text,
    second_at timestamp with time zone,
    CONSTRAINT tolerance_values_check CHECK (((state = 'withdrawn'::text) = (figure IS NULL))),
    CONSTRAINT tolerance_values_check1 CHECK (((state = 'withdrawn'::text) OR ((of_edition <> ''::text) AND (clause <> ''::text)))),
    CONSTRAINT tolerance_values_check2 CHECK (((second_account_id IS NULL) OR (needs_second AND (second_account_id <> account_id)))),
    CONSTRAINT tolerance_values_check3 CHECK ((((second_account_id IS NULL) = (second_at IS NULL)) AND ((second_account_id IS NULL) = (second_account_name IS NULL)))),
    CONSTRAINT tolerance_values_figure_check CHECK ((figure > (0)::numeric)),
    CONSTRAINT tolerance_values_state_check CHECK ((state = ANY (ARRAY['confirmed'::text, 'replaced'::text, 'withdrawn'::text]))),
    CONSTRAINT tolerance_values_unit_check CHECK ((unit = ANY (ARRAY['µm'::text, 'µm/m'::text, '″'::text])))
);

ALTER TABLE ONLY public.tolerance_values FORCE ROW LEVEL SECURITY;

ALTER TABLE public.tolerance_values ALTER COLUMN sequence ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.tolerance_values_sequence_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

ALTER TABLE ONLY public.access_tokens
    ADD CONSTRAINT access_tokens_pkey PRIMARY KEY (token_hash);

ALTER TABLE ONLY public.accounts
    ADD CONSTRAINT accounts_email_key UNIQUE (email);

ALTER TABLE ONLY public.accounts
    ADD CONSTRAINT accounts_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.audit_events
    ADD CONSTRAINT audit_events_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.calibrations
    ADD CONSTRAINT calibrations_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.customers
    ADD CONSTRAINT customers_organisation_id_name_key UNIQUE (organisation_id, name);

ALTER TABLE ONLY public.customers
    ADD CONSTRAINT customers_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.files
    ADD CONSTRAINT files_organisation_id_key_key UNIQUE (organisation_id, key);

ALTER TABLE ONLY public.files
    ADD CONSTRAINT files_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.idempotency_keys
    ADD CONSTRAINT idempotency_keys_organisation_id_account_id_key_key UNIQUE (organisation_id, account_id, key);

ALTER TABLE ONLY public.idempotency_keys
    ADD CONSTRAINT idempotency_keys_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.instruments
    ADD CONSTRAINT instruments_organisation_id_number_key UNIQUE (organisation_id, number);

ALTER TABLE ONLY public.instruments
    ADD CONSTRAINT instruments_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.invitations
    ADD CONSTRAINT invitations_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.job_exclusions
    ADD CONSTRAINT job_exclusions_organisation_id_job_id_key_key UNIQUE (organisation_id, job_id, key);

ALTER TABLE ONLY public.job_exclusions
    ADD CONSTRAINT job_exclusions_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.job_people
    ADD CONSTRAINT job_people_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.job_temperatures
    ADD CONSTRAINT job_temperatures_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.jobs
    ADD CONSTRAINT jobs_organisation_id_reference_key UNIQUE (organisation_id, reference);

ALTER TABLE ONLY public.jobs
    ADD CONSTRAINT jobs_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.machine_owners
    ADD CONSTRAINT machine_owners_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.machines
    ADD CONSTRAINT machines_organisation_id_manufacturer_serial_number_key UNIQUE (organisation_id, manufacturer, serial_number);

ALTER TABLE ONLY public.machines
    ADD CONSTRAINT machines_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.memberships
    ADD CONSTRAINT memberships_organisation_id_account_id_key UNIQUE (organisation_id, account_id);

ALTER TABLE ONLY public.memberships
    ADD CONSTRAINT memberships_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.organisations
    ADD CONSTRAINT organisations_pkey PRIMARY KEY (organisation_id);

ALTER TABLE ONLY public.outbox
    ADD CONSTRAINT outbox_organisation_id_message_id_key UNIQUE (organisation_id, message_id);

ALTER TABLE ONLY public.outbox
    ADD CONSTRAINT outbox_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.own_definitions
    ADD CONSTRAINT own_definitions_organisation_id_definition_id_version_withd_key UNIQUE (organisation_id, definition_id, version, withdrawn);

ALTER TABLE ONLY public.own_definitions
    ADD CONSTRAINT own_definitions_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.pass_instruments
    ADD CONSTRAINT pass_instruments_organisation_id_pass_id_instrument_id_key UNIQUE (organisation_id, pass_id, instrument_id);

ALTER TABLE ONLY public.pass_instruments
    ADD CONSTRAINT pass_instruments_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.pass_results
    ADD CONSTRAINT pass_results_organisation_id_pass_id_key UNIQUE (organisation_id, pass_id);

ALTER TABLE ONLY public.pass_results
    ADD CONSTRAINT pass_results_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.passes
    ADD CONSTRAINT passes_organisation_id_sheet_id_kind_number_key UNIQUE (organisation_id, sheet_id, kind, number);

ALTER TABLE ONLY public.passes
    ADD CONSTRAINT passes_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.plan_templates
    ADD CONSTRAINT plan_templates_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.reading_operations
    ADD CONSTRAINT reading_operations_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.readings
    ADD CONSTRAINT readings_organisation_id_pass_id_pointer_key UNIQUE (organisation_id, pass_id, pointer);

ALTER TABLE ONLY public.readings
    ADD CONSTRAINT readings_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.remarks
    ADD CONSTRAINT remarks_organisation_id_job_id_number_key UNIQUE (organisation_id, job_id, number);

ALTER TABLE ONLY public.remarks
    ADD CONSTRAINT remarks_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.report_counters
    ADD CONSTRAINT report_counters_organisation_id_year_key UNIQUE (organisation_id, year);

ALTER TABLE ONLY public.report_counters
    ADD CONSTRAINT report_counters_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.reports
    ADD CONSTRAINT reports_organisation_id_number_revision_key UNIQUE (organisation_id, number, revision);

ALTER TABLE ONLY public.reports
    ADD CONSTRAINT reports_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.sheet_photos
    ADD CONSTRAINT sheet_photos_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.sheets
    ADD CONSTRAINT sheets_organisation_id_job_id_key_key UNIQUE (organisation_id, job_id, key);

ALTER TABLE ONLY public.sheets
    ADD CONSTRAINT sheets_organisation_id_job_id_position_key UNIQUE (organisation_id, job_id, "position") DEFERRABLE INITIALLY DEFERRED;

ALTER TABLE ONLY public.sheets
    ADD CONSTRAINT sheets_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.signatures
    ADD CONSTRAINT signatures_organisation_id_report_id_role_key UNIQUE (organisation_id, report_id, role);

ALTER TABLE ONLY public.signatures
    ADD CONSTRAINT signatures_pkey PRIMARY KEY (organisation_id, id);

ALTER TABLE ONLY public.throttles
    ADD CONSTRAINT throttles_pkey PRIMARY KEY (key);

ALTER TABLE ONLY public.tolerance_values
    ADD CONSTRAINT tolerance_values_pkey PRIMARY KEY (organisation_id, id);

CREATE INDEX jobs_machine ON public.jobs USING btree (organisation_id, machine_id);

CREATE UNIQUE INDEX machine_owners_current ON public.machine_owners USING btree (organisation_id, machine_id) WHERE (until_date IS NULL);

CREATE INDEX machine_owners_customer ON public.machine_owners USING btree (organisation_id, customer_id);

CREATE INDEX machines_serial_folded ON public.machines USING btree (organisation_id, serial_folded text_pattern_ops);

CREATE INDEX own_definitions_newest ON public.own_definitions USING btree (organisation_id, definition_id, sequence DESC);

CREATE INDEX passes_newest ON public.passes USING btree (organisation_id, taken_at DESC) WHERE ((taken_at IS NOT NULL) AND (linked_to IS NULL));

CREATE UNIQUE INDEX plan_templates_name ON public.plan_templates USING btree (organisation_id, lower(manufacturer), lower(model), lower(name));

CREATE INDEX reading_operations_pass ON public.reading_operations USING btree (organisation_id, pass_id, sequence);

CREATE INDEX reports_job ON public.reports USING btree (organisation_id, job_id);

CREATE INDEX sheet_photos_sheet ON public.sheet_photos USING btree (organisation_id, sheet_id);

CREATE INDEX tolerance_values_cell ON public.tolerance_values USING btree (organisation_id, code, edition, definition_id, version, cell, sequence DESC);

CREATE TRIGGER reports_frozen BEFORE UPDATE ON public.reports FOR EACH ROW EXECUTE FUNCTION public.reports_are_frozen();

CREATE TRIGGER tolerance_values_kept BEFORE UPDATE ON public.tolerance_values FOR EACH ROW EXECUTE FUNCTION public.tolerance_values_are_kept();

ALTER TABLE ONLY public.access_tokens
    ADD CONSTRAINT access_tokens_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.audit_events
    ADD CONSTRAINT audit_events_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.calibrations
    ADD CONSTRAINT calibrations_organisation_id_file_id_fkey FOREIGN KEY (organisation_id, file_id) REFERENCES public.files(organisation_id, id);

ALTER TABLE ONLY public.calibrations
    ADD CONSTRAINT calibrations_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.calibrations
    ADD CONSTRAINT calibrations_organisation_id_instrument_id_fkey FOREIGN KEY (organisation_id, instrument_id) REFERENCES public.instruments(organisation_id, id);

ALTER TABLE ONLY public.customers
    ADD CONSTRAINT customers_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.files
    ADD CONSTRAINT files_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.idempotency_keys
    ADD CONSTRAINT idempotency_keys_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.instruments
    ADD CONSTRAINT instruments_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.invitations
    ADD CONSTRAINT invitations_organisation_id_customer_id_fkey FOREIGN KEY (organisation_id, customer_id) REFERENCES public.customers(organisation_id, id);

ALTER TABLE ONLY public.invitations
    ADD CONSTRAINT invitations_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.job_exclusions
    ADD CONSTRAINT job_exclusions_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.job_exclusions
    ADD CONSTRAINT job_exclusions_organisation_id_job_id_fkey FOREIGN KEY (organisation_id, job_id) REFERENCES public.jobs(organisation_id, id);

ALTER TABLE ONLY public.job_people
    ADD CONSTRAINT job_people_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.job_people
    ADD CONSTRAINT job_people_organisation_id_job_id_fkey FOREIGN KEY (organisation_id, job_id) REFERENCES public.jobs(organisation_id, id);

ALTER TABLE ONLY public.job_people
    ADD CONSTRAINT job_people_organisation_id_membership_id_fkey FOREIGN KEY (organisation_id, membership_id) REFERENCES public.memberships(organisation_id, id);

ALTER TABLE ONLY public.job_temperatures
    ADD CONSTRAINT job_temperatures_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.job_temperatures
    ADD CONSTRAINT job_temperatures_organisation_id_job_id_fkey FOREIGN KEY (organisation_id, job_id) REFERENCES public.jobs(organisation_id, id);

ALTER TABLE ONLY public.jobs
    ADD CONSTRAINT jobs_organisation_id_customer_id_fkey FOREIGN KEY (organisation_id, customer_id) REFERENCES public.customers(organisation_id, id);

ALTER TABLE ONLY public.jobs
    ADD CONSTRAINT jobs_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.jobs
    ADD CONSTRAINT jobs_organisation_id_machine_id_fkey FOREIGN KEY (organisation_id, machine_id) REFERENCES public.machines(organisation_id, id);

ALTER TABLE ONLY public.machine_owners
    ADD CONSTRAINT machine_owners_organisation_id_customer_id_fkey FOREIGN KEY (organisation_id, customer_id) REFERENCES public.customers(organisation_id, id);

ALTER TABLE ONLY public.machine_owners
    ADD CONSTRAINT machine_owners_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.machine_owners
    ADD CONSTRAINT machine_owners_organisation_id_machine_id_fkey FOREIGN KEY (organisation_id, machine_id) REFERENCES public.machines(organisation_id, id);

ALTER TABLE ONLY public.machines
    ADD CONSTRAINT machines_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.machines
    ADD CONSTRAINT machines_organisation_id_nameplate_file_id_fkey FOREIGN KEY (organisation_id, nameplate_file_id) REFERENCES public.files(organisation_id, id);

ALTER TABLE ONLY public.memberships
    ADD CONSTRAINT memberships_account_id_fkey FOREIGN KEY (account_id) REFERENCES public.accounts(id);

ALTER TABLE ONLY public.memberships
    ADD CONSTRAINT memberships_organisation_id_customer_id_fkey FOREIGN KEY (organisation_id, customer_id) REFERENCES public.customers(organisation_id, id);

ALTER TABLE ONLY public.memberships
    ADD CONSTRAINT memberships_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.outbox
    ADD CONSTRAINT outbox_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.own_definitions
    ADD CONSTRAINT own_definitions_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.pass_instruments
    ADD CONSTRAINT pass_instruments_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.pass_instruments
    ADD CONSTRAINT pass_instruments_organisation_id_instrument_id_fkey FOREIGN KEY (organisation_id, instrument_id) REFERENCES public.instruments(organisation_id, id);

ALTER TABLE ONLY public.pass_instruments
    ADD CONSTRAINT pass_instruments_organisation_id_pass_id_fkey FOREIGN KEY (organisation_id, pass_id) REFERENCES public.passes(organisation_id, id);

ALTER TABLE ONLY public.pass_results
    ADD CONSTRAINT pass_results_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.pass_results
    ADD CONSTRAINT pass_results_organisation_id_pass_id_fkey FOREIGN KEY (organisation_id, pass_id) REFERENCES public.passes(organisation_id, id);

ALTER TABLE ONLY public.passes
    ADD CONSTRAINT passes_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.passes
    ADD CONSTRAINT passes_organisation_id_linked_to_fkey FOREIGN KEY (organisation_id, linked_to) REFERENCES public.passes(organisation_id, id);

ALTER TABLE ONLY public.passes
    ADD CONSTRAINT passes_organisation_id_sheet_id_fkey FOREIGN KEY (organisation_id, sheet_id) REFERENCES public.sheets(organisation_id, id);

ALTER TABLE ONLY public.plan_templates
    ADD CONSTRAINT plan_templates_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.plan_templates
    ADD CONSTRAINT plan_templates_organisation_id_from_job_id_fkey FOREIGN KEY (organisation_id, from_job_id) REFERENCES public.jobs(organisation_id, id);

ALTER TABLE ONLY public.reading_operations
    ADD CONSTRAINT reading_operations_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.reading_operations
    ADD CONSTRAINT reading_operations_organisation_id_pass_id_fkey FOREIGN KEY (organisation_id, pass_id) REFERENCES public.passes(organisation_id, id);

ALTER TABLE ONLY public.readings
    ADD CONSTRAINT readings_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.readings
    ADD CONSTRAINT readings_organisation_id_pass_id_fkey FOREIGN KEY (organisation_id, pass_id) REFERENCES public.passes(organisation_id, id);

ALTER TABLE ONLY public.remarks
    ADD CONSTRAINT remarks_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.remarks
    ADD CONSTRAINT remarks_organisation_id_job_id_fkey FOREIGN KEY (organisation_id, job_id) REFERENCES public.jobs(organisation_id, id);

ALTER TABLE ONLY public.remarks
    ADD CONSTRAINT remarks_organisation_id_report_id_fkey FOREIGN KEY (organisation_id, report_id) REFERENCES public.reports(organisation_id, id);

ALTER TABLE ONLY public.remarks
    ADD CONSTRAINT remarks_organisation_id_sheet_id_fkey FOREIGN KEY (organisation_id, sheet_id) REFERENCES public.sheets(organisation_id, id);

ALTER TABLE ONLY public.report_counters
    ADD CONSTRAINT report_counters_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.reports
    ADD CONSTRAINT reports_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.reports
    ADD CONSTRAINT reports_organisation_id_job_id_fkey FOREIGN KEY (organisation_id, job_id) REFERENCES public.jobs(organisation_id, id);

ALTER TABLE ONLY public.reports
    ADD CONSTRAINT reports_organisation_id_pdf_file_id_fkey FOREIGN KEY (organisation_id, pdf_file_id) REFERENCES public.files(organisation_id, id);

ALTER TABLE ONLY public.reports
    ADD CONSTRAINT reports_organisation_id_signed_pdf_file_id_fkey FOREIGN KEY (organisation_id, signed_pdf_file_id) REFERENCES public.files(organisation_id, id);

ALTER TABLE ONLY public.sheet_photos
    ADD CONSTRAINT sheet_photos_organisation_id_file_id_fkey FOREIGN KEY (organisation_id, file_id) REFERENCES public.files(organisation_id, id);

ALTER TABLE ONLY public.sheet_photos
    ADD CONSTRAINT sheet_photos_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.sheet_photos
    ADD CONSTRAINT sheet_photos_organisation_id_sheet_id_fkey FOREIGN KEY (organisation_id, sheet_id) REFERENCES public.sheets(organisation_id, id);

ALTER TABLE ONLY public.sheets
    ADD CONSTRAINT sheets_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.sheets
    ADD CONSTRAINT sheets_organisation_id_job_id_fkey FOREIGN KEY (organisation_id, job_id) REFERENCES public.jobs(organisation_id, id);

ALTER TABLE ONLY public.signatures
    ADD CONSTRAINT signatures_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE ONLY public.signatures
    ADD CONSTRAINT signatures_organisation_id_report_id_fkey FOREIGN KEY (organisation_id, report_id) REFERENCES public.reports(organisation_id, id);

ALTER TABLE ONLY public.tolerance_values
    ADD CONSTRAINT tolerance_values_organisation_id_fkey FOREIGN KEY (organisation_id) REFERENCES public.organisations(organisation_id);

ALTER TABLE public.audit_events ENABLE ROW LEVEL SECURITY;

CREATE POLICY audit_events_add ON public.audit_events FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR true)));

CREATE POLICY audit_events_change ON public.audit_events FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY audit_events_read ON public.audit_events FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY audit_events_remove ON public.audit_events FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.calibrations ENABLE ROW LEVEL SECURITY;

CREATE POLICY calibrations_add ON public.calibrations FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY calibrations_change ON public.calibrations FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY calibrations_read ON public.calibrations FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY calibrations_remove ON public.calibrations FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.customers ENABLE ROW LEVEL SECURITY;

CREATE POLICY customers_add ON public.customers FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY customers_change ON public.customers FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY customers_read ON public.customers FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR (id = ( SELECT public.app_customer() AS app_customer)))));

CREATE POLICY customers_remove ON public.customers FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.files ENABLE ROW LEVEL SECURITY;

CREATE POLICY files_add ON public.files FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY files_change ON public.files FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY files_read ON public.files FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR ((kind = 'report'::text) AND (EXISTS ( SELECT 1
   FROM public.reports r
  WHERE ((r.organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ((files.id = r.pdf_file_id) OR (files.id = r.signed_pdf_file_id)))))))));

CREATE POLICY files_remove ON public.files FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.idempotency_keys ENABLE ROW LEVEL SECURITY;

CREATE POLICY idempotency_keys_add ON public.idempotency_keys FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR (account_id = ( SELECT public.app_account() AS app_account)))));

CREATE POLICY idempotency_keys_change ON public.idempotency_keys FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY idempotency_keys_read ON public.idempotency_keys FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR (account_id = ( SELECT public.app_account() AS app_account)))));

CREATE POLICY idempotency_keys_remove ON public.idempotency_keys FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.instruments ENABLE ROW LEVEL SECURITY;

CREATE POLICY instruments_add ON public.instruments FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY instruments_change ON public.instruments FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY instruments_read ON public.instruments FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY instruments_remove ON public.instruments FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.invitations ENABLE ROW LEVEL SECURITY;

CREATE POLICY invitations_add ON public.invitations FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY invitations_change ON public.invitations FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY invitations_read ON public.invitations FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY invitations_remove ON public.invitations FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.job_exclusions ENABLE ROW LEVEL SECURITY;

CREATE POLICY job_exclusions_add ON public.job_exclusions FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY job_exclusions_change ON public.job_exclusions FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY job_exclusions_read ON public.job_exclusions FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY job_exclusions_remove ON public.job_exclusions FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.job_people ENABLE ROW LEVEL SECURITY;

CREATE POLICY job_people_add ON public.job_people FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY job_people_change ON public.job_people FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY job_people_read ON public.job_people FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY job_people_remove ON public.job_people FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.job_temperatures ENABLE ROW LEVEL SECURITY;

CREATE POLICY job_temperatures_add ON public.job_temperatures FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY job_temperatures_change ON public.job_temperatures FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY job_temperatures_read ON public.job_temperatures FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY job_temperatures_remove ON public.job_temperatures FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.jobs ENABLE ROW LEVEL SECURITY;

CREATE POLICY jobs_add ON public.jobs FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY jobs_change ON public.jobs FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY jobs_read ON public.jobs FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR ((customer_id = ( SELECT public.app_customer() AS app_customer)) OR (EXISTS ( SELECT 1
   FROM public.machine_owners o
  WHERE ((o.organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (o.machine_id = jobs.machine_id) AND (o.customer_id = ( SELECT public.app_customer() AS app_customer)) AND (o.until_date IS NULL) AND o.sees_history)))))));

CREATE POLICY jobs_remove ON public.jobs FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.machine_owners ENABLE ROW LEVEL SECURITY;

CREATE POLICY machine_owners_add ON public.machine_owners FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY machine_owners_change ON public.machine_owners FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY machine_owners_read ON public.machine_owners FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR (customer_id = ( SELECT public.app_customer() AS app_customer)))));

CREATE POLICY machine_owners_remove ON public.machine_owners FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.machines ENABLE ROW LEVEL SECURITY;

CREATE POLICY machines_add ON public.machines FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY machines_change ON public.machines FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY machines_read ON public.machines FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR (EXISTS ( SELECT 1
   FROM public.machine_owners o
  WHERE ((o.organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (o.machine_id = machines.id) AND (o.customer_id = ( SELECT public.app_customer() AS app_customer))))))));

CREATE POLICY machines_remove ON public.machines FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.memberships ENABLE ROW LEVEL SECURITY;

CREATE POLICY memberships_add ON public.memberships FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY memberships_change ON public.memberships FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY memberships_owner_lookup ON public.memberships FOR SELECT TO witnessmark_owner USING (true);

CREATE POLICY memberships_read ON public.memberships FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR (account_id = ( SELECT public.app_account() AS app_account)))));

CREATE POLICY memberships_remove ON public.memberships FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.organisations ENABLE ROW LEVEL SECURITY;

CREATE POLICY organisations_add ON public.organisations FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY organisations_change ON public.organisations FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY organisations_owner_lookup ON public.organisations TO witnessmark_owner USING (true) WITH CHECK (true);

CREATE POLICY organisations_read ON public.organisations FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR (( SELECT public.app_customer() AS app_customer) IS NOT NULL))));

CREATE POLICY organisations_remove ON public.organisations FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.outbox ENABLE ROW LEVEL SECURITY;

CREATE POLICY outbox_add ON public.outbox FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR true)));

CREATE POLICY outbox_change ON public.outbox FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY outbox_read ON public.outbox FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY outbox_remove ON public.outbox FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.own_definitions ENABLE ROW LEVEL SECURITY;

CREATE POLICY own_definitions_add ON public.own_definitions FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY own_definitions_change ON public.own_definitions FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY own_definitions_read ON public.own_definitions FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR (( SELECT public.app_customer() AS app_customer) IS NOT NULL))));

CREATE POLICY own_definitions_remove ON public.own_definitions FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.pass_instruments ENABLE ROW LEVEL SECURITY;

CREATE POLICY pass_instruments_add ON public.pass_instruments FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY pass_instruments_change ON public.pass_instruments FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY pass_instruments_read ON public.pass_instruments FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY pass_instruments_remove ON public.pass_instruments FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.pass_results ENABLE ROW LEVEL SECURITY;

CREATE POLICY pass_results_add ON public.pass_results FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY pass_results_change ON public.pass_results FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY pass_results_read ON public.pass_results FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY pass_results_remove ON public.pass_results FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.passes ENABLE ROW LEVEL SECURITY;

CREATE POLICY passes_add ON public.passes FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY passes_change ON public.passes FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY passes_read ON public.passes FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY passes_remove ON public.passes FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.plan_templates ENABLE ROW LEVEL SECURITY;

CREATE POLICY plan_templates_add ON public.plan_templates FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY plan_templates_change ON public.plan_templates FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY plan_templates_read ON public.plan_templates FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY plan_templates_remove ON public.plan_templates FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.reading_operations ENABLE ROW LEVEL SECURITY;

CREATE POLICY reading_operations_add ON public.reading_operations FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY reading_operations_change ON public.reading_operations FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY reading_operations_read ON public.reading_operations FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY reading_operations_remove ON public.reading_operations FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.readings ENABLE ROW LEVEL SECURITY;

CREATE POLICY readings_add ON public.readings FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY readings_change ON public.readings FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY readings_read ON public.readings FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY readings_remove ON public.readings FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.remarks ENABLE ROW LEVEL SECURITY;

CREATE POLICY remarks_add ON public.remarks FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR ((report_id IS NOT NULL) AND (EXISTS ( SELECT 1
   FROM public.reports r
  WHERE ((r.organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (r.id = remarks.report_id))))))));

CREATE POLICY remarks_change ON public.remarks FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY remarks_read ON public.remarks FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR (EXISTS ( SELECT 1
   FROM public.jobs j
  WHERE ((j.organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (j.id = remarks.job_id)))))));

CREATE POLICY remarks_remove ON public.remarks FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.report_counters ENABLE ROW LEVEL SECURITY;

CREATE POLICY report_counters_add ON public.report_counters FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY report_counters_change ON public.report_counters FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY report_counters_read ON public.report_counters FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY report_counters_remove ON public.report_counters FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.reports ENABLE ROW LEVEL SECURITY;

CREATE POLICY reports_add ON public.reports FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY reports_change ON public.reports FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY reports_customer_signs ON public.reports FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (state = 'issued'::text) AND (EXISTS ( SELECT 1
   FROM public.jobs j
  WHERE ((j.organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (j.id = reports.job_id)))))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (state = ANY (ARRAY['signed'::text, 'signed-with-remarks'::text, 'refused'::text]))));

CREATE POLICY reports_read ON public.reports FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR ((state = ANY (ARRAY['issued'::text, 'signed'::text, 'signed-with-remarks'::text, 'refused'::text, 'superseded'::text])) AND (EXISTS ( SELECT 1
   FROM public.jobs j
  WHERE ((j.organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (j.id = reports.job_id))))))));

CREATE POLICY reports_remove ON public.reports FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.sheet_photos ENABLE ROW LEVEL SECURITY;

CREATE POLICY sheet_photos_add ON public.sheet_photos FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY sheet_photos_change ON public.sheet_photos FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY sheet_photos_read ON public.sheet_photos FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY sheet_photos_remove ON public.sheet_photos FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.sheets ENABLE ROW LEVEL SECURITY;

CREATE POLICY sheets_add ON public.sheets FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY sheets_change ON public.sheets FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY sheets_read ON public.sheets FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY sheets_remove ON public.sheets FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.signatures ENABLE ROW LEVEL SECURITY;

CREATE POLICY signatures_add ON public.signatures FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR ((role = 'customer'::text) AND (account_id = ( SELECT public.app_account() AS app_account)) AND (EXISTS ( SELECT 1
   FROM public.reports r
  WHERE ((r.organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (r.id = signatures.report_id))))))));

CREATE POLICY signatures_change ON public.signatures FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY signatures_read ON public.signatures FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR (EXISTS ( SELECT 1
   FROM public.reports r
  WHERE ((r.organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (r.id = signatures.report_id)))))));

CREATE POLICY signatures_remove ON public.signatures FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

ALTER TABLE public.tolerance_values ENABLE ROW LEVEL SECURITY;

CREATE POLICY tolerance_values_add ON public.tolerance_values FOR INSERT WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR false)));

CREATE POLICY tolerance_values_change ON public.tolerance_values FOR UPDATE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff))) WITH CHECK (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

CREATE POLICY tolerance_values_read ON public.tolerance_values FOR SELECT USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND (( SELECT public.app_is_staff() AS app_is_staff) OR (( SELECT public.app_customer() AS app_customer) IS NOT NULL))));

CREATE POLICY tolerance_values_remove ON public.tolerance_values FOR DELETE USING (((organisation_id = ( SELECT public.app_organisation() AS app_organisation)) AND ( SELECT public.app_is_staff() AS app_is_staff)));

GRANT USAGE ON SCHEMA public TO witnessmark_app;

REVOKE ALL ON FUNCTION public.access_token_create(hash text, token_purpose text, subject uuid, expires timestamp with time zone) FROM PUBLIC;
GRANT ALL ON FUNCTION public.access_token_create(hash text, token_purpose text, subject uuid, expires timestamp with time zone) TO witnessmark_app;

REVOKE ALL ON FUNCTION public.access_token_find(hash text) FROM PUBLIC;
GRANT ALL ON FUNCTION public.access_token_find(hash text) TO witnessmark_app;

REVOKE ALL ON FUNCTION public.access_token_use(hash text) FROM PUBLIC;
GRANT ALL ON FUNCTION public.access_token_use(hash text) TO witnessmark_app;

REVOKE ALL ON FUNCTION public.account_by_email(wanted text) FROM PUBLIC;
GRANT ALL ON FUNCTION public.account_by_email(wanted text) TO witnessmark_app;

REVOKE ALL ON FUNCTION public.account_create(new_id uuid, new_email text, new_name text, hash text) FROM PUBLIC;
GRANT ALL ON FUNCTION public.account_create(new_id uuid, new_email text, new_name text, hash text) TO witnessmark_app;

REVOKE ALL ON FUNCTION public.account_end_sessions(account uuid) FROM PUBLIC;
GRANT ALL ON FUNCTION public.account_end_sessions(account uuid) TO witnessmark_app;

REVOKE ALL ON FUNCTION public.account_memberships(account uuid) FROM PUBLIC;
GRANT ALL ON FUNCTION public.account_memberships(account uuid) TO witnessmark_app;

REVOKE ALL ON FUNCTION public.account_session(account uuid, organisation uuid) FROM PUBLIC;
GRANT ALL ON FUNCTION public.account_session(account uuid, organisation uuid) TO witnessmark_app;

REVOKE ALL ON FUNCTION public.account_set_password(account uuid, hash text) FROM PUBLIC;
GRANT ALL ON FUNCTION public.account_set_password(account uuid, hash text) TO witnessmark_app;

REVOKE ALL ON FUNCTION public.app_account() FROM PUBLIC;
GRANT ALL ON FUNCTION public.app_account() TO witnessmark_app;

REVOKE ALL ON FUNCTION public.app_customer() FROM PUBLIC;
GRANT ALL ON FUNCTION public.app_customer() TO witnessmark_app;

REVOKE ALL ON FUNCTION public.app_is_staff() FROM PUBLIC;
GRANT ALL ON FUNCTION public.app_is_staff() TO witnessmark_app;

REVOKE ALL ON FUNCTION public.app_organisation() FROM PUBLIC;
GRANT ALL ON FUNCTION public.app_organisation() TO witnessmark_app;

REVOKE ALL ON FUNCTION public.enqueue(task text, payload jsonb, job_key text) FROM PUBLIC;
GRANT ALL ON FUNCTION public.enqueue(task text, payload jsonb, job_key text) TO witnessmark_app;

REVOKE ALL ON FUNCTION public.first_organisation_create(organisation uuid, organisation_name text, organisation_code text, zone text) FROM PUBLIC;
GRANT ALL ON FUNCTION public.first_organisation_create(organisation uuid, organisation_name text, organisation_code text, zone text) TO witnessmark_app;

REVOKE ALL ON FUNCTION public.first_organisation_needed() FROM PUBLIC;
GRANT ALL ON FUNCTION public.first_organisation_needed() TO witnessmark_app;

REVOKE ALL ON FUNCTION public.reports_are_frozen() FROM PUBLIC;
GRANT ALL ON FUNCTION public.reports_are_frozen() TO witnessmark_app;

REVOKE ALL ON FUNCTION public.throttle_clear(bucket text) FROM PUBLIC;
GRANT ALL ON FUNCTION public.throttle_clear(bucket text) TO witnessmark_app;

REVOKE ALL ON FUNCTION public.throttle_take(bucket text, capacity double precision, refill_per_second double precision) FROM PUBLIC;
GRANT ALL ON FUNCTION public.throttle_take(bucket text, capacity double precision, refill_per_second double precision) TO witnessmark_app;

GRANT SELECT,INSERT ON TABLE public.audit_events TO witnessmark_app;

GRANT SELECT,INSERT ON TABLE public.calibrations TO witnessmark_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.customers TO witnessmark_app;

GRANT SELECT,INSERT ON TABLE public.files TO witnessmark_app;

GRANT SELECT,INSERT ON TABLE public.idempotency_keys TO witnessmark_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.instruments TO witnessmark_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.invitations TO witnessmark_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.job_exclusions TO witnessmark_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.job_people TO witnessmark_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.job_temperatures TO witnessmark_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.jobs TO witnessmark_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.machine_owners TO witnessmark_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.machines TO witnessmark_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.memberships TO witnessmark_app;

GRANT SELECT,UPDATE ON TABLE public.organisations TO witnessmark_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.outbox TO witnessmark_app;

GRANT SELECT,INSERT ON TABLE public.own_definitions TO witnessmark_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.pass_instruments TO witnessmark_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.pass_results TO witnessmark_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.passes TO witnessmark_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.plan_templates TO witnessmark_app;

GRANT SELECT,INSERT ON TABLE public.reading_operations TO witnessmark_app;

GRANT SELECT,INSERT,UPDATE ON TABLE public.readings TO witnessmark_app;

GRANT SELECT,INSERT,UPDATE ON TABLE public.remarks TO witnessmark_app;

GRANT SELECT,INSERT,UPDATE ON TABLE public.report_counters TO witnessmark_app;

GRANT SELECT,INSERT,UPDATE ON TABLE public.reports TO witnessmark_app;

GRANT SELECT,INSERT,UPDATE ON TABLE public.sheet_photos TO witnessmark_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.sheets TO witnessmark_app;

GRANT SELECT,INSERT ON TABLE public.signatures TO witnessmark_app;

GRANT SELECT,INSERT ON TABLE public.tolerance_values TO witnessmark_app;

GRANT UPDATE(second_account_id) ON TABLE public.tolerance_values TO witnessmark_app;

GRANT UPDATE(second_account_name) ON TABLE public.tolerance_values TO witnessmark_app;

GRANT UPDATE(second_at) ON TABLE public.tolerance_values TO witnessmark_app;
