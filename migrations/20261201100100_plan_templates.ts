import type { Knex } from 'knex';
import { createTenantTable, dropTables } from '@/db/tenant-table';

export async function up(knex: Knex): Promise<void> {
  await createTenantTable(knex, {
    name: 'plan_templates',
    columns: `
      manufacturer text not null,
      model text not null,
      name text not null check (name <> ''),
      -- Keys that are taken, reasons of the others, contract tolerances: a selection, never figures of the catalogue.
      choices jsonb not null,
      from_job_id uuid,
      account_name text not null,
      version integer not null default 1,
      created_at timestamptz not null default now(),
      foreign key (organisation_id, from_job_id) references jobs (organisation_id, id)`,
    customerReads: 'false',
  });
  await knex.raw(`
    create unique index plan_templates_name on plan_templates
      (organisation_id, lower(manufacturer), lower(model), lower(name))`);
}

export async function down(knex: Knex): Promise<void> {
  await dropTables(knex, ['plan_templates']);
}
