import type { Knex } from 'knex';
import { createTenantTable, dropTables, secureTenantTable } from '@/db/tenant-table';

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    revoke create on schema public from public;
    grant usage on schema public to witnessmark_app;

    -- Without the setting these fail: no request sees rows because somebody forgot to say whose.
    create function app_organisation() returns uuid language sql stable
      as $$ select current_setting('app.organisation')::uuid $$;
    create function app_is_staff() returns boolean language sql stable
      as $$ select case current_setting('app.customer') when 'staff' then true else current_setting('app.customer')::uuid is null end $$;
    create function app_customer() returns uuid language sql stable
      as $$ select case current_setting('app.customer') when 'staff' then null else current_setting('app.customer')::uuid end $$;
    create function app_account() returns uuid language sql stable
      as $$ select current_setting('app.account')::uuid $$;

    create table organisations (
      organisation_id uuid primary key,
      name text not null,
      code text not null,
      address_lines text[] not null default '{}',
      contact text,
      time_zone text not null default 'UTC',
      paper text not null default 'A4' check (paper in ('A4', 'Letter')),
      set_up_done boolean not null default false,
      version integer not null default 1,
      created_at timestamptz not null default now()
    );

    create table accounts (
      id uuid primary key,
      email text not null unique check (email = lower(email)),
      name text not null,
      password_hash text,
      session_version integer not null default 1,
      disabled_at timestamptz,
      created_at timestamptz not null default now()
    );

    create table access_tokens (
      token_hash text primary key,
      organisation_id uuid not null references organisations (organisation_id),
      purpose text not null check (purpose in ('invitation', 'signing')),
      subject_id uuid not null,
      expires_at timestamptz not null,
      used_at timestamptz
    );

    create table throttles (
      key text primary key,
      allowance double precision not null,
      updated_at timestamptz not null default now()
    );`);

  await secureTenantTable(knex, {
    name: 'organisations',
    customerReads: '(select app_customer()) is not null',
    grants: 'select, update',
  });

  await createTenantTable(knex, {
    name: 'customers',
    columns: `
      name text not null,
      address_lines text[] not null default '{}',
      contact text,
      email text,
      version integer not null default 1,
      created_at timestamptz not null default now(),
      unique (organisation_id, name)`,
    customerReads: 'id = (select app_customer())',
  });

  await createTenantTable(knex, {
    name: 'memberships',
    columns: `
      account_id uuid not null references accounts (id),
      name text not null,
      email text not null,
      function_title text,
      roles text[] not null check (cardinality(roles) > 0 and roles <@ array['administrator', 'reviewer', 'inspector', 'customer']),
      customer_id uuid,
      disabled_at timestamptz,
      version integer not null default 1,
      created_at timestamptz not null default now(),
      unique (organisation_id, account_id),
      foreign key (organisation_id, customer_id) references customers (organisation_id, id),
      check ((customer_id is not null) = (roles @> array['customer'])),
      check (not (roles @> array['customer']) or cardinality(roles) = 1)`,
    customerReads: 'account_id = (select app_account())',
  });

  await createTenantTable(knex, {
    name: 'invitations',
    columns: `
      email text not null,
      name text not null,
      roles text[] not null,
      customer_id uuid,
      invited_by uuid not null,
      expires_at timestamptz not null,
      accepted_at timestamptz,
      revoked_at timestamptz,
      created_at timestamptz not null default now(),
      foreign key (organisation_id, customer_id) references customers (organisation_id, id)`,
    customerReads: 'false',
  });

  // The named functions run as the owner, who is subject to row-level security too: let the owner look members up.
  await knex.raw(`
    create policy memberships_owner_lookup on memberships for select to current_user using (true);
    create policy organisations_owner_lookup on organisations for all to current_user using (true) with check (true);

    create function account_by_email(wanted text)
      returns table (id uuid, name text, password_hash text, session_version integer, disabled boolean)
      language sql stable security definer set search_path = public
      as $$ select a.id, a.name, a.password_hash, a.session_version, a.disabled_at is not null
              from accounts a where a.email = lower(wanted) $$;

    create function account_memberships(account uuid)
      returns table (organisation_id uuid, organisation_name text, roles text[])
      language sql stable security definer set search_path = public
      as $$ select m.organisation_id, o.name, m.roles
              from memberships m join organisations o using (organisation_id)
             where m.account_id = account and m.disabled_at is null order by m.created_at $$;

    create function account_session(account uuid, organisation uuid)
      returns table (account_name text, email text, session_version integer, account_disabled boolean,
                     membership_id uuid, member_name text, function_title text, roles text[], customer_id uuid,
                     member_disabled boolean, organisation_name text, organisation_code text, time_zone text, set_up_done boolean)
      language sql stable security definer set search_path = public
      as $$ select a.name, a.email, a.session_version, a.disabled_at is not null,
                   m.id, m.name, m.function_title, m.roles, m.customer_id, m.disabled_at is not null,
                   o.name, o.code, o.time_zone, o.set_up_done
              from accounts a
              join memberships m on m.account_id = a.id and m.organisation_id = organisation
              join organisations o on o.organisation_id = m.organisation_id
             where a.id = account $$;

    create function account_create(new_id uuid, new_email text, new_name text, hash text) returns uuid
      language sql security definer set search_path = public
      as $$ insert into accounts (id, email, name, password_hash) values (new_id, lower(new_email), new_name, hash)
            on conflict (email) do nothing returning id $$;

    create function account_set_password(account uuid, hash text) returns void
      language sql security definer set search_path = public
      as $$ update accounts set password_hash = hash, session_version = session_version + 1 where id = account $$;

    create function account_end_sessions(account uuid) returns void
      language sql security definer set search_path = public
      as $$ update accounts set session_version = session_version + 1 where id = account $$;

    create function access_token_create(hash text, token_purpose text, subject uuid, expires timestamptz) returns void
      language sql security definer set search_path = public
      as $$ insert into access_tokens (token_hash, organisation_id, purpose, subject_id, expires_at)
            values (hash, app_organisation(), token_purpose, subject, expires) $$;

    create function access_token_find(hash text)
      returns table (organisation_id uuid, purpose text, subject_id uuid, expires_at timestamptz, used_at timestamptz)
      language sql stable security definer set search_path = public
      as $$ select t.organisation_id, t.purpose, t.subject_id, t.expires_at, t.used_at from access_tokens t where t.token_hash = hash $$;

    create function access_token_use(hash text) returns boolean
      language sql security definer set search_path = public
      as $$ with used as (update access_tokens set used_at = now()
                           where token_hash = hash and used_at is null and expires_at > now() returning 1)
            select exists (select 1 from used) $$;

    -- Token bucket: answers the seconds to wait, 0 when the attempt is allowed. It survives a restart.
    create function throttle_take(bucket text, capacity double precision, refill_per_second double precision)
      returns double precision language plpgsql security definer set search_path = public
      as $$
      declare left_over double precision;
      begin
        insert into throttles (key, allowance) values (bucket, capacity) on conflict (key) do nothing;
        select least(capacity, allowance + extract(epoch from now() - updated_at) * refill_per_second)
          into left_over from throttles where key = bucket for update;
        if left_over < 1 then return (1 - left_over) / refill_per_second; end if;
        update throttles set allowance = left_over - 1, updated_at = now() where key = bucket;
        return 0;
      end $$;

    create function throttle_clear(bucket text) returns void
      language sql security definer set search_path = public
      as $$ delete from throttles where key = bucket $$;

    -- First start without the demo: possible exactly once, while there is no organisation.
    create function first_organisation_needed() returns boolean
      language sql stable security definer set search_path = public
      as $$ select not exists (select 1 from organisations) $$;

    create function first_organisation_create(organisation uuid, organisation_name text, organisation_code text, zone text)
      returns boolean language plpgsql security definer set search_path = public
      as $$
      begin
        lock table organisations in exclusive mode;
        if exists (select 1 from organisations) then return false; end if;
        insert into organisations (organisation_id, name, code, time_zone) values (organisation, organisation_name, organisation_code, zone);
        return true;
      end $$;

    revoke execute on all functions in schema public from public;
    grant execute on all functions in schema public to witnessmark_app;`);
}

export async function down(knex: Knex): Promise<void> {
  await dropTables(knex, [
    'invitations',
    'memberships',
    'customers',
    'throttles',
    'access_tokens',
    'accounts',
    'organisations',
  ]);
  await knex.raw(`
    drop function if exists account_by_email, account_memberships, account_session, account_create, account_set_password,
      account_end_sessions, access_token_create, access_token_find, access_token_use, throttle_take, throttle_clear,
      first_organisation_needed, first_organisation_create, app_organisation, app_is_staff, app_customer, app_account;
    revoke usage on schema public from witnessmark_app`);
}
