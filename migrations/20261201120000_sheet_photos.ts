import type { Knex } from 'knex';
import { createTenantTable, dropTables } from '@/db/tenant-table';

/** Photographs at a sheet; one that is taken away stays stored, with who did it. */
export async function up(knex: Knex): Promise<void> {
  await createTenantTable(knex, {
    name: 'sheet_photos',
    columns: `
      sheet_id uuid not null,
      -- Item of a function check that it belongs to; null: the sheet as a whole.
      item text,
      caption text not null default '',
      file_id uuid not null,
      width_px integer not null check (width_px > 0),
      height_px integer not null check (height_px > 0),
      added_by text not null,
      added_at timestamptz not null default now(),
      removed_by text,
      removed_at timestamptz,
      check ((removed_by is null) = (removed_at is null)),
      foreign key (organisation_id, sheet_id) references sheets (organisation_id, id),
      foreign key (organisation_id, file_id) references files (organisation_id, id)`,
    customerReads: 'false',
    grants: 'select, insert, update',
  });
  await knex.raw('create index sheet_photos_sheet on sheet_photos (organisation_id, sheet_id)');
}

export async function down(knex: Knex): Promise<void> {
  await dropTables(knex, ['sheet_photos']);
}
