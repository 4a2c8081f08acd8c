import type { Knex } from 'knex';
import { createTenantTable, dropTables, replaceReadPolicy } from '@/db/tenant-table';

const ownedByCustomer = (machine: string) => `exists (select 1 from machine_owners o
  where o.organisation_id = (select app_organisation()) and o.machine_id = ${machine} and o.customer_id = (select app_customer()))`;

export async function up(knex: Knex): Promise<void> {
  await createTenantTable(knex, {
    name: 'machines',
    columns: `
      manufacturer text not null,
      model text not null,
      serial_number text not null,
      serial_folded text not null,
      year integer check (year between 1900 and 2200),
      control text,
      site text,
      kind text not null,
      make_up jsonb not null,
      version integer not null default 1,
      created_at timestamptz not null default now(),
      unique (organisation_id, manufacturer, serial_number)`,
    customerReads: 'false',
  });
  await knex.raw('create index machines_serial_folded on machines (organisation_id, serial_folded text_pattern_ops)');

  await createTenantTable(knex, {
    name: 'machine_owners',
    columns: `
      machine_id uuid not null,
      customer_id uuid not null,
      from_date date not null,
      -- Half-open: owned up to, not including, this day; null while it lasts.
      until_date date,
      -- What the transfer grants: the reports of the years before.
      sees_history boolean not null default false,
      created_at timestamptz not null default now(),
      foreign key (organisation_id, machine_id) references machines (organisation_id, id),
      foreign key (organisation_id, customer_id) references customers (organisation_id, id),
      check (until_date is null or until_date > from_date)`,
    customerReads: 'customer_id = (select app_customer())',
  });
  await knex.raw(
    'create unique index machine_owners_current on machine_owners (organisation_id, machine_id) where until_date is null',
  );
  await knex.raw('create index machine_owners_customer on machine_owners (organisation_id, customer_id)');

  await replaceReadPolicy(knex, 'machines', ownedByCustomer('machines.id'));

  await createTenantTable(knex, {
    name: 'instruments',
    columns: `
      number text not null,
      name text not null,
      kind text not null,
      resolution numeric check (resolution > 0),
      resolution_unit text,
      retired_at timestamptz,
      version integer not null default 1,
      created_at timestamptz not null default now(),
      unique (organisation_id, number)`,
    customerReads: 'false',
  });

  await createTenantTable(knex, {
    name: 'files',
    columns: `
      key text not null,
      kind text not null check (kind in ('report', 'certificate', 'nameplate', 'photo')),
      name text not null,
      content_type text not null,
      byte_length bigint not null,
      sha256 text not null,
      created_by uuid,
      created_at timestamptz not null default now(),
      unique (organisation_id, key)`,
    customerReads: 'false',
    grants: 'select, insert',
  });

  await createTenantTable(knex, {
    name: 'calibrations',
    columns: `
      instrument_id uuid not null,
      certificate text not null,
      laboratory text,
      calibrated_on date not null,
      -- Last valid day.
      due_on date not null,
      expanded_uncertainty numeric check (expanded_uncertainty > 0),
      uncertainty_unit text,
      coverage_factor numeric,
      file_id uuid,
      created_at timestamptz not null default now(),
      foreign key (organisation_id, instrument_id) references instruments (organisation_id, id),
      foreign key (organisation_id, file_id) references files (organisation_id, id),
      check (due_on >= calibrated_on)`,
    customerReads: 'false',
    grants: 'select, insert',
  });
}

export async function down(knex: Knex): Promise<void> {
  await dropTables(knex, ['calibrations', 'files', 'instruments', 'machine_owners', 'machines']);
}
