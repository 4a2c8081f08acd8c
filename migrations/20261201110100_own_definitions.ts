import type { Knex } from 'knex';
import { createTenantTable, dropTables } from '@/db/tenant-table';

export async function up(knex: Knex): Promise<void> {
  await createTenantTable(knex, {
    name: 'own_definitions',
    columns: `
      sequence bigint generated always as identity,
      definition_id text not null check (definition_id ~ '^[A-Z][A-Z0-9-]{1,19}$'),
      version integer not null check (version > 0),
      -- A row of its own says that the test is not planned any more; versions stay.
      withdrawn boolean not null default false,
      definition jsonb,
      -- As it was composed, to begin a new version from.
      composed jsonb,
      account_id uuid not null,
      account_name text not null,
      recorded_at timestamptz not null default now(),
      unique (organisation_id, definition_id, version, withdrawn),
      check (withdrawn = (definition is null) and withdrawn = (composed is null))`,
    customerReads: '(select app_customer()) is not null',
    grants: 'select, insert',
  });
  await knex.raw(
    'create index own_definitions_newest on own_definitions (organisation_id, definition_id, sequence desc)',
  );
}

export async function down(knex: Knex): Promise<void> {
  await dropTables(knex, ['own_definitions']);
}
