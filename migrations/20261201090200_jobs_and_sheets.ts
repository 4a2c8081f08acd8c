import type { Knex } from 'knex';
import { createTenantTable, dropTables } from '@/db/tenant-table';

/** A customer sees its own jobs, and those of a machine that it owns when the transfer granted the history. */
const jobVisible = `customer_id = (select app_customer()) or exists (select 1 from machine_owners o
  where o.organisation_id = (select app_organisation()) and o.machine_id = jobs.machine_id
    and o.customer_id = (select app_customer()) and o.until_date is null and o.sees_history)`;

export async function up(knex: Knex): Promise<void> {
  await createTenantTable(knex, {
    name: 'jobs',
    columns: `
      reference text not null,
      machine_id uuid not null,
      customer_id uuid not null,
      purpose text not null check (purpose in ('new-machine', 'overhaul', 'collision', 'move', 'periodic')),
      scope text,
      customer_order text,
      customer_engineer text,
      decision_rule text not null default 'simple' check (decision_rule in ('simple', 'guarded')),
      codes jsonb not null,
      starts_on date not null,
      ends_on date,
      place text,
      hours text,
      conditions jsonb not null default '{}',
      -- The make-up as it was when the plan was made; the machine may be rebuilt later.
      make_up jsonb not null,
      plan_made_at timestamptz,
      state text not null default 'open' check (state in ('open', 'in-check', 'issued', 'closed')),
      version integer not null default 1,
      created_by uuid,
      created_at timestamptz not null default now(),
      unique (organisation_id, reference),
      foreign key (organisation_id, machine_id) references machines (organisation_id, id),
      foreign key (organisation_id, customer_id) references customers (organisation_id, id),
      check (ends_on is null or ends_on >= starts_on)`,
    customerReads: jobVisible,
  });
  await knex.raw('create index jobs_machine on jobs (organisation_id, machine_id)');

  await createTenantTable(knex, {
    name: 'job_people',
    columns: `
      job_id uuid not null,
      membership_id uuid,
      name text not null,
      role text not null check (role in ('inspector', 'reviewer', 'customer')),
      foreign key (organisation_id, job_id) references jobs (organisation_id, id),
      foreign key (organisation_id, membership_id) references memberships (organisation_id, id)`,
    customerReads: 'false',
  });

  await createTenantTable(knex, {
    name: 'job_temperatures',
    columns: `
      job_id uuid not null,
      measured_at timestamptz not null,
      air numeric,
      air_text text,
      machine numeric,
      machine_text text,
      foreign key (organisation_id, job_id) references jobs (organisation_id, id),
      check (air is not null or machine is not null)`,
    customerReads: 'false',
  });

  await createTenantTable(knex, {
    name: 'job_exclusions',
    columns: `
      job_id uuid not null,
      key text not null,
      title text not null,
      reason text not null check (reason in ('not-applicable', 'not-agreed', 'not-possible', 'not-touched')),
      text text,
      unique (organisation_id, job_id, key),
      foreign key (organisation_id, job_id) references jobs (organisation_id, id)`,
    customerReads: 'false',
  });

  await createTenantTable(knex, {
    name: 'sheets',
    columns: `
      job_id uuid not null,
      position integer not null,
      key text not null,
      definition jsonb not null,
      title text not null,
      component jsonb not null,
      depends_on jsonb not null,
      tolerance jsonb,
      direction text not null,
      set_up jsonb not null default '{}',
      left_out_reason text check (left_out_reason in ('not-applicable', 'not-agreed', 'not-possible', 'not-touched')),
      left_out_text text,
      left_out_by text,
      left_out_at timestamptz,
      remark text,
      version integer not null default 1,
      created_at timestamptz not null default now(),
      unique (organisation_id, job_id, key),
      unique (organisation_id, job_id, position) deferrable initially deferred,
      foreign key (organisation_id, job_id) references jobs (organisation_id, id)`,
    customerReads: 'false',
  });

  await createTenantTable(knex, {
    name: 'passes',
    columns: `
      sheet_id uuid not null,
      kind text not null check (kind in ('as-found', 'adjusting', 'as-left')),
      number integer not null,
      -- As left = as found: nothing was done, no reading is typed again.
      linked_to uuid,
      taken_at timestamptz,
      taken_by text,
      temperature numeric,
      temperature_text text,
      version integer not null default 1,
      created_at timestamptz not null default now(),
      unique (organisation_id, sheet_id, kind, number),
      foreign key (organisation_id, sheet_id) references sheets (organisation_id, id),
      foreign key (organisation_id, linked_to) references passes (organisation_id, id),
      check (linked_to is null or kind = 'as-left')`,
    customerReads: 'false',
  });

  await createTenantTable(knex, {
    name: 'pass_instruments',
    columns: `
      pass_id uuid not null,
      instrument_id uuid not null,
      override_reason text,
      override_by text,
      unique (organisation_id, pass_id, instrument_id),
      foreign key (organisation_id, pass_id) references passes (organisation_id, id),
      foreign key (organisation_id, instrument_id) references instruments (organisation_id, id)`,
    customerReads: 'false',
  });

  await createTenantTable(knex, {
    name: 'readings',
    columns: `
      pass_id uuid not null,
      pointer text not null,
      text text not null,
      -- The figure as typed, in the unit that applied to it; null for choices and for what cannot be read.
      value numeric,
      unit text,
      source text not null check (source in ('typed', 'keypad', 'paste', 'device', 'planned')),
      version integer not null,
      device_time timestamptz,
      updated_at timestamptz not null default now(),
      unique (organisation_id, pass_id, pointer),
      foreign key (organisation_id, pass_id) references passes (organisation_id, id)`,
    customerReads: 'false',
    grants: 'select, insert, update',
  });

  await createTenantTable(knex, {
    name: 'reading_operations',
    columns: `
      sequence bigint generated always as identity,
      sheet_id uuid not null,
      pass_id uuid not null,
      pointer text not null,
      base_version integer not null,
      text text not null,
      unit text,
      source text not null,
      device_time timestamptz not null,
      reason text,
      outcome text not null check (outcome in ('applied', 'conflict', 'rejected')),
      version integer,
      problem text,
      account_id uuid not null,
      account_name text not null,
      received_at timestamptz not null default now(),
      foreign key (organisation_id, pass_id) references passes (organisation_id, id)`,
    customerReads: 'false',
    grants: 'select, insert',
  });
  await knex.raw('create index reading_operations_pass on reading_operations (organisation_id, pass_id, sequence)');

  await createTenantTable(knex, {
    name: 'pass_results',
    columns: `
      pass_id uuid not null,
      state text not null check (state in ('partial', 'complete')),
      deviation_um numeric not null,
      tolerance_um numeric,
      limit_um numeric,
      margin_um numeric,
      verdict text not null check (verdict in ('within-tolerance', 'out-of-tolerance', 'undecided', 'for-information')),
      displayed_um text not null,
      displayed_mm text not null,
      outcome jsonb not null,
      rule_set text not null,
      computed_at timestamptz not null default now(),
      unique (organisation_id, pass_id),
      foreign key (organisation_id, pass_id) references passes (organisation_id, id)`,
    customerReads: 'false',
  });
}

export async function down(knex: Knex): Promise<void> {
  await dropTables(knex, [
    'pass_results',
    'reading_operations',
    'readings',
    'pass_instruments',
    'passes',
    'sheets',
    'job_exclusions',
    'job_temperatures',
    'job_people',
    'jobs',
  ]);
}
